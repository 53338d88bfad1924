import {
  type Approval,
  type InputType,
  type Library,
  type Lifecycle,
  OP_AMP_PARAMETERS,
} from '@roothertz/common/parts';
import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { likePattern } from '../shared/list/like-pattern.js';
import type { Sort } from '../shared/list/sort.js';
import { OpAmp } from './entities/op-amp.entity.js';

/** What a list of op-amps can be sorted by. */
export const OP_AMP_SORTS = [
  'manufacturer',
  'partNumber',
  'description',
  'package',
  'lifecycle',
  'approval',
  'library',
  'updatedAt',
  'inputType',
  ...OP_AMP_PARAMETERS.map(({ key }) => key),
] as const;
export type OpAmpSort = (typeof OP_AMP_SORTS)[number];

/** Which op-amps a list holds and in which order. */
export interface OpAmpQuery {
  limit: number;
  offset: number;
  sort: Sort<OpAmpSort>;
  search?: string;
  library?: Library[];
  lifecycle?: Lifecycle[];
  approval?: Approval[];
  inputType?: InputType[];
}

export type OpAmpSelect = SelectQueryBuilder<OpAmp>;

const PART_SORTS: readonly OpAmpSort[] = OP_AMP_SORTS.slice(0, OP_AMP_SORTS.indexOf('library'));
const IS_TEAM = 'library.teamId IS NOT NULL';
const SEARCHED = ['part.manufacturer', 'part.partNumber', 'part.description'];

/** The op-amps that a caller may read: every query on parts starts from here. */
export function selectOpAmps(manager: EntityManager, { teamId }: Caller): OpAmpSelect {
  return manager
    .createQueryBuilder(OpAmp, 'opAmp')
    .innerJoinAndSelect('opAmp.part', 'part')
    .innerJoinAndSelect('part.library', 'library')
    .where('(library.teamId IS NULL OR library.teamId = :teamId)', { teamId });
}

/** Narrows a selection to what a list asks for. */
export function filterOpAmps(select: OpAmpSelect, query: OpAmpQuery): OpAmpSelect {
  const { library, lifecycle, approval, inputType } = query;
  if (lifecycle?.length) select.andWhere('part.lifecycle IN (:...lifecycle)', { lifecycle });
  if (approval?.length) select.andWhere('part.approval IN (:...approval)', { approval });
  if (inputType?.length) select.andWhere('opAmp.amplifier.inputType IN (:...inputType)', { inputType });
  if (library?.length)
    select.andWhere(`(${IS_TEAM}) IN (:...isTeam)`, { isTeam: library.map((name) => name === 'team') });
  searchWords(query.search).forEach((word, index) => matchWord(select, word, `word${index}`));
  return select;
}

/** Sorts with unknown values last, and by name and number so that pages never overlap. */
export function sortOpAmps(select: OpAmpSelect, { key, descending }: Sort<OpAmpSort>): OpAmpSelect {
  const column = sortColumn(key);
  select.orderBy(`${column} IS NULL`).addOrderBy(column, descending ? 'DESC' : 'ASC');
  for (const next of ['part.manufacturer', 'part.partNumber', 'part.id'])
    if (next !== column) select.addOrderBy(next);
  return select;
}

function sortColumn(key: OpAmpSort): string {
  if (key === 'library') return IS_TEAM;
  if (key === 'updatedAt') return 'part.updatedAt';
  return PART_SORTS.includes(key) ? `part.${key}` : `opAmp.amplifier.${key}`;
}

function searchWords(search = ''): string[] {
  return search.split(/\s+/).filter((word) => word !== '');
}

function matchWord(select: OpAmpSelect, word: string, name: string): void {
  const matches = SEARCHED.map((column) => `${column} LIKE :${name} ESCAPE '!'`);
  select.andWhere(`(${matches.join(' OR ')})`, { [name]: likePattern(word) });
}
