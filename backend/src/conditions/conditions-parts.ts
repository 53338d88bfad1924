import { type EntityManager, In, Not } from 'typeorm';
import { findReadableIds } from '../library/readable-parts.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { SavedConditionsPart } from './entities/saved-conditions-part.entity.js';

/** Saved conditions at which a part was chosen. */
export interface PartUse {
  conditionsId: number;
  name: string;
  quantity: number;
  /** Who saved the conditions first; null where that member has left. */
  createdById: number | null;
  /** Who changed the conditions last; null where that member has left. */
  updatedById: number | null;
}

/** Keeps which parts are chosen at saved conditions, in place of those before; what stays chosen isn't touched. */
export async function writeParts(
  manager: EntityManager,
  caller: Caller,
  conditionsId: number,
  ids: readonly string[],
): Promise<void> {
  const readable = await findReadableIds(manager, caller, ids.map(Number));
  const errors = ids.flatMap((id, index) =>
    readable.has(Number(id))
      ? []
      : [{ field: `partIds[${index}]`, message: 'your libraries have no such part' }],
  );
  if (errors.length > 0)
    throw new DomainError('part.not-found', 'There is no such part in your libraries.', { errors });
  const before = await manager.findBy(SavedConditionsPart, { conditionsId });
  const chosen = new Set(before.map(({ partId }) => partId));
  await manager.delete(SavedConditionsPart, { conditionsId, partId: Not(In([...readable])) });
  await manager.insert(
    SavedConditionsPart,
    [...readable].filter((id) => !chosen.has(id)).map((partId) => ({ conditionsId, partId })),
  );
}

/** The parts that a team has chosen at its saved conditions, each with these conditions in the order of their names. */
export async function findPartsInUse(
  manager: EntityManager,
  { teamId }: Pick<Caller, 'teamId'>,
): Promise<Map<number, PartUse[]>> {
  const found = await manager
    .createQueryBuilder(SavedConditionsPart, 'chosen')
    .innerJoinAndSelect('chosen.conditions', 'saved')
    .where('saved.teamId = :teamId', { teamId })
    .orderBy('saved.name')
    .addOrderBy('saved.id')
    .getMany();
  const uses = new Map<number, PartUse[]>();
  for (const { partId, conditions } of found) {
    const { id: conditionsId, name, quantity, createdById, updatedById } = conditions;
    const use = { conditionsId, name, quantity, createdById, updatedById };
    uses.set(partId, [...(uses.get(partId) ?? []), use]);
  }
  return uses;
}

/** The teams that have chosen parts at saved conditions. */
export async function findTeamsWithParts(manager: EntityManager): Promise<number[]> {
  const found = await manager
    .createQueryBuilder(SavedConditionsPart, 'chosen')
    .innerJoin('chosen.conditions', 'saved')
    .select('DISTINCT saved.teamId', 'teamId')
    .orderBy('saved.teamId')
    .getRawMany<{ teamId: number }>();
  return found.map(({ teamId }) => teamId);
}
