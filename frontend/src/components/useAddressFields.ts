import { useCallback } from 'react';
import { useAddress } from './useAddress';

export type ChangeFields = (changes: Record<string, string | readonly string[] | undefined>) => void;

/** The fields of the page's address and how to change some of them; what is empty or undefined leaves it. */
export function useAddressFields() {
  const { params, change: changeAddress } = useAddress();
  const change = useCallback<ChangeFields>(
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
  return { fields: params, change };
}
