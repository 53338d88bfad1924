import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { likePattern } from '../shared/list/like-pattern.js';
import { SavedConditions } from './entities/saved-conditions.entity.js';

export type ConditionsSelect = SelectQueryBuilder<SavedConditions>;

/** The saved conditions of a caller's team, with the chosen parts and the one who changed them last: every query starts from here. */
export function selectConditions(manager: EntityManager, { teamId }: Caller): ConditionsSelect {
  return manager
    .createQueryBuilder(SavedConditions, 'saved')
    .leftJoinAndSelect('saved.parts', 'chosen')
    .leftJoin('saved.updatedBy', 'updatedBy')
    .addSelect(['updatedBy.id', 'updatedBy.name'])
    .where('saved.teamId = :teamId', { teamId });
}

export function searchByName(select: ConditionsSelect, search = ''): ConditionsSelect {
  return select.andWhere(`saved.name LIKE :name ESCAPE '!'`, { name: likePattern(search) });
}
