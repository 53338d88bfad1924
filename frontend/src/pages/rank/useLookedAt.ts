import type { RankingRequest, StageConditions } from '@roothertz/common/conditions';
import type { LeverKey } from '@roothertz/common/noise';
import { useMemo } from 'react';
import type { WholeStage } from '../../api/stages';
import type { View } from '../../features/conditions/search/searchKeys';
import { nextQuieter } from '../../features/ranking/levers/leverRows';
import type { PlottedPart } from '../../features/ranking/comparedPart';
import { numberOf, sharedNumbers } from '../../features/ranking/libraryWords';
import { opAmpPricePlot } from '../../features/ranking/price/opAmpPricePlot';
import type { PricePlot } from '../../features/ranking/price/pricePlot';
import { stageKey } from '../../features/ranking/stages/stageKey';
import { stagePricePlot } from '../../features/ranking/stages/stagePricePlot';
import { useSelectedStage } from '../../features/ranking/stages/useSelectedStage';
import type { ShownRanking } from '../../features/ranking/useRanking';
import { useSelectedPart, type SelectedPart } from '../../features/ranking/useSelectedPart';
import type { Address, Ranked } from './useRanked';

/** The part that picture, budget and levers are about, in the stage that it stands in. */
export interface LookedAt {
  selected: SelectedPart;
  request: RankingRequest;
  /** The whole stage, where one is looked at, with one channel of it. */
  stage?: { whole: WholeStage; single: StageConditions; hasNetwork: boolean };
  prices: PricePlot;
  /** Which of the prices' points it is. */
  chosen: string;
  quieter: PlottedPart | undefined;
  /** Levers that the ranking itself has pulled already. */
  pulled: readonly LeverKey[];
  /** The page's request with other conditions for this stage. */
  changed: (next: RankingRequest) => RankingRequest;
}

/** The search has chosen the network; the value of a transimpedance stage's resistor is the asker's. */
const NETWORK_LEVERS: readonly LeverKey[] = ['lower-network', 'parallel'];

/** The chosen op-amp of the ranking, or the chosen whole stage. */
export function useLookedAt(
  { opAmps, stages }: Ranked,
  view: View,
  { partId, chosenKey, request }: Pick<Address, 'partId' | 'chosenKey' | 'request'>,
): LookedAt | null {
  const selectedPart = useSelectedPart(opAmps.ranking, partId);
  const selectedStage = useSelectedStage(stages.stages, chosenKey);
  return useMemo(() => {
    if (view !== 'stages') {
      const { ranking } = opAmps;
      if (!ranking || !selectedPart) return null;
      return {
        selected: selectedPart,
        request: ranking.request,
        prices: opAmpPricePlot(ranking),
        chosen: selectedPart.part.id,
        quieter: quieterThan(selectedPart.part.id, ranking.items),
        pulled: [],
        changed: (next) => next,
      };
    }
    if (!stages.stages || !selectedStage) return null;
    const { stage: whole, single, ...looked } = selectedStage;
    return {
      ...looked,
      stage: { whole, single, hasNetwork: whole.network.feedbackResistor !== null },
      prices: stagePricePlot(stages.stages),
      chosen: stageKey(whole),
      quieter: undefined,
      pulled: NETWORK_LEVERS,
      changed: (next) => withLever(request, looked.request, next),
    };
  }, [view, opAmps, stages, selectedPart, selectedStage, request]);
}

/** The next-quieter op-amp, by the name that tells it from one of the other library. */
function quieterThan(partId: string, ranked: ShownRanking['items']): PlottedPart | undefined {
  const quieter = nextQuieter(partId, ranked);
  const shared = sharedNumbers(ranked.map(({ part }) => part));
  return quieter && { ...quieter, partNumber: numberOf(quieter, shared) };
}

/** Of a lever's stage, what is asked and not found: the rest is the search's to find again. */
const ASKED = ['outputVoltage', 'feedbackResistance'] as const;

/** The page's request with what a lever changes of a found stage's conditions. */
function withLever(asked: RankingRequest, found: RankingRequest, next: RankingRequest): RankingRequest {
  const [before, after] = [found.conditions.stage, next.conditions.stage];
  const changes = ASKED.filter((field) => after[field] !== before[field]).map((field) => [
    field,
    after[field],
  ]);
  const stage = { ...asked.conditions.stage, ...Object.fromEntries(changes) };
  return { ...asked, conditions: { ...next.conditions, stage } };
}
