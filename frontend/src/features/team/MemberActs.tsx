import { Button, Popconfirm } from 'antd';
import { detailOf } from '../../api/problem';
import type { TeamMember } from '../../api/team';
import { FieldMessage } from '../../components/FieldMessage';
import { useHandOver, useRemoveMember } from './useTeamActs';

/** What an admin can do with another member. */
export function MemberActs({ member, isSelf }: { member: TeamMember; isSelf: boolean }) {
  const { id, name, roles, isOwner } = member;
  const [handOver, remove] = [useHandOver(), useRemoveMember()];
  const error = handOver.error ?? remove.error;
  return (
    <>
      {roles.includes('admin') && !isOwner && (
        <Popconfirm
          title={`Hand the team’s plan over to ${name}?`}
          description="They hold the plan from then on; the holder of the plan can’t leave or be removed."
          okText="Hand over"
          onConfirm={() => handOver.mutate(id)}
        >
          <Button size="small" aria-label={`Hand over to ${name}`} loading={handOver.isPending}>
            Hand over
          </Button>
        </Popconfirm>
      )}
      {!isSelf && (
        <Popconfirm
          title={`Remove ${name} from the team?`}
          description="Their work stays, and their session ends at once."
          okText="Remove"
          onConfirm={() => remove.mutate(id)}
        >
          <Button size="small" aria-label={`Remove ${name}`} loading={remove.isPending}>
            Remove
          </Button>
        </Popconfirm>
      )}
      {error && <FieldMessage>{detailOf(error)}</FieldMessage>}
    </>
  );
}
