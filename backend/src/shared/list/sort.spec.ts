import { DomainError } from '../errors/domain-error.js';
import { parseSort } from './sort.js';

const KEYS = ['name', 'updatedAt'] as const;

describe('parseSort', () => {
  it('reads the key and the direction', () => {
    expect(parseSort('name', KEYS)).toEqual({ key: 'name', descending: false });
    expect(parseSort('-updatedAt', KEYS)).toEqual({ key: 'updatedAt', descending: true });
  });

  it.each(['', '-', '--name', 'Name', 'password_hash', 'name; DROP TABLE users', 'constructor'])(
    'refuses %j at the field sort',
    (sort) => {
      expect(errorOf(() => parseSort(sort, KEYS)).errors).toEqual([
        { field: 'sort', message: 'sort: one of these was expected: name, updatedAt' },
      ]);
    },
  );
});

function errorOf(run: () => unknown): Partial<DomainError> {
  try {
    run();
    return {};
  } catch (error) {
    return error as DomainError;
  }
}
