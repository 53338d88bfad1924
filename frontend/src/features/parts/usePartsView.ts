import { useCallback, useEffect, useMemo, useRef } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { KindOfPart } from './kindOfPart';
import { readPartsView } from './partsView';

export type ChangeView = (changes: Record<string, string | readonly string[] | undefined>) => void;

/** What the list shows, kept in the page's address. */
export function usePartsView(kind: KindOfPart) {
  const [address, setAddress] = useSearchParams();
  const view = useMemo(() => readPartsView(kind, address), [kind, address]);
  /** The latest address asked for: a second change may come before the page has taken the first. */
  const latest = useRef(address);
  useEffect(() => {
    latest.current = address;
  }, [address]);
  const change = useCallback<ChangeView>(
    (changes) => {
      const next = new URLSearchParams(latest.current);
      for (const [key, value] of Object.entries(changes)) {
        if (value === undefined || value.length === 0) next.delete(key);
        else next.set(key, typeof value === 'string' ? value : value.join(','));
      }
      latest.current = next;
      setAddress(next, { replace: true });
    },
    [setAddress],
  );
  return { view, change };
}
