import { mayDo } from '@roothertz/common/access';
import { useMember } from '../../components/useMember';

/** Why the member can't import: the role, or the plan. */
export function NoOwnLibrary() {
  const { roles } = useMember();
  return (
    <p>
      {mayDo(roles, 'lists.import')
        ? 'Your team’s plan has no library of its own, so there is nothing to import into. The team plan has one.'
        : 'Lists of parts are imported by your team’s librarians, prices by purchasing, and both by its admins. You can look at what was imported.'}
    </p>
  );
}
