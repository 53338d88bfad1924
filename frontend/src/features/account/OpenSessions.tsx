import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import { endOtherSessions, endSession, type OpenSession, openSessionsQuery } from '../../api/account';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useFocusAfterLoss } from '../../components/lostFocus';
import { moment } from '../../components/moments';
import styles from './Account.module.css';
import { deviceWords } from './deviceWords';

/** The sign-ins that aren't over, and the button that ends each. */
export function OpenSessions() {
  const { data, error } = useQuery(openSessionsQuery);
  const end = useEnding();
  const list = useFocusAfterLoss<HTMLUListElement>(data?.items.length ?? 0);
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data) return <Skeleton title={false} paragraph={{ rows: 2 }} />;
  return (
    <>
      <ul ref={list} tabIndex={-1} className={styles.rows} aria-label="Open sessions">
        {data.items.map((session) => (
          <SessionRow key={session.id} session={session} onEnd={() => end.mutate(session.id)} />
        ))}
      </ul>
      {data.items.length > 1 && (
        <div>
          <Button onClick={() => end.mutate(null)}>End all others</Button>
        </div>
      )}
      {end.error && <FieldMessage>{detailOf(end.error)}</FieldMessage>}
    </>
  );
}

/** Ends one session by its id, or all but this one (null). */
function useEnding() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (id: string | null) => (id === null ? endOtherSessions() : endSession(id)),
    onSettled: () => queryClient.invalidateQueries({ queryKey: openSessionsQuery.queryKey }),
  });
}

function SessionRow({ session, onEnd }: { session: OpenSession; onEnd: () => void }) {
  const { userAgent, address, team, createdAt, lastSeenAt, current } = session;
  const device = deviceWords(userAgent);
  return (
    <li className={styles.row}>
      <span className={styles.what}>
        {device}, {address}, in {team.name}
        <br />
        <span className={styles.quiet}>
          since {moment(createdAt)}, last used {moment(lastSeenAt)}
        </span>
      </span>
      {current ? (
        <span className={styles.quiet}>this one</span>
      ) : (
        <Button
          size="small"
          onClick={onEnd}
          aria-label={`End the session of ${device} since ${moment(createdAt)}`}
        >
          End
        </Button>
      )}
    </li>
  );
}
