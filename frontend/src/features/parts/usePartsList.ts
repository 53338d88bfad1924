import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { LONGEST_PAGE, opAmpsQuery, type OpAmp } from '../../api/opAmps';
import { useDebounced } from '../../components/useDebounced';
import type { PartsView } from './partsView';
import { createPartsSearch, joinFound } from './searchParts';

export interface PartsList {
  parts: readonly OpAmp[];
  /** Parts that the filters let through, whatever was searched for. */
  total: number;
  /** All of these are loaded. */
  isComplete: boolean;
  isPending: boolean;
  error: Error | null;
  retry: () => void;
}

const NOTHING: readonly OpAmp[] = [];
const PAUSE_IN_TYPING = 300;

/** The parts of a view: loaded ones are searched in the page, the server is asked for the rest. */
export function usePartsList({ search, ...narrowed }: PartsView): PartsList {
  const list = useQuery(opAmpsQuery({ ...narrowed, limit: LONGEST_PAGE }));
  const loaded = list.data?.items ?? NOTHING;
  const total = list.data?.total ?? 0;
  const isComplete = loaded.length >= total;
  const asked = useDebounced(search.trim(), PAUSE_IN_TYPING);
  const rest = useQuery({
    ...opAmpsQuery({ ...narrowed, search: asked, limit: LONGEST_PAGE }),
    enabled: !isComplete && asked !== '',
  });
  const searchLoaded = useMemo(() => createPartsSearch(loaded), [loaded]);
  const parts = useMemo(() => {
    const fromServer = search.trim() === '' ? NOTHING : (rest.data?.items ?? NOTHING);
    return joinFound(searchLoaded(search), isComplete ? NOTHING : fromServer);
  }, [searchLoaded, search, rest.data, isComplete]);
  return {
    parts,
    total,
    isComplete,
    isPending: list.isPending,
    error: list.error,
    retry: () => void list.refetch(),
  };
}
