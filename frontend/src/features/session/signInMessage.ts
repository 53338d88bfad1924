import { ApiProblem, detailOf } from '../../api/problem';

/** What the sign-in form says about a failed attempt. */
export function signInMessage(error: Error | null, wait: number): string | null {
  if (wait > 0) return `Too many attempts. Try again in ${wait} ${wait === 1 ? 'second' : 'seconds'}.`;
  if (error === null) return null;
  if (!(error instanceof ApiProblem)) return detailOf(error);
  if (error.status === 429) return 'You can try again now.';
  if (error.status === 401) return 'E-mail and password don’t match an account. Check both.';
  if (error.isUnreachable) return 'The database or server can’t be reached. Try again in a moment.';
  return error.detail;
}
