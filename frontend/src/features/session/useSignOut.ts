import { useMutation } from '@tanstack/react-query';
import { signOut } from '../../api/session';

/** Ends the session and loads the page anew, so that nothing of it stays in memory. */
export function useSignOut() {
  return useMutation({
    mutationFn: signOut,
    onSuccess: () => window.location.assign('/sign-in'),
  });
}
