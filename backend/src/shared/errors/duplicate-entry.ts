import type { FieldError } from '@roothertz/common/parts';
import { QueryFailedError } from 'typeorm';
import { DomainError } from './domain-error.js';
import type { ErrorCode } from './error-codes.js';

/** Whether a query failed because a unique index holds the same entry already. */
export function isDuplicateEntry(error: unknown): boolean {
  return (
    error instanceof QueryFailedError && 'errno' in error.driverError && error.driverError.errno === 1062
  );
}

/** For the catch of a write: what says that its entry stands already is told as this error. */
export function duplicateAs(code: ErrorCode, detail: string, errors?: FieldError[]) {
  return (error: unknown): never => {
    throw isDuplicateEntry(error) ? new DomainError(code, detail, { errors }) : error;
  };
}
