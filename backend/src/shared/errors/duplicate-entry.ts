import { QueryFailedError } from 'typeorm';

/** Whether a query failed because a unique index holds the same entry already. */
export function isDuplicateEntry(error: unknown): boolean {
  return (
    error instanceof QueryFailedError && 'errno' in error.driverError && error.driverError.errno === 1062
  );
}
