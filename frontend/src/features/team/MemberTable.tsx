import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { teamMembersQuery } from '../../api/team';
import { LoadFailure } from '../../components/LoadFailure';
import { useFocusAfterLoss } from '../../components/lostFocus';
import { Table } from '../../components/Table';
import { MemberRow } from './MemberRow';
import styles from './Team.module.css';

/** Everybody in the team; an admin changes roles in their place. */
export function MemberTable({ mayManage }: { mayManage: boolean }) {
  const { data, error, refetch } = useQuery(teamMembersQuery);
  const heading = useFocusAfterLoss<HTMLHeadingElement>(data?.length ?? 0);
  if (error) return <LoadFailure error={error} onRetry={refetch} />;
  if (data === undefined) return <Skeleton title={false} paragraph={{ rows: 5, width: '100%' }} />;
  return (
    <section className={styles.section} aria-label="Members">
      <h2 ref={heading} tabIndex={-1}>
        {data.length === 1 ? 'One member' : `${data.length} members`}
      </h2>
      <Table stacks className={styles.table}>
        <thead>
          <tr>
            <th scope="col">member</th>
            <th scope="col">roles</th>
            <th scope="col">since</th>
            {mayManage && (
              <th scope="col">
                <span className="visually-hidden">acts</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {data.map((member) => (
            <MemberRow key={member.id} member={member} mayManage={mayManage} />
          ))}
        </tbody>
      </Table>
    </section>
  );
}
