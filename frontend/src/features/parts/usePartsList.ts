import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { LONGEST_PAGE, partsQuery, type PartsReader, type StoredPart } from '../../api/parts';
import { useDebounced } from '../../components/useDebounced';
import type { PartsView } from './partsView';
import { createPartsSearch, joinFound } from './searchParts';

export interface PartsList {
  parts: readonly StoredPart[];
  /** Parts that the filters let through, whatever was searched for. */
  total: number;
  /** Parts that the server finds by the filters and the words searched for. */
  matching: number;
  /** All of these are loaded. */
  isComplete: boolean;
  /** Nothing can be shown or said yet. */
  isPending: boolean;
  error: Error | null;
  retry: () => void;
}

const NOTHING: readonly StoredPart[] = [];
const PAUSE_IN_TYPING = 300;

/** The parts of a view: loaded ones are searched in the page, the server is asked for the rest. */
export function usePartsList(reader: PartsReader, { search, ...narrowed }: PartsView): PartsList {
  const list = useQuery(partsQuery(reader, { ...narrowed, limit: LONGEST_PAGE }));
  const loaded = list.data?.items ?? NOTHING;
  const total = list.data?.total ?? 0;
  const isComplete = loaded.length >= total;
  const wanted = search.trim();
  const asked = useDebounced(wanted, PAUSE_IN_TYPING);
  const isAsked = !isComplete && wanted !== '';
  const rest = useQuery({
    ...partsQuery(reader, { ...narrowed, search: asked, limit: LONGEST_PAGE }),
    enabled: isAsked && asked !== '',
  });
  const searchLoaded = useMemo(() => createPartsSearch(loaded), [loaded]);
  const found = rest.data?.items;
  const parts = useMemo(
    () => joinFound(searchLoaded(wanted), (isAsked && found) || NOTHING),
    [searchLoaded, wanted, isAsked, found],
  );
  const matching = (isAsked ? rest.data?.total : undefined) ?? (wanted === '' ? total : parts.length);
  const isAnswered = !isAsked || (asked === wanted && !rest.isPlaceholderData && !rest.isPending);
  return {
    parts,
    total,
    matching,
    isComplete,
    isPending: list.isPending || (parts.length === 0 && !isAnswered),
    error: list.error ?? rest.error,
    retry: () => void (list.error ? list.refetch() : rest.refetch()),
  };
}
