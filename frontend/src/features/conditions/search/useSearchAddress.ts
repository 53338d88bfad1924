import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import {
  readSearch,
  readView,
  withSearch,
  withView,
  type SearchContent,
  type SearchKeys,
} from './searchAddress';
import { PLACE_KEYS, STAGE_SEARCH_KEYS, type View } from './searchKeys';

/** Fields of the address, and how to change them. */
export interface SearchForm<Keys extends SearchKeys> extends SearchContent<Keys> {
  keys: Keys;
  change: (values: Partial<Record<keyof Keys, number>>) => void;
}

export type StageSearchForm = SearchForm<typeof STAGE_SEARCH_KEYS>;
export type PlaceForm = SearchForm<typeof PLACE_KEYS>;

/** What the address says beside the operating conditions: what is ranked, and the fields of that. */
export function useSearchAddress() {
  const [params, setParams] = useSearchParams();
  const show = useCallback(
    (view: View) => setParams((current) => withView(current, view), { preventScrollReset: true }),
    [setParams],
  );
  return {
    view: readView(params),
    show,
    stageSearch: useSearchForm(STAGE_SEARCH_KEYS),
    place: useSearchForm(PLACE_KEYS),
  };
}

function useSearchForm<Keys extends SearchKeys>(keys: Keys): SearchForm<Keys> {
  const [params, setParams] = useSearchParams();
  const content = useMemo(() => readSearch(params, keys), [params, keys]);
  const change = useCallback(
    (values: Partial<Record<keyof Keys, number>>) =>
      setParams((current) => withSearch(current, keys, values), { preventScrollReset: true }),
    [setParams, keys],
  );
  return useMemo(() => ({ ...content, keys, change }), [content, keys, change]);
}
