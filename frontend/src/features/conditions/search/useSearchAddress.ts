import type { StageSort } from '@roothertz/common/noise';
import type { Technology } from '@roothertz/common/parts';
import { useCallback, useMemo } from 'react';
import type { Address } from '../../../components/useAddress';
import {
  readSearch,
  readSort,
  readTechnologies,
  readTolerance,
  readView,
  withSearch,
  withSort,
  withTechnologies,
  withTolerance,
  type SearchContent,
  type SearchKeys,
} from './searchAddress';
import { PLACE_KEYS, STAGE_SEARCH_KEYS } from './searchKeys';

/** Fields of the address, and how to change them. */
export interface SearchForm<Keys extends SearchKeys> extends SearchContent<Keys> {
  keys: Keys;
  change: (values: Partial<Record<keyof Keys, number>>) => void;
}

export type StageSearchForm = SearchForm<typeof STAGE_SEARCH_KEYS>;

/** What the address says beside the operating conditions: what is ranked, and the fields of that. */
export function useSearchAddress(address: Address) {
  const { params, change } = address;
  const sortBy = useCallback((sort: StageSort) => change((before) => withSort(before, sort)), [change]);
  const chooseTechnologies = useCallback(
    (chosen: readonly Technology[]) => change((before) => withTechnologies(before, chosen)),
    [change],
  );
  const limitTolerance = useCallback(
    (most: number | null) => change((before) => withTolerance(before, most)),
    [change],
  );
  return {
    view: readView(params),
    sort: readSort(params),
    sortBy,
    technologies: useMemo(() => readTechnologies(params), [params]),
    chooseTechnologies,
    tolerance: readTolerance(params),
    limitTolerance,
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
