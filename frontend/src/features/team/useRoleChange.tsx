import type { Role } from '@roothertz/common/access';
import { App, Button } from 'antd';
import { detailOf } from '../../api/problem';
import { changeRoles, type TeamMember } from '../../api/team';
import { rolesText } from './teamWords';
import { useTeamAct } from './useTeamActs';

const SECONDS_TO_UNDO = 12;

/** Gives a member other roles at once and offers to take that back. */
export function useRoleChange({ id, name, roles: before }: TeamMember) {
  const { notification } = App.useApp();
  const key = `roles ${id}`;
  const change = (roles: Role[]) => changeRoles(id, roles);
  const undo = useTeamAct(change, {
    onDone: () => notification.destroy(key),
    onError: (error) =>
      notification.error({
        title: 'The roles can’t be changed back',
        description: detailOf(error),
        placement: 'bottomRight',
      }),
  });
  return useTeamAct(change, {
    onDone: ({ roles }) =>
      notification.open({
        key,
        title: `${name} is now ${rolesText(roles)}`,
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => undo.mutate(before)}>Undo</Button>,
      }),
  });
}
