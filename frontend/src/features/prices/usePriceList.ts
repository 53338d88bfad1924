import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import {
  type PriceListRow,
  priceSettingsQuery,
  type PriceListPage,
  pricesQuery,
  suppliersQuery,
} from '../../api/prices';
import { useDebounced } from '../../components/useDebounced';
import { useKeptPages } from '../../components/useKeptPages';
import { toGridRow } from './draft/cells';
import type { PricesView } from './pricesView';

const PAUSE_IN_TYPING = 300;

/** The rows of a view as far as they are loaded, and what new offers begin with. */
export function usePriceList({ search, ...filters }: PricesView) {
  const asked = useDebounced(search.trim(), PAUSE_IN_TYPING);
  const query = pricesQuery({ ...filters, ...(asked !== '' && { search: asked }) });
  const { pages, error, retry, isLoadingMore, loadMore, loadNext } = useKeptPages(query, true);
  const suppliers = useQuery(suppliersQuery);
  const settings = useQuery(priceSettingsQuery);
  const items = useMemo(() => pages && rowsOf(pages), [pages]);
  return {
    list: items &&
      suppliers.data &&
      settings.data && {
        items,
        total: pages?.at(-1)?.total ?? 0,
        suppliers: suppliers.data,
        currency: settings.data.currency,
        isLoadingMore,
        loadMore,
        loadTo: (count: number) => loadTo(count, loadNext),
      },
    error: error ?? suppliers.error ?? settings.error,
    retry: () => void Promise.all([retry(), suppliers.refetch(), settings.refetch()]),
  };
}

export type PriceList = NonNullable<ReturnType<typeof usePriceList>['list']>;

interface Loaded {
  data: { pages: PriceListPage[] } | undefined;
  error: Error | null;
  hasNextPage: boolean;
}

/** Loads pages until there are so many rows, or all; throws where they can't be loaded. */
async function loadTo(count: number, loadNext: () => Promise<Loaded>): Promise<PriceListRow[]> {
  for (;;) {
    const { data, error, hasNextPage } = await loadNext();
    if (error || !data) throw error ?? new Error('no rows');
    const rows = rowsOf(data.pages);
    if (rows.length >= count || !hasNextPage) return rows;
  }
}

/** What was shifted from one page to the next between their loading stands in both. */
function rowsOf(pages: readonly PriceListPage[]): PriceListRow[] {
  const rows = pages.flatMap(({ items }) => items);
  return [...new Map(rows.map((row) => [toGridRow(row).key, row])).values()];
}
