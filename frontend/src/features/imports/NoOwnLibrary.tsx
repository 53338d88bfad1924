import { WhyNot } from '../../components/WhyNot';

const BY_ROLE =
  'Lists of parts are imported by your team’s librarians, prices by purchasing, and both by its admins. You can look at what was imported.';

/** Why the member can't import: the role, or the plan and how the team stands with it. */
export function NoOwnLibrary() {
  return (
    <p>
      <WhyNot
        action="lists.import"
        byRole={BY_ROLE}
        byPlan="Your team’s plan has no library of its own, so there is nothing to import into. The Team plan has one."
      />
    </p>
  );
}
