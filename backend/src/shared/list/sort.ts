import { DomainError } from '../errors/domain-error.js';

export interface Sort<Key extends string> {
  key: Key;
  descending: boolean;
}

/** Reads `name` or `-name`; anything that isn't on the list's allow-list is refused at `sort`. */
export function parseSort<Key extends string>(sort: string, allowed: readonly Key[]): Sort<Key> {
  const descending = sort.startsWith('-');
  const key = allowed.find((candidate) => candidate === (descending ? sort.slice(1) : sort));
  if (key !== undefined) return { key, descending };
  const message = `sort: one of these was expected: ${allowed.join(', ')}`;
  throw new DomainError('request.invalid', 'The list can’t be sorted by this.', {
    errors: [{ field: 'sort', message }],
  });
}
