import { mayDo } from '@roothertz/common/access';
import { Link, NavLink } from 'react-router-dom';
import { Mark } from '../components/Mark';
import { useMember } from '../components/useMember';
import { NAVIGATION, START_PAGE } from './navigation';
import styles from './Shell.module.css';
import { TeamSwitch } from './TeamSwitch';

export function Rail() {
  const { roles } = useMember();
  const entries = NAVIGATION.filter(({ action }) => mayDo(roles, action));
  return (
    <header className={styles.rail}>
      <div className={styles.brand}>
        <Link to={START_PAGE} className={styles.home}>
          <Mark />
        </Link>
        <TeamSwitch />
      </div>
      <nav aria-label="Pages" className={styles.pages}>
        {entries.map(({ to, label }) => (
          <NavLink key={to} to={to} className={styles.page}>
            {label}
          </NavLink>
        ))}
      </nav>
      <AccountLink />
    </header>
  );
}

function AccountLink() {
  const [name, domain] = useMember().user.email.split('@');
  return (
    <NavLink to="/account" className={styles.account} aria-label={`Account of ${name}@${domain}`}>
      <span className={styles.address}>
        {name}@<wbr />
        {domain}
      </span>
      <span className={styles.short}>Account</span>
    </NavLink>
  );
}
