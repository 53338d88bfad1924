import { refusalOf } from '@roothertz/common/access';
import { useMember } from '../../components/useMember';

const WHY = {
  role: 'Lists of parts are imported by your team’s librarians, prices by purchasing, and both by its admins. You can look at what was imported.',
  plan: 'Your team’s plan has no library of its own, so there is nothing to import into. The Team plan has one.',
  'read-only': 'Your team is read-only now, so no list can be imported. What is there can be exported.',
};

/** Why the member can't import: the role, or the plan and how the team stands with it. */
export function NoOwnLibrary() {
  return <p>{WHY[refusalOf(useMember(), 'lists.import') ?? 'role']}</p>;
}
