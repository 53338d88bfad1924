import { PLAN_LABELS, ROLE_LABELS } from '@roothertz/common/access';
import { Link } from 'react-router-dom';
import { Facts } from '../../components/Facts';
import { useMember } from '../../components/useMember';
import { SignOutButton } from '../../features/session/SignOutButton';
import { ThemeChooser } from '../../features/session/ThemeChooser';
import styles from './AccountPage.module.css';

export function AccountPage() {
  const { user, team, roles, plan } = useMember();
  return (
    <div className={styles.page}>
      <title>Account · Roothertz</title>
      <h1>{user.name}</h1>
      <Facts
        label="Account"
        entries={[
          { term: 'E-mail', value: user.email },
          { term: 'Team', value: team.name },
          { term: 'Roles', value: roles.map((role) => ROLE_LABELS[role]).join(', ') },
          { term: 'Plan', value: <Link to="/team/plan">{PLAN_LABELS[plan]}</Link> },
        ]}
      />
      <section className={styles.section}>
        <h2>Theme in this browser</h2>
        <ThemeChooser />
      </section>
      <SignOutButton />
    </div>
  );
}
