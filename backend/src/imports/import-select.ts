import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { readId } from '../shared/ids/read-id.js';
import { Import } from './entities/import.entity.js';

const MEMBERS = ['createdBy', 'appliedBy', 'undoneBy'];

/** The imports of a caller's team with those who did something to them: every query starts from here. */
export function selectImports(manager: EntityManager, { teamId }: Caller): SelectQueryBuilder<Import> {
  const select = manager
    .createQueryBuilder(Import, 'import')
    .innerJoinAndSelect('import.progress', 'progress')
    .where('import.teamId = :teamId', { teamId });
  for (const member of MEMBERS)
    select.leftJoin(`import.${member}`, member).addSelect([`${member}.id`, `${member}.name`]);
  return select;
}

export async function findImport(manager: EntityManager, caller: Caller, id: string): Promise<Import> {
  const number = readId(id);
  const found =
    number && (await selectImports(manager, caller).andWhere('import.id = :number', { number }).getOne());
  if (!found) throw new DomainError('import.not-found', 'Your team has no such import.');
  return found;
}
