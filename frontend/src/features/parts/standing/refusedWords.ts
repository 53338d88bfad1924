import { ApiProblem, detailOf } from '../../../api/problem';

const MOST_NAMED = 5;

/** What was refused, with the parts that were the reason, as far as one wants to read them. */
export function refusedWords(error: unknown): string {
  if (!(error instanceof ApiProblem) || error.errors.length === 0) return detailOf(error);
  const named = error.errors.slice(0, MOST_NAMED).map(({ message }) => message);
  const more = error.errors.length - named.length;
  return `Nothing was changed. ${error.detail} ${named.join('; ')}${more > 0 ? ` and ${more} more` : ''}.`;
}
