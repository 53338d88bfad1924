import { mayDo } from '@roothertz/common/access';
import { MessagePage } from '../../components/MessagePage';
import { useMember } from '../../components/useMember';
import { Trail } from '../../features/audit/Trail';
import styles from './TeamPages.module.css';
import { TeamTabs } from './TeamTabs';

/** Who did what in the team, and when. */
export function TrailPage() {
  const { roles, team } = useMember();
  if (!mayDo(roles, 'audit.read'))
    return (
      <MessagePage title="Audit trail">
        <p>Your team’s admins see who did what. Ask one of them.</p>
      </MessagePage>
    );
  return (
    <div className={`${styles.page} ${styles.wide}`}>
      <title>Audit trail · Roothertz</title>
      <div className={styles.head}>
        <h1>{team.name}</h1>
        <TeamTabs />
      </div>
      <Trail />
    </div>
  );
}
