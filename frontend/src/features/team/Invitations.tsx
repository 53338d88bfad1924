import { useQuery } from '@tanstack/react-query';
import { invitationsQuery } from '../../api/team';
import { useFocusAfterLoss } from '../../components/lostFocus';
import { Table } from '../../components/Table';
import { InvitationRow } from './InvitationRow';
import styles from './Team.module.css';

/** The invitations that wait for an answer; nothing where there are none. */
export function Invitations() {
  const { data = [] } = useQuery(invitationsQuery);
  const heading = useFocusAfterLoss<HTMLHeadingElement>(data.length);
  if (data.length === 0) return null;
  return (
    <section className={styles.section} aria-label="Open invitations">
      <h2 ref={heading} tabIndex={-1}>
        {data.length === 1 ? 'One open invitation' : `${data.length} open invitations`}
      </h2>
      <Table stacks className={styles.table}>
        <thead>
          <tr>
            <th scope="col">invited</th>
            <th scope="col">roles</th>
            <th scope="col">sent</th>
            <th scope="col">
              <span className="visually-hidden">acts</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {data.map((invitation) => (
            <InvitationRow key={invitation.id} invitation={invitation} />
          ))}
        </tbody>
      </Table>
    </section>
  );
}
