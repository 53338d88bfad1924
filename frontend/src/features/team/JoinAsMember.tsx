import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { useNavigate } from 'react-router-dom';
import { acceptInvitation, type OpenInvitation } from '../../api/invitation';
import { detailOf } from '../../api/problem';
import { type Session, signOut, switchTeam, takeSession } from '../../api/session';
import { FieldMessage } from '../../components/FieldMessage';

interface JoinAsMemberProps {
  token: string;
  invitation: OpenInvitation;
  session: Session;
}

/** Joins with the account that is signed in, where the invitation is for its address. */
export function JoinAsMember({ token, invitation: { email, team }, session: { user } }: JoinAsMemberProps) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const leave = useMutation({ mutationFn: signOut, onSuccess: () => takeSession(queryClient, null) });
  const join = useMutation({
    mutationFn: async () => {
      await acceptInvitation(token);
      return switchTeam(team.id);
    },
    onSuccess: async (session) => {
      takeSession(queryClient, session);
      await navigate('/');
    },
  });
  if (user.email !== email)
    return (
      <>
        <p>
          You are signed in as {user.email}, and the invitation is for another address. Sign out to use it.
        </p>
        <Button onClick={() => leave.mutate()} loading={leave.isPending}>
          Sign out
        </Button>
        {leave.error && <FieldMessage>{detailOf(leave.error)}</FieldMessage>}
      </>
    );
  return (
    <>
      <Button type="primary" onClick={() => join.mutate()} loading={join.isPending}>
        Join {team.name}
      </Button>
      {join.error && <FieldMessage>{detailOf(join.error)}</FieldMessage>}
    </>
  );
}
