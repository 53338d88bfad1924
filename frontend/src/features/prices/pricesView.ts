import { LIBRARIES, PART_KINDS } from '@roothertz/common/parts';
import type { PriceQuery } from '../../api/prices';
import { PLAIN_CELLS, quantityOf } from './draft/cells';

/** What an offer can be looked for by: what calls for a look, and parts without one. */
export const PRICE_STATES = ['stale', 'expiring', 'expired', 'missing'] as const;
export type PriceState = (typeof PRICE_STATES)[number];

export const STATE_LABELS: Record<PriceState, string> = {
  stale: 'stale',
  expiring: 'expiring',
  expired: 'expired',
  missing: 'no price',
};

/** What the grid shows, as the page's address holds it. */
export type PricesView = PriceQuery & { search: string };

/** What the server calls the columns that rows can be sorted by; those of prices are sorted by their own names. */
const SORT_KEYS: Readonly<Record<string, string>> = {
  part: 'partNumber',
  confirmed: 'confirmedAt',
  ...Object.fromEntries(PLAIN_CELLS.map((cell) => [cell, cell])),
};

/** What to sort by for a column; undefined = it can't be sorted. */
export function sortKeyOf(column: string): string | undefined {
  return quantityOf(column) === null ? SORT_KEYS[column] : column;
}

/** How the rows are sorted by a column. */
export function sortOf(column: string, sort = ''): 'asc' | 'desc' | null {
  if (sort.replace('-', '') !== sortKeyOf(column)) return null;
  return sort.startsWith('-') ? 'desc' : 'asc';
}

export function readPricesView(address: URLSearchParams): PricesView {
  return {
    search: address.get('search') ?? '',
    ...chosen('state', PRICE_STATES, address),
    ...chosen('kind', PART_KINDS, address),
    ...chosen('library', LIBRARIES, address),
    ...idOf('partId', address),
    ...idOf('supplierId', address),
    ...sortIn(address),
    ...(address.get('usedInConditions') === 'true' && { usedInConditions: true }),
  };
}

function chosen<Key extends string, Option extends string>(
  key: Key,
  options: readonly Option[],
  address: URLSearchParams,
): Partial<Record<Key, Option[]>> {
  const words = (address.get(key) ?? '').split(',');
  const found = options.filter((option) => words.includes(option));
  return found.length === 0 ? {} : ({ [key]: found } as Record<Key, Option[]>);
}

function idOf<Key extends string>(key: Key, address: URLSearchParams): Partial<Record<Key, string>> {
  const id = address.get(key) ?? '';
  return /^\d{1,10}$/.test(id) ? ({ [key]: id } as Record<Key, string>) : {};
}

function sortIn(address: URLSearchParams): Pick<PricesView, 'sort'> {
  const sort = address.get('sort') ?? '';
  const key = sort.replace(/^-/, '');
  const isKnown = Object.values(SORT_KEYS).includes(key) || /^price:[1-9]\d{0,9}$/.test(key);
  return isKnown ? { sort } : {};
}

export function isNarrowed(view: PricesView): boolean {
  return view.search.trim() !== '' || NARROWING_KEYS.some((key) => key !== 'search' && key in view);
}

/** Everything in the address that hides rows. */
export const NARROWING_KEYS = [
  'search',
  'state',
  'kind',
  'library',
  'partId',
  'supplierId',
  'usedInConditions',
] as const;
