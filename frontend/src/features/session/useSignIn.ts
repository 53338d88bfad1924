import { type QueryClient, useMutation, useQueryClient } from '@tanstack/react-query';
import { ApiProblem } from '../../api/problem';
import { type Session, signIn, takeSession } from '../../api/session';
import { useCountdown } from './useCountdown';

const LEAST_WAIT = 5;

/**
 * Signing in, with the wait that the server asks for after too many attempts.
 *
 * @param take what is done with the session
 */
export function useSignIn(
  take: (queryClient: QueryClient, session: Session) => void | Promise<void> = takeSession,
) {
  const queryClient = useQueryClient();
  const [wait, beginWait] = useCountdown();
  const mutation = useMutation({
    mutationFn: signIn,
    onSuccess: (session) => take(queryClient, session),
    onError: (error) => {
      if (error instanceof ApiProblem && error.status === 429) beginWait(error.retryAfter ?? LEAST_WAIT);
    },
  });
  return { signIn: mutation.mutate, isPending: mutation.isPending, error: mutation.error, wait };
}
