import { useCallback, useEffect, useMemo, useRef } from 'react';
import { useSearchParams } from 'react-router-dom';

/** The query of the page's address, and how to change it. */
export interface Address {
  params: URLSearchParams;
  /** @param replace no step back */
  change: (update: (before: URLSearchParams) => URLSearchParams, replace?: boolean) => void;
}

/** Changes in quick succession all count: each starts from the latest address asked for. */
export function useAddress(): Address {
  const [params, setParams] = useSearchParams();
  const latest = useRef(params);
  useEffect(() => {
    latest.current = params;
  }, [params]);
  const change = useCallback<Address['change']>(
    (update, replace = false) => {
      latest.current = update(latest.current);
      setParams(latest.current, { replace, preventScrollReset: true });
    },
    [setParams],
  );
  return useMemo(() => ({ params, change }), [params, change]);
}
