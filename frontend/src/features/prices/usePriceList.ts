import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { pricesQuery, suppliersQuery, type Supplier } from '../../api/prices';
import { useDebounced } from '../../components/useDebounced';
import type { PricesView } from './pricesView';

const PAUSE_IN_TYPING = 300;
const NO_SUPPLIERS: readonly Supplier[] = [];

/** The rows of a view and the team's suppliers. */
export function usePriceList({ search, ...filters }: PricesView) {
  const asked = useDebounced(search.trim(), PAUSE_IN_TYPING);
  const list = useQuery({
    ...pricesQuery({ ...filters, ...(asked !== '' && { search: asked }) }),
    placeholderData: keepPreviousData,
  });
  const suppliers = useQuery(suppliersQuery);
  return {
    items: list.data?.items,
    total: list.data?.total ?? 0,
    suppliers: suppliers.data ?? NO_SUPPLIERS,
    isPending: list.isPending || suppliers.isPending,
    error: list.error ?? suppliers.error,
    retry: () => void Promise.all([list.refetch(), suppliers.refetch()]),
  };
}
