import type { Library, PartKind } from '@roothertz/common/parts';
import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { Part } from './entities/part.entity.js';

/** What a part of any kind is called. */
export interface PartName {
  id: number;
  library: Library;
  kind: PartKind;
  manufacturer: string;
  partNumber: string;
}

/** The parts of all kinds that a caller may read, as `part` with its `library`. */
export function selectReadableParts(
  manager: EntityManager,
  { teamId }: Pick<Caller, 'teamId'>,
): SelectQueryBuilder<Part> {
  return manager
    .createQueryBuilder(Part, 'part')
    .innerJoinAndSelect('part.library', 'library')
    .where('(library.teamId IS NULL OR library.teamId = :teamId)', { teamId });
}

/** Which of the ids belong to parts that a caller may read. */
export async function findReadableIds(
  manager: EntityManager,
  caller: Caller,
  ids: readonly number[],
): Promise<Set<number>> {
  return new Set((await findReadableParts(manager, caller, ids)).map(({ id }) => id));
}

/** The parts that a team may read among the given ids. */
export async function findReadableParts(
  manager: EntityManager,
  team: Pick<Caller, 'teamId'>,
  ids: readonly number[],
): Promise<Part[]> {
  if (ids.length === 0) return [];
  return selectReadableParts(manager, team).andWhere('part.id IN (:...ids)', { ids }).getMany();
}

export function toPartName({ id, library, kind, manufacturer, partNumber }: Part): PartName {
  return { id, library: library.teamId === null ? 'curated' : 'team', kind, manufacturer, partNumber };
}

/** A part by what makes it the same part however its name is written. */
export type KeyedPartName = PartName & { normalisedKey: string };

/** The parts of these keys in the libraries that a caller reads; the team's own stand before the curated ones. */
export async function findPartNames(
  manager: EntityManager,
  caller: Caller,
  keys: readonly string[],
): Promise<KeyedPartName[]> {
  if (keys.length === 0) return [];
  const parts = await selectReadableParts(manager, caller)
    .andWhere('part.normalisedKey IN (:...keys)', { keys })
    .orderBy('library.teamId IS NULL')
    .addOrderBy('part.id')
    .getMany();
  return parts.map((part) => ({ ...toPartName(part), normalisedKey: part.normalisedKey }));
}
