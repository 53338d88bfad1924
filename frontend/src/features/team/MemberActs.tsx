import { Button } from 'antd';
import { detailOf } from '../../api/problem';
import type { TeamMember } from '../../api/team';
import { AskFirst } from '../../components/AskFirst';
import { FieldMessage } from '../../components/FieldMessage';
import { useHandOver, useRemoveMember } from './useTeamActs';

/** What an admin can do with a member. */
export function MemberActs({ member, isSelf }: { member: TeamMember; isSelf: boolean }) {
  const { id, name, roles, isOwner } = member;
  const [handOver, remove] = [useHandOver(), useRemoveMember()];
  const error = handOver.error ?? remove.error;
  const verb = isSelf ? 'Take over' : 'Hand over';
  return (
    <>
      {roles.includes('admin') && !isOwner && (
        <AskFirst
          question={isSelf ? 'Take the team’s plan over?' : `Hand the team’s plan over to ${name}?`}
          outcome={`${isSelf ? 'You' : 'They'} hold the plan from then on; the holder of the plan can’t leave or be removed.`}
          verb={verb}
          onAgree={() => handOver.mutate(id)}
        >
          <Button
            size="small"
            aria-label={isSelf ? 'Take over the plan' : `Hand over to ${name}`}
            loading={handOver.isPending}
          >
            {verb}
          </Button>
        </AskFirst>
      )}
      {!isSelf && (
        <AskFirst
          question={`Remove ${name} from the team?`}
          outcome="Their work stays, and their session ends at once."
          verb="Remove"
          onAgree={() => remove.mutate(id)}
        >
          <Button size="small" aria-label={`Remove ${name}`} loading={remove.isPending}>
            Remove
          </Button>
        </AskFirst>
      )}
      {error && <FieldMessage>{detailOf(error)}</FieldMessage>}
    </>
  );
}
