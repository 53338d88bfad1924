import type { Action } from '@roothertz/common/access';
import { NavLink } from 'react-router-dom';
import { useMember } from '../../components/useMember';
import { mayDo } from '@roothertz/common/access';
import styles from './TeamPages.module.css';

const TABS: readonly { to: string; label: string; action: Action }[] = [
  { to: '/team', label: 'Members', action: 'team.read' },
  { to: '/team/plan', label: 'Plan', action: 'team.read' },
  { to: '/team/trail', label: 'Audit trail', action: 'audit.read' },
];

/** The pages about the team that the member may see. */
export function TeamTabs() {
  const { roles } = useMember();
  const tabs = TABS.filter(({ action }) => mayDo(roles, action));
  return (
    <nav aria-label="About the team" className={styles.tabs}>
      {tabs.map(({ to, label }) => (
        <NavLink key={to} to={to} end className={styles.tab}>
          {label}
        </NavLink>
      ))}
    </nav>
  );
}
