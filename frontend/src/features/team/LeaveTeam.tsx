import { Button, Popconfirm } from 'antd';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMember } from '../../components/useMember';
import { useLeaveTeam } from './useTeamActs';

/** The way out of the team, for oneself. */
export function LeaveTeam() {
  const { name } = useMember().team;
  const leave = useLeaveTeam();
  return (
    <div>
      <Popconfirm
        title={`Leave ${name}?`}
        description="Your work stays with the team. You come back only by a new invitation."
        okText="Leave"
        onConfirm={() => leave.mutate()}
      >
        <Button loading={leave.isPending}>Leave the team</Button>
      </Popconfirm>
      {leave.error && <FieldMessage>{detailOf(leave.error)}</FieldMessage>}
    </div>
  );
}
