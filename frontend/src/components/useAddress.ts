import { useCallback, useEffect, useMemo, useRef } from 'react';
import { useLocation, useNavigation, useSearchParams } from 'react-router-dom';

/** The query of the page's address, and how to change it. */
export interface Address {
  params: URLSearchParams;
  /** @param replace no step back */
  change: (update: (before: URLSearchParams) => URLSearchParams, replace?: boolean) => void;
}

/** Changes in quick succession all count: each starts from the latest address asked for. */
export function useAddress(): Address {
  const [params, setParams] = useSearchParams();
  const isLeaving = useIsLeaving();
  const latest = useRef(params);
  useEffect(() => {
    latest.current = params;
  }, [params]);
  const change = useCallback<Address['change']>(
    (update, replace = false) => {
      if (isLeaving) return;
      latest.current = update(latest.current);
      setParams(latest.current, { replace, preventScrollReset: true });
    },
    [setParams, isLeaving],
  );
  return useMemo(() => ({ params, change }), [params, change]);
}

/** Another page is on its way: a change of this one's address would call it off. */
function useIsLeaving(): boolean {
  const { pathname } = useLocation();
  const { location: next } = useNavigation();
  return next !== undefined && next.pathname !== pathname;
}
