import { Button } from 'antd';
import { detailOf } from '../../api/problem';
import { AskFirst } from '../../components/AskFirst';
import { FieldMessage } from '../../components/FieldMessage';
import { useMember } from '../../components/useMember';
import { useLeaveTeam } from './useTeamActs';

/** The way out of the team, for oneself. */
export function LeaveTeam() {
  const { name } = useMember().team;
  const leave = useLeaveTeam();
  return (
    <div>
      <AskFirst
        question={`Leave ${name}?`}
        outcome="Your work stays with the team. You come back only by a new invitation."
        verb="Leave"
        onAgree={() => leave.mutate()}
      >
        <Button loading={leave.isPending}>Leave the team</Button>
      </AskFirst>
      {leave.error && <FieldMessage>{detailOf(leave.error)}</FieldMessage>}
    </div>
  );
}
