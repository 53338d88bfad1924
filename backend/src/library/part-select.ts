import {
  type Approval,
  gapFields,
  type Library,
  type LibraryPart,
  type Lifecycle,
  type ListedFields,
} from '@roothertz/common/parts';
import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { likePattern } from '../shared/list/like-pattern.js';
import type { Sort } from '../shared/list/sort.js';
import type { ParameterRow, PartTable } from './part-tables.js';

/** Which parts of a kind are meant. */
export interface PartFilters {
  search?: string;
  library?: Library[];
  lifecycle?: Lifecycle[];
  approval?: Approval[];
  /** Words of the kind's choice, such as input types. */
  choice?: string[];
  /** Parts that lack one of these. */
  missing?: string[];
  /** Limits of a parameter, themselves included. */
  range?: { key: string; from?: number; to?: number };
}

/** Which parts of a kind a list holds and in which order. */
export interface PartQuery extends PartFilters {
  limit: number;
  offset: number;
  sort: Sort<string>;
}

export type PartSelect = SelectQueryBuilder<ParameterRow>;

const PART_SORTS = [
  'manufacturer',
  'partNumber',
  'description',
  'package',
  'lifecycle',
  'approval',
  'updatedAt',
];
const COMPLETENESS = 'completeness';
const IS_TEAM = 'library.teamId IS NOT NULL';
const SEARCHED = ['part.manufacturer', 'part.partNumber', 'part.description'];

/** What a list of a kind of part can be sorted by. */
export function partSorts({ choice, parameters }: ListedFields): string[] {
  return [...PART_SORTS, 'library', COMPLETENESS, choice.key, ...parameters.map(({ key }) => key)];
}

/** The parts of a kind that a caller may read: every query on parts starts from here. */
export function selectParts<Kind extends LibraryPart>(
  manager: EntityManager,
  { entity }: PartTable<Kind>,
  { teamId }: Caller,
): PartSelect {
  return manager
    .createQueryBuilder(entity, 'kind')
    .innerJoinAndSelect('kind.part', 'part')
    .innerJoinAndSelect('part.library', 'library')
    .where('(library.teamId IS NULL OR library.teamId = :teamId)', { teamId });
}

/** Narrows a selection to what a list asks for. */
export function filterParts(select: PartSelect, fields: ListedFields, query: PartFilters): PartSelect {
  const { library, lifecycle, approval, choice, missing, range } = query;
  if (lifecycle?.length) select.andWhere('part.lifecycle IN (:...lifecycle)', { lifecycle });
  if (approval?.length) select.andWhere('part.approval IN (:...approval)', { approval });
  if (choice?.length)
    select.andWhere(`${parameterColumn(fields, fields.choice.key)} IN (:...choice)`, { choice });
  if (missing?.length) select.andWhere(`(${missing.map((key) => isUnknown(fields, key)).join(' OR ')})`);
  if (library?.length)
    select.andWhere(`(${IS_TEAM}) IN (:...isTeam)`, { isTeam: library.map((name) => name === 'team') });
  if (range?.from !== undefined)
    select.andWhere(`${parameterColumn(fields, range.key)} >= :from`, { from: range.from });
  if (range?.to !== undefined)
    select.andWhere(`${parameterColumn(fields, range.key)} <= :to`, { to: range.to });
  searchWords(query.search).forEach((word, index) => matchWord(select, word, `word${index}`));
  return select;
}

/** Sorts with unknown values last, and by name and number so that pages never overlap. */
export function sortParts(
  select: PartSelect,
  fields: ListedFields,
  { key, descending }: Sort<string>,
): PartSelect {
  const column = sortColumn(fields, key);
  select.orderBy(`${column} IS NULL`).addOrderBy(column, descending ? 'DESC' : 'ASC');
  for (const next of ['part.manufacturer', 'part.partNumber', 'part.id'])
    if (next !== column) select.addOrderBy(next);
  return select;
}

function sortColumn(fields: ListedFields, key: string): string {
  if (key === 'library') return IS_TEAM;
  if (key === COMPLETENESS) return completeness(fields);
  return PART_SORTS.includes(key) ? `part.${key}` : parameterColumn(fields, key);
}

/** The SQL that says whether a part lacks a parameter. */
export function isUnknown(fields: ListedFields, key: string): string {
  return `${parameterColumn(fields, key)} IS NULL`;
}

/** Rises with what is known, as the completeness in common does. */
function completeness(fields: ListedFields): string {
  const gaps = gapFields(fields).map(({ key, weight }) => `${weight} * (${isUnknown(fields, key)})`);
  return `(0 - ${gaps.join(' - ')})`;
}

function parameterColumn({ group }: ListedFields, key: string): string {
  return `kind.${group}.${key}`;
}

function searchWords(search = ''): string[] {
  return search.split(/\s+/).filter((word) => word !== '');
}

function matchWord(select: PartSelect, word: string, name: string): void {
  const matches = SEARCHED.map((column) => `${column} LIKE :${name} ESCAPE '!'`);
  select.andWhere(`(${matches.join(' OR ')})`, { [name]: likePattern(word) });
}
