import { useMemo } from 'react';
import { stagesQuery, type StagePage, type StageRequest } from '../../../api/stages';
import { useKeptPages } from '../../../components/useKeptPages';
import { shownOf, type Shown } from '../useRanking';

export type ShownStages = Shown<StageRequest, StagePage>;

/** The ranking of whole stages; the last good one stays until the next is there. */
export function useStages(request: StageRequest, enabled: boolean) {
  const { pages, ...state } = useKeptPages(stagesQuery(request), enabled);
  const stages = useMemo(() => pages && shownOf<StageRequest, StagePage>(pages), [pages]);
  return { stages, ...state };
}
