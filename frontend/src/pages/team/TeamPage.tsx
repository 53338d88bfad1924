import { mayDo } from '@roothertz/common/access';
import { useMember } from '../../components/useMember';
import { Invitations } from '../../features/team/Invitations';
import { InviteForm } from '../../features/team/InviteForm';
import { LeaveTeam } from '../../features/team/LeaveTeam';
import { MemberTable } from '../../features/team/MemberTable';
import { TeamName } from '../../features/team/TeamName';
import styles from './TeamPages.module.css';
import { TeamTabs } from './TeamTabs';

/** Who is in the team and with which roles; admins change it here. */
export function TeamPage() {
  const { roles, team } = useMember();
  const mayManage = mayDo(roles, 'team.manage');
  return (
    <div className={styles.page}>
      <title>{`${team.name} · Roothertz`}</title>
      <div className={styles.head}>
        <TeamName mayRename={mayManage} />
        <TeamTabs />
      </div>
      {mayManage && <InviteForm />}
      {mayManage && <Invitations />}
      <MemberTable mayManage={mayManage} />
      <LeaveTeam />
    </div>
  );
}
