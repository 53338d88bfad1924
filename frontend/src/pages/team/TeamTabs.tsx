import { type Action, mayDo } from '@roothertz/common/access';
import { LinkTabs } from '../../components/LinkTabs';
import { useMember } from '../../components/useMember';

const TABS: readonly { to: string; label: string; action: Action }[] = [
  { to: '/team', label: 'Members', action: 'team.read' },
  { to: '/team/plan', label: 'Plan', action: 'team.read' },
  { to: '/team/trail', label: 'Audit trail', action: 'audit.read' },
];

/** The pages about the team that the member may see. */
export function TeamTabs() {
  const { roles } = useMember();
  return <LinkTabs label="About the team" tabs={TABS.filter(({ action }) => mayDo(roles, action))} />;
}
