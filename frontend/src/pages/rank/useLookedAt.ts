import type { RankingRequest } from '@roothertz/common/conditions';
import type { LeverKey } from '@roothertz/common/noise';
import { useMemo } from 'react';
import type { View } from '../../features/conditions/search/searchKeys';
import { nextQuieter } from '../../features/ranking/levers/leverRows';
import type { PlottedPart } from '../../features/ranking/comparedPart';
import { useSelectedStage } from '../../features/ranking/stages/useSelectedStage';
import { useSelectedPart, type SelectedPart } from '../../features/ranking/useSelectedPart';
import type { Ranked } from './useRanked';

/** The part that picture, budget and levers are about, in the stage that it stands in. */
export interface LookedAt {
  selected: SelectedPart;
  request: RankingRequest;
  quieter: PlottedPart | undefined;
  /** Levers that the ranking itself has pulled already. */
  pulled: readonly LeverKey[];
  /** The page's request with other conditions for this stage. */
  changed: (next: RankingRequest) => RankingRequest;
}

const NETWORK_LEVERS: readonly LeverKey[] = ['lower-network', 'raise-feedback', 'parallel'];

/** The chosen op-amp of the ranking, or the chosen whole stage. */
export function useLookedAt(
  { opAmps, stages }: Ranked,
  view: View,
  partId: string | null,
  request: RankingRequest,
): LookedAt | null {
  const selectedPart = useSelectedPart(opAmps.ranking, partId);
  const selectedStage = useSelectedStage(stages.stages, partId);
  return useMemo(() => {
    if (view !== 'stages') {
      const { ranking } = opAmps;
      if (!ranking || !selectedPart) return null;
      const quieter = nextQuieter(selectedPart.part.id, ranking.items);
      return {
        selected: selectedPart,
        request: ranking.request,
        quieter,
        pulled: [],
        changed: (next) => next,
      };
    }
    return (
      selectedStage && {
        ...selectedStage,
        quieter: undefined,
        pulled: NETWORK_LEVERS,
        changed: ({ conditions }) => ({
          ...request,
          conditions: { ...conditions, stage: request.conditions.stage },
        }),
      }
    );
  }, [view, opAmps, selectedPart, selectedStage, request]);
}
