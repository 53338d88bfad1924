import { queryOptions, type QueryClient } from '@tanstack/react-query';
import { answer, client } from './client';
import { ApiProblem } from './problem';
import type { components } from './schema';

export type Session = components['schemas']['SessionResponseDto'];
export type Credentials = components['schemas']['SignInDto'];

export const SESSION_KEY = ['session'] as const;

/** The signed-in member, or null where nobody is. */
export const sessionQuery = queryOptions({
  queryKey: SESSION_KEY,
  queryFn: readSession,
  staleTime: 5 * 60_000,
});

async function readSession(): Promise<Session | null> {
  try {
    return await answer(client.GET('/api/auth/me'));
  } catch (error) {
    if (error instanceof ApiProblem && error.status === 401) return null;
    throw error;
  }
}

export function signIn(credentials: Credentials): Promise<Session> {
  return answer(client.POST('/api/auth/sign-in', { body: credentials }));
}

/** Goes on in another of the person's teams. */
export function switchTeam(teamId: string): Promise<Session> {
  return answer(client.POST('/api/auth/team', { body: { teamId } }));
}

export async function signOut(): Promise<void> {
  await answer(client.POST('/api/auth/sign-out'));
}

/** Makes a session, or its end, known to the page and forgets what was loaded before it. */
export function takeSession(queryClient: QueryClient, session: Session | null): void {
  queryClient.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== SESSION_KEY[0] });
  queryClient.setQueryData(SESSION_KEY, session);
}

/** Goes on with a new session of the same member: what the page shows stays, and is loaded anew behind it. */
export function resumeSession(queryClient: QueryClient, session: Session): void {
  queryClient.setQueryData(SESSION_KEY, session);
  void queryClient.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== SESSION_KEY[0] });
}
