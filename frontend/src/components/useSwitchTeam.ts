import { useMutation } from '@tanstack/react-query';
import { switchTeam } from '../api/session';

/** Goes on in another team: the page is loaded anew, so that nothing of this one stays in memory. */
export function useSwitchTeam() {
  return useMutation({
    mutationFn: switchTeam,
    onSuccess: () => window.location.assign('/'),
  });
}
