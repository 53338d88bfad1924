import { useMutation, useQueryClient } from '@tanstack/react-query';
import { SESSION_KEY } from '../../api/session';
import {
  handOverTeam,
  inviteMember,
  leaveTeam,
  removeMember,
  renameTeam,
  resendInvitation,
  revokeInvitation,
  TEAM_KEY,
} from '../../api/team';

interface Afterwards<Result> {
  onDone?: (result: Result) => void;
  onError?: (error: Error) => void;
}

/** An act on the team, after which its lists and the own session are read anew. */
export function useTeamAct<Argument, Result>(
  act: (argument: Argument) => Promise<Result>,
  { onDone, onError }: Afterwards<Result> = {},
) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: act,
    scope: { id: 'team' },
    onError,
    onSuccess: async (result) => {
      onDone?.(result);
      await queryClient.invalidateQueries({ queryKey: TEAM_KEY });
      await queryClient.invalidateQueries({ queryKey: SESSION_KEY });
      await queryClient.invalidateQueries({ queryKey: ['audit'] });
    },
  });
}

export const useRenameTeam = () => useTeamAct(renameTeam);
export const useHandOver = () => useTeamAct(handOverTeam);
export const useRemoveMember = () => useTeamAct(removeMember);
export const useInvite = () => useTeamAct(inviteMember);
export const useResend = () => useTeamAct(resendInvitation);
export const useRevoke = () => useTeamAct(revokeInvitation);

/** Leaving ends the session: the page is loaded anew, so that nothing of it stays in memory. */
export function useLeaveTeam() {
  return useMutation({
    mutationFn: leaveTeam,
    onSuccess: () => window.location.assign('/sign-in'),
  });
}
