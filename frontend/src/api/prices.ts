import { queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';
import { pagesQuery } from './pages';
import type { components, operations } from './schema';

type Schemas = components['schemas'];

export type PriceListRow = Schemas['PriceRowResponseDto'];
export type Offer = Schemas['OfferResponseDto'];
export type OfferedPart = Schemas['OfferedPartDto'];
export type Supplier = Schemas['ListedSupplierDto'];
export type PriceListPage = Schemas['PriceListDto'];
export type PriceSettings = Schemas['PriceSettingsDto'];
export type SavedPriceRow = Schemas['PriceRowDto'];
export type PriceHistory = Schemas['PriceHistoryDto'];
export type Rates = Schemas['RatesResponseDto'];
export type PartOffers = Schemas['PartOffersDto'];
export type PriceQuery = Omit<
  NonNullable<operations['listPrices']['parameters']['query']>,
  'limit' | 'offset'
>;

/** The rows that are loaded at once, and the most that the server gives. */
const ROWS_A_PAGE = 500;
const MOST_LISTED = 1000;

export const PRICES_KEY = ['prices'] as const;

export const PRICE_LISTS_KEY = [...PRICES_KEY, 'list'] as const;

export function pricesQuery(view: PriceQuery) {
  return pagesQuery([...PRICE_LISTS_KEY, view], (offset, signal) => {
    const query = { ...view, limit: ROWS_A_PAGE, offset };
    return answer(client.GET('/api/prices', { params: { query }, signal }));
  });
}

export const priceCountsQuery = queryOptions({
  queryKey: [...PRICES_KEY, 'counts'],
  queryFn: ({ signal }) => answer(client.GET('/api/prices/counts', { signal })),
});

export const suppliersQuery = queryOptions({
  queryKey: [...PRICES_KEY, 'suppliers'],
  queryFn: async ({ signal }) => {
    const query = { limit: MOST_LISTED, offset: 0 };
    return (await answer(client.GET('/api/suppliers', { params: { query }, signal }))).items;
  },
});

export const priceSettingsQuery = queryOptions({
  queryKey: [...PRICES_KEY, 'settings'],
  queryFn: ({ signal }) => answer(client.GET('/api/prices/settings', { signal })),
});

export const ratesQuery = queryOptions({
  queryKey: [...PRICES_KEY, 'rates'],
  queryFn: ({ signal }) => answer(client.GET('/api/prices/rates', { signal })),
});

export function partOffersQuery(id: string) {
  return queryOptions({
    queryKey: [...PRICES_KEY, 'part', id],
    queryFn: ({ signal }) =>
      answer(client.GET('/api/parts/{id}/offers', { params: { path: { id } }, signal })),
  });
}

export function priceHistoryQuery(partId: string, quantity: number) {
  const query = { partId, quantity };
  return queryOptions({
    queryKey: [...PRICES_KEY, 'history', partId, quantity],
    queryFn: ({ signal }) => answer(client.GET('/api/offers/history', { params: { query }, signal })),
    placeholderData: (before, asked) => (asked?.queryKey[2] === partId ? before : undefined),
  });
}

export async function savePrices(rows: SavedPriceRow[]): Promise<Offer[]> {
  return (await answer(client.PUT('/api/prices', { body: { rows } }))).items;
}

export async function confirmOffers(ids: string[]): Promise<Offer[]> {
  return (await answer(client.POST('/api/offers/confirm', { body: { ids } }))).items;
}

export async function undoConfirmation(ids: string[]): Promise<Offer[]> {
  return (await answer(client.POST('/api/offers/confirm/undo', { body: { ids } }))).items;
}

export async function closeOffer({ id, version }: Pick<Offer, 'id' | 'version'>): Promise<void> {
  await answer(client.DELETE('/api/offers/{id}', { params: { path: { id }, query: { version } } }));
}

/** Opens an offer again with the terms of one that was closed. */
export function reopenOffer(offer: Offer): Promise<Offer> {
  const { part, supplier, supplierNumber, currency, breaks, minimumOrderQuantity, orderMultiple } = offer;
  const { leadTimeDays, stock, validFrom, validUntil } = offer;
  const body = {
    ...{ partId: part.id, supplierId: supplier.id, supplierNumber, currency, breaks },
    ...{ minimumOrderQuantity, orderMultiple, leadTimeDays, stock, validFrom, validUntil },
  };
  return answer(client.POST('/api/offers', { body }));
}

export async function addSupplier(name: string): Promise<void> {
  await answer(client.POST('/api/suppliers', { body: { name } }));
}

export function saveSettings(body: PriceSettings): Promise<PriceSettings> {
  return answer(client.PUT('/api/prices/settings', { body }));
}

export async function saveRates(rates: Schemas['RateDto'][]): Promise<void> {
  await answer(client.PUT('/api/prices/rates', { body: { rates } }));
}
