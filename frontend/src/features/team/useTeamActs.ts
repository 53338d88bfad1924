import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { Role } from '@roothertz/common/access';
import { SESSION_KEY } from '../../api/session';
import {
  changeRoles,
  handOverTeam,
  inviteMember,
  leaveTeam,
  removeMember,
  renameTeam,
  resendInvitation,
  revokeInvitation,
  TEAM_KEY,
} from '../../api/team';

/** An act on the team, after which its lists and the own session are read anew. */
function useTeamAct<Argument, Result>(act: (argument: Argument) => Promise<Result>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: act,
    scope: { id: 'team' },
    onSuccess: async () => {
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
export const useChangeRoles = (id: string) => useTeamAct((roles: Role[]) => changeRoles(id, roles));

/** Leaving ends the session: the page is loaded anew, so that nothing of it stays in memory. */
export function useLeaveTeam() {
  return useMutation({
    mutationFn: leaveTeam,
    onSuccess: () => window.location.assign('/sign-in'),
  });
}
