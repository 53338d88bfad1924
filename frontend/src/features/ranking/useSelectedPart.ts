import { evaluateStage, type StageFigures } from '@roothertz/common/noise';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { opAmpQuery } from '../../api/opAmps';
import { comparedWith, type PlottedPart } from './comparedPart';
import type { ShownRanking } from './useRanking';

export interface SelectedPart {
  part: PlottedPart;
  figures: StageFigures;
  compared: PlottedPart | null;
}

/** The part that is looked at: the chosen one wherever it now stands, the quietest where none is chosen. */
export function useSelectedPart(
  ranking: ShownRanking | undefined,
  chosenId: string | null,
): SelectedPart | null {
  const ranked = ranking?.items.find(({ part }) => part.id === chosenId);
  const isElsewhere = ranking !== undefined && chosenId !== null && ranked === undefined;
  const { data: elsewhere } = useQuery({ ...opAmpQuery(chosenId ?? ''), enabled: isElsewhere });
  return useMemo(() => {
    if (!ranking) return null;
    const { items, request } = ranking;
    const part = ranked?.part ?? (isElsewhere ? elsewhere : undefined) ?? items[0]?.part;
    if (!part) return null;
    const figures = evaluateStage(request.conditions, part.amplifier, request.filter);
    return { part, figures, compared: comparedWith(part.id, items) };
  }, [ranking, ranked, elsewhere, isElsewhere]);
}
