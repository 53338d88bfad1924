import { QueryCache, MutationCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './problem';
import { SESSION_KEY } from './session';

const LONGEST_WAIT = 10_000;

/** Server state of the page: unreachable servers are asked again until they answer, refusals aren't. */
export function createQueryClient(): QueryClient {
  const forgetLostSession = (error: unknown) => {
    if (error instanceof ApiProblem && error.code === 'session.missing')
      queryClient.setQueryData(SESSION_KEY, null);
  };
  const queryClient = new QueryClient({
    queryCache: new QueryCache({ onError: forgetLostSession }),
    mutationCache: new MutationCache({ onError: forgetLostSession }),
    defaultOptions: {
      queries: {
        networkMode: 'always',
        staleTime: 30_000,
        retry: (_count, error) => error instanceof ApiProblem && error.isUnreachable,
        retryDelay: (count) => Math.min(1000 * 2 ** count, LONGEST_WAIT),
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
  return queryClient;
}
