import { useMemo } from 'react';
import { useAddressFields } from '../../components/useAddressFields';
import { readPricesView } from './pricesView';

/** What the grid shows, kept in the page's address. */
export function usePricesView() {
  const { fields, change } = useAddressFields();
  const view = useMemo(() => readPricesView(fields), [fields]);
  return { view, change };
}
