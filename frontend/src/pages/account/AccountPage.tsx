import { PLAN_LABELS, ROLE_LABELS } from '@roothertz/common/access';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Facts } from '../../components/Facts';
import { useMember } from '../../components/useMember';
import { CloseAccount } from '../../features/account/CloseAccount';
import { MailPreferenceList } from '../../features/account/MailPreferenceList';
import { OpenSessions } from '../../features/account/OpenSessions';
import { OwnFacts } from '../../features/account/OwnFacts';
import { OwnTeams } from '../../features/account/OwnTeams';
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
        label="Standing"
        entries={[
          { term: 'Team', value: team.name },
          { term: 'Roles', value: roles.map((role) => ROLE_LABELS[role]).join(', ') },
          { term: 'Plan', value: <Link to="/team/plan">{PLAN_LABELS[plan]}</Link> },
        ]}
      />
      <OwnFacts />
      <SignOutButton />
      <Section title="Theme in this browser">
        <ThemeChooser />
      </Section>
      <Section title="E-mails">
        <MailPreferenceList />
      </Section>
      <Section title="Teams">
        <OwnTeams />
      </Section>
      <Section title="Open sessions">
        <OpenSessions />
      </Section>
      <Section title="Close the account">
        <CloseAccount />
      </Section>
    </div>
  );
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className={styles.section}>
      <h2>{title}</h2>
      {children}
    </section>
  );
}
