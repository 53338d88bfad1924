import { ROLE_LABELS } from '@roothertz/common/access';
import { useQuery } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import { type OwnTeam, ownTeamsQuery } from '../../api/account';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMember } from '../../components/useMember';
import { useSwitchTeam } from '../../components/useSwitchTeam';
import styles from './Account.module.css';

/** The person's teams; in which of them the session works is chosen here. */
export function OwnTeams() {
  const { data, error } = useQuery(ownTeamsQuery);
  const change = useSwitchTeam();
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data) return <Skeleton title={false} paragraph={{ rows: 1 }} />;
  return (
    <>
      <ul className={styles.rows} aria-label="Your teams">
        {data.items.map((team) => (
          <TeamRow key={team.id} team={team} onChoose={() => change.mutate(team.id)} />
        ))}
      </ul>
      {change.error && <FieldMessage>{detailOf(change.error)}</FieldMessage>}
    </>
  );
}

function TeamRow({ team: { id, name, roles }, onChoose }: { team: OwnTeam; onChoose: () => void }) {
  const isCurrent = useMember().team.id === id;
  return (
    <li className={styles.row}>
      <span className={styles.what}>
        {name}
        <br />
        <span className={styles.quiet}>{roles.map((role) => ROLE_LABELS[role]).join(', ')}</span>
      </span>
      {isCurrent ? (
        <span className={styles.quiet}>open now</span>
      ) : (
        <Button size="small" onClick={onChoose} aria-label={`Open ${name}`}>
          Open
        </Button>
      )}
    </li>
  );
}
