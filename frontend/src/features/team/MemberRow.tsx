import type { TeamMember } from '../../api/team';
import { formatDay } from '../../components/formatDay';
import { useMember } from '../../components/useMember';
import { MemberActs } from './MemberActs';
import { RolesSelect } from './RolesSelect';
import styles from './Team.module.css';
import { rolesText } from './teamWords';

export function MemberRow({ member, mayManage }: { member: TeamMember; mayManage: boolean }) {
  const { id, name, email, roles, isOwner, joinedAt } = member;
  const isSelf = useMember().user.id === id;
  return (
    <tr>
      <th scope="row">
        {name}
        {isSelf && <span className={styles.mark}> (you)</span>}
        <span className={styles.note}>{email}</span>
        {isOwner && <span className={styles.note}>holds the team’s plan</span>}
      </th>
      <td className={styles.roles}>{mayManage ? <RolesSelect member={member} /> : rolesText(roles)}</td>
      <td className={styles.since}>{formatDay(joinedAt)}</td>
      {mayManage && (
        <td className={styles.acts}>
          <MemberActs member={member} isSelf={isSelf} />
        </td>
      )}
    </tr>
  );
}
