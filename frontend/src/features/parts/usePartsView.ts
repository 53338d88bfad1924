import { useCallback, useMemo } from 'react';
import { useAddress } from '../../components/useAddress';
import type { KindOfPart } from './kindOfPart';
import { readPartsView } from './partsView';

export type ChangeView = (changes: Record<string, string | readonly string[] | undefined>) => void;

/** What the list shows, kept in the page's address. */
export function usePartsView(kind: KindOfPart) {
  const { params, change: changeAddress } = useAddress();
  const view = useMemo(() => readPartsView(kind, params), [kind, params]);
  const change = useCallback<ChangeView>(
    (changes) =>
      changeAddress((before) => {
        const next = new URLSearchParams(before);
        for (const [key, value] of Object.entries(changes)) {
          if (value === undefined || value.length === 0) next.delete(key);
          else next.set(key, typeof value === 'string' ? value : value.join(','));
        }
        return next;
      }, true),
    [changeAddress],
  );
  return { view, change };
}
