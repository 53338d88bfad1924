import type { Library, PartKind } from '@roothertz/common/parts';
import { addDays, EXPIRING_DAYS, OFFER_STATES } from '@roothertz/common/prices';
import { Brackets, type EntityManager, type SelectQueryBuilder } from 'typeorm';
import type { Part } from '../library/entities/part.entity.js';
import { selectReadableParts } from '../library/readable-parts.js';
import type { Caller } from '../shared/access/caller.js';
import { likePattern } from '../shared/list/like-pattern.js';
import { parseSort, type Sort } from '../shared/list/sort.js';
import { OfferBreak } from './entities/offer-break.entity.js';
import { Offer } from './entities/offer.entity.js';
import type { OfferView } from './offer-response.js';

/** For what the grid can be narrowed to: offers that need a look, and parts without an offer. */
export const PRICE_STATES = [...OFFER_STATES, 'missing'] as const;
export type PriceState = (typeof PRICE_STATES)[number];

export interface PriceQuery {
  search?: string;
  state?: PriceState[];
  library?: Library[];
  kind?: PartKind[];
  partId?: string;
  supplierId?: string;
  usedInConditions?: boolean;
}

export type PriceSelect = SelectQueryBuilder<Part>;

const SORT_COLUMNS = {
  manufacturer: 'part.manufacturer',
  partNumber: 'part.partNumber',
  supplier: 'supplier.name',
  supplierNumber: 'offer.supplierNumber',
  currency: 'offer.currency',
  minimumOrderQuantity: 'offer.minimumOrderQuantity',
  orderMultiple: 'offer.orderMultiple',
  leadTimeDays: 'offer.leadTimeDays',
  stock: 'offer.stock',
  validFrom: 'offer.validFrom',
  validUntil: 'offer.validUntil',
  confirmedAt: 'offer.confirmedAt',
} as const;
type SortColumn = keyof typeof SORT_COLUMNS;
/** A column of the offers, or the price from a quantity on such as `price:100`. */
export type PriceSort = SortColumn | `price:${number}`;

const SORTS = Object.keys(SORT_COLUMNS) as SortColumn[];
const PRICE_AT = /^(-?)(price:[1-9]\d{0,9})$/;

export function parsePriceSort(sort: string): Sort<PriceSort> {
  const [, minus, key] = PRICE_AT.exec(sort) ?? [];
  return key === undefined ? parseSort(sort, SORTS) : { key: key as PriceSort, descending: minus === '-' };
}

const SEARCHED = ['part.manufacturer', 'part.partNumber', 'supplier.name', 'offer.supplierNumber'];

/** The parts that a caller reads, each with the open offers of the caller's team; those without have none. */
export function selectPrices(manager: EntityManager, caller: Caller): PriceSelect {
  return selectReadableParts(manager, caller)
    .leftJoin(Offer, 'offer', 'offer.partId = part.id AND offer.teamId = :teamId AND offer.closedAt IS NULL')
    .leftJoin('offer.supplier', 'supplier');
}

/** @param inUse the ids of the parts that are chosen in saved conditions */
export function filterPrices(
  select: PriceSelect,
  query: PriceQuery,
  view: OfferView,
  inUse: readonly number[],
): PriceSelect {
  const { state, library, kind, partId, supplierId, usedInConditions, search = '' } = query;
  if (state?.length) select.andWhere(anyState(state, view));
  else if (!usedInConditions && !partId) select.andWhere('offer.id IS NOT NULL');
  if (usedInConditions) select.andWhere('part.id IN (:...inUse)', { inUse: [0, ...inUse] });
  if (kind?.length) select.andWhere('part.kind IN (:...kind)', { kind });
  if (library?.length)
    select.andWhere('(library.teamId IS NOT NULL) IN (:...isTeam)', {
      isTeam: library.map((name) => name === 'team'),
    });
  if (partId) select.andWhere('part.id = :partId', { partId });
  if (supplierId) select.andWhere('supplier.id = :supplierId', { supplierId });
  const words = search.split(/\s+/).filter((word) => word !== '');
  words.forEach((word, index) => matchWord(select, word, `word${index}`));
  return select;
}

/** What a change of its terms leaves an offer, so that it keeps its place; ids are the last resort. */
const STANDING_ORDER = [
  'part.manufacturer',
  'part.partNumber',
  'part.id',
  'supplier.name',
  'offer.supplierNumber',
  'offer.id',
];

/** Sorts with unknown values last, and by name so that pages never overlap. */
export function sortPrices(select: PriceSelect, { key, descending }: Sort<PriceSort>): PriceSelect {
  const column = sortColumn(select, key);
  select.orderBy(`${column} IS NULL`).addOrderBy(column, descending ? 'DESC' : 'ASC');
  for (const next of STANDING_ORDER) if (next !== column) select.addOrderBy(next);
  return select;
}

function sortColumn(select: PriceSelect, key: PriceSort): string {
  if (key in SORT_COLUMNS) return SORT_COLUMNS[key as SortColumn];
  const quantity = Number(key.slice('price:'.length));
  const on = 'sorted.offerId = offer.id AND sorted.minimumQuantity = :quantity';
  select.leftJoin(OfferBreak, 'sorted', on, { quantity });
  return 'sorted.unitPrice';
}

function anyState(states: readonly PriceState[], { today, staleAfterDays }: OfferView): Brackets {
  const conditions: Record<PriceState, [string, object]> = {
    stale: ['offer.confirmedAt < :stale', { stale: new Date(addDays(today, -staleAfterDays)) }],
    expiring: ['offer.validUntil BETWEEN :today AND :soon', { today, soon: addDays(today, EXPIRING_DAYS) }],
    expired: ['offer.validUntil < :today', { today }],
    missing: ['offer.id IS NULL', {}],
  };
  return new Brackets((where) => states.forEach((state) => where.orWhere(...conditions[state])));
}

function matchWord(select: PriceSelect, word: string, name: string): void {
  const matches = SEARCHED.map((column) => `${column} LIKE :${name} ESCAPE '!'`);
  select.andWhere(`(${matches.join(' OR ')})`, { [name]: likePattern(word) });
}
