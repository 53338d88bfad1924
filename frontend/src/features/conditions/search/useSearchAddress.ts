import type { StageSort } from '@roothertz/common/noise';
import type { Technology } from '@roothertz/common/parts';
import { useCallback, useMemo } from 'react';
import type { Address } from '../../../components/useAddress';
import {
  readSearch,
  readSort,
  readTechnologies,
  readView,
  withSearch,
  withSort,
  withTechnologies,
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

/** What the address says beside the operating conditions: what is ranked, and the fields of that. */
export function useSearchAddress(address: Address) {
  const { params, change } = address;
  const show = useCallback((view: View) => change((before) => withView(before, view)), [change]);
  const sortBy = useCallback((sort: StageSort) => change((before) => withSort(before, sort)), [change]);
  const chooseTechnologies = useCallback(
    (chosen: readonly Technology[]) => change((before) => withTechnologies(before, chosen)),
    [change],
  );
  return {
    view: readView(params),
    show,
    sort: readSort(params),
    sortBy,
    technologies: useMemo(() => readTechnologies(params), [params]),
    chooseTechnologies,
    stageSearch: useSearchForm(address, STAGE_SEARCH_KEYS),
    place: useSearchForm(address, PLACE_KEYS),
  };
}

function useSearchForm<Keys extends SearchKeys>(
  { params, change: changeAddress }: Address,
  keys: Keys,
): SearchForm<Keys> {
  const content = useMemo(() => readSearch(params, keys), [params, keys]);
  const change = useCallback(
    (values: Partial<Record<keyof Keys, number>>) =>
      changeAddress((before) => withSearch(before, keys, values)),
    [changeAddress, keys],
  );
  return useMemo(() => ({ ...content, keys, change }), [content, keys, change]);
}
