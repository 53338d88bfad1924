import type { FieldError } from '@roothertz/common/parts';
import { ApiProblem, detailOf } from '../../api/problem';

export interface Refusal {
  errors: readonly FieldError[];
  detail: string;
}

/** What a form shows of an error: at the fields that it names, else as a sentence. */
export function refusalOf(error: Error | null): Refusal | null {
  if (error === null) return null;
  if (!(error instanceof ApiProblem)) return { errors: [], detail: detailOf(error) };
  if (error.isUnreachable)
    return {
      errors: [],
      detail: 'The database or server can’t be reached. Nothing is saved yet: save again.',
    };
  return { errors: error.errors, detail: error.detail };
}
