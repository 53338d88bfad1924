import type { LibraryPart, Standing } from '@roothertz/common/parts';
import { type EntityManager, In } from 'typeorm';
import { DomainError } from '../shared/errors/domain-error.js';
import { readId } from '../shared/ids/read-id.js';
import { Part } from './entities/part.entity.js';
import type { PartRecord } from './part-record.js';

/** How a part is to stand from now on, of the version that was last read; what is left out stays. */
export interface StandingChange extends Partial<Standing> {
  id: string;
  version: number;
}

/** A part beside the standing that it is to have. */
export interface Restood<Kind extends LibraryPart> {
  current: PartRecord<Kind>;
  standing: Standing;
}

/** The number of each part that is to change, in the order of the changes; each may be named once. */
export function idsOfChanges(changes: readonly StandingChange[]): number[] {
  const seen = new Set<string>();
  const twice = changes.flatMap(({ id }, index) => (seen.size === seen.add(id).size ? [index] : []));
  if (twice.length === 0) return changes.map(({ id }) => readId(id)!);
  throw new DomainError('request.invalid', 'A part is named twice.', {
    errors: twice.map((index) => ({ field: `parts[${index}].id`, message: 'each part once was expected' })),
  });
}

/** Those parts whose standing changes. All are refused together where one of them can't be changed, each with its reason. */
export function restood<Kind extends LibraryPart>(
  changes: readonly StandingChange[],
  found: ReadonlyMap<string, PartRecord<Kind>>,
): Restood<Kind>[] {
  refuse(changes, 'part.not-found', 'Some of these parts aren’t in your libraries.', ({ id }) =>
    found.has(id) ? null : 'there is no such part in your libraries',
  );
  const named = (id: string) => found.get(id)!;
  refuse(changes, 'part.curated', 'Some of these parts are curated and can’t be changed.', ({ id }) =>
    named(id).library === 'team'
      ? null
      : `${named(id).partNumber}: curated parts are shared by all teams and can’t be changed`,
  );
  refuse(changes, 'part.stale', 'Some of these parts were changed meanwhile: load them again.', (change) =>
    named(change.id).version === change.version
      ? null
      : `${named(change.id).partNumber}: somebody has changed this part meanwhile`,
  );
  return changes
    .map(({ id, lifecycle, approval }) => {
      const current = named(id);
      return {
        current,
        standing: { lifecycle: lifecycle ?? current.lifecycle, approval: approval ?? current.approval },
      };
    })
    .filter(({ current, standing }) => standingKey(current) !== standingKey(standing));
}

/** Writes the standings, each as its part's next version: one statement for all parts that are to stand alike. */
export async function writeStandings<Kind extends LibraryPart>(
  manager: EntityManager,
  parts: readonly Restood<Kind>[],
  updatedBy: number,
): Promise<void> {
  const updatedAt = new Date();
  for (const key of new Set(parts.map(({ standing }) => standingKey(standing)))) {
    const alike = parts.filter(({ standing }) => standingKey(standing) === key);
    await manager.update(
      Part,
      { id: In(alike.map(({ current }) => current.id)) },
      { ...alike[0].standing, version: () => 'version + 1', updatedAt, updatedBy },
    );
  }
}

function standingKey({ lifecycle, approval }: Standing): string {
  return `${lifecycle} ${approval}`;
}

function refuse(
  changes: readonly StandingChange[],
  code: 'part.not-found' | 'part.curated' | 'part.stale',
  detail: string,
  faultOf: (change: StandingChange) => string | null,
): void {
  const errors = changes.flatMap((change, index) => {
    const message = faultOf(change);
    return message === null ? [] : [{ field: `parts[${index}]`, message }];
  });
  if (errors.length > 0) throw new DomainError(code, detail, { errors });
}
