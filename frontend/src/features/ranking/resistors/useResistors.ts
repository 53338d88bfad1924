import type { ResistorRankingRequest } from '@roothertz/common/conditions';
import { useMemo } from 'react';
import { resistorRankingQuery, type ResistorPage } from '../../../api/resistorRanking';
import { useKeptPages } from '../../../components/useKeptPages';
import { shownOf, type Shown } from '../useRanking';

export type ShownResistors = Shown<ResistorRankingRequest, ResistorPage>;

/** The ranking of resistors for a place; the last good one stays until the next is there. */
export function useResistors(request: ResistorRankingRequest, enabled: boolean) {
  const { pages, ...state } = useKeptPages(resistorRankingQuery(request), enabled);
  const resistors = useMemo(() => pages && shownOf<ResistorRankingRequest, ResistorPage>(pages), [pages]);
  return { resistors, ...state };
}
