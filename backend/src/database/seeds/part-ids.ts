import type { EntityManager } from 'typeorm';
import { Part } from '../../library/entities/part.entity.js';

/** The parts that a team reads, by what makes them the same part: the team's own records before the curated. */
export async function findPartIds(manager: EntityManager, teamId: number): Promise<Map<string, number>> {
  const parts = await manager
    .createQueryBuilder(Part, 'part')
    .innerJoin('part.library', 'library')
    .where('library.teamId IS NULL OR library.teamId = :teamId', { teamId })
    .orderBy('library.teamId')
    .getMany();
  return new Map(parts.map(({ normalisedKey, id }) => [normalisedKey, id]));
}
