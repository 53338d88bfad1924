import { App, Dropdown } from 'antd';
import { detailOf } from '../api/problem';
import { useMember } from '../components/useMember';
import { useSwitchTeam } from '../components/useSwitchTeam';
import styles from './Shell.module.css';

/** The team's name; for a member of several teams the way into the others too. */
export function TeamSwitch() {
  const { team, teams } = useMember();
  const { notification } = App.useApp();
  const change = useSwitchTeam();
  if (teams.length < 2) return <span className={styles.team}>{team.name}</span>;
  const choose = (id: string) =>
    change.mutate(id, {
      onError: (error) =>
        notification.error({ title: 'The team isn’t opened', description: detailOf(error) }),
    });
  const items = teams.map(({ id, name }) =>
    id === team.id ? { key: id, label: `${name} (open now)`, disabled: true } : { key: id, label: name },
  );
  return (
    <Dropdown trigger={['click']} autoFocus menu={{ items, onClick: ({ key }) => choose(key) }}>
      <button
        type="button"
        className={styles.teams}
        aria-label={`Team: ${team.name}`}
        aria-haspopup="menu"
        disabled={change.isPending}
      >
        {team.name} <span aria-hidden>▾</span>
      </button>
    </Dropdown>
  );
}
