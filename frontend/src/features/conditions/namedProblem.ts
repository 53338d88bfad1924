import { ApiProblem, detailOf } from '../../api/problem';

/** What to tell of a refusal to save, rename or delete named conditions, and what to do about it. */
export function namedProblem(error: unknown): string {
  return (error instanceof ApiProblem && WORDS[error.code]) || detailOf(error);
}

const WORDS: Record<string, string> = {
  'access.plan':
    'The team’s plan holds no more named conditions. Delete some, or ask the team admin for a larger plan.',
  'access.role': 'Only an admin, a librarian or an engineer may save conditions.',
  'conditions.duplicate': 'The team has conditions of this name already: choose another name.',
  'conditions.stale':
    'Somebody else changed these conditions in the meantime. Choose them again to see theirs, or save yours under another name.',
  'conditions.not-found': 'Somebody else deleted these conditions in the meantime. Save yours under a name.',
};
