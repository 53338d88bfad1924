import { LIBRARIES, PART_KINDS } from '@roothertz/common/parts';
import type { PriceQuery } from '../../api/prices';

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
export type PricesView = Omit<PriceQuery, 'sort'> & { search: string };

export function readPricesView(address: URLSearchParams): PricesView {
  return {
    search: address.get('search') ?? '',
    ...chosen('state', PRICE_STATES, address),
    ...chosen('kind', PART_KINDS, address),
    ...chosen('library', LIBRARIES, address),
    ...idOf('partId', address),
    ...idOf('supplierId', address),
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

export function isNarrowed({ search, ...filters }: PricesView): boolean {
  return search.trim() !== '' || Object.keys(filters).length > 0;
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
