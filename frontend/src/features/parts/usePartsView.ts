import { useMemo } from 'react';
import { useAddressFields } from '../../components/useAddressFields';
import type { KindOfPart } from './kindOfPart';
import { readPartsView } from './partsView';

/** What the list shows, kept in the page's address. */
export function usePartsView(kind: KindOfPart) {
  const { fields, change } = useAddressFields();
  const view = useMemo(() => readPartsView(kind, fields), [kind, fields]);
  return { view, change };
}
