import type { OperatingConditions, RankingRequest } from '@roothertz/common/conditions';
import { parallelStage, type SoughtConditions, withNetwork } from '@roothertz/common/noise';
import { useMemo } from 'react';
import type { StageItem } from '../../../api/stages';
import { comparedWith } from '../comparedPart';
import type { SelectedPart } from '../useSelectedPart';
import type { ShownStages } from './useStages';

/** A stage that is looked at, as an op-amp in a stage of its own. */
export interface SelectedStage {
  selected: SelectedPart;
  /** The conditions with the stage's network. */
  request: RankingRequest;
}

/** Curves of stages nearer than this to the quietest lie on one another. */
const ALIKE = 1.05;

/** The chosen stage, the quietest where none is chosen or the chosen one isn't ranked. */
export function useSelectedStage(
  stages: ShownStages | undefined,
  chosenId: string | null,
): SelectedStage | null {
  return useMemo(() => {
    if (!stages) return null;
    const { items, request } = stages;
    const item = items.find(({ part }) => part.id === chosenId) ?? items[0];
    return item ? selectedStage(item, items, request.conditions, request.filter) : null;
  }, [stages, chosenId]);
}

function selectedStage(
  item: StageItem,
  items: readonly StageItem[],
  sought: SoughtConditions,
  filter: RankingRequest['filter'],
): SelectedStage {
  const alone = { conditions: conditionsOf(item, sought), amplifier: item.part.amplifier };
  const { conditions, amplifier } = parallelStage(alone, item.channelsInParallel);
  const limit = items[0].inputNoiseRms * ALIKE;
  const others = items.map(({ part, inputNoiseRms }) => ({ part, quietSet: inputNoiseRms <= limit }));
  return {
    selected: {
      part: { ...item.part, amplifier: { ...item.part.amplifier, ...amplifier } },
      figures: item,
      compared: comparedWith(item.part.id, others),
    },
    request: { conditions, filter },
  };
}

/** The operating conditions with the network of a ranked stage. */
function conditionsOf({ network }: StageItem, sought: SoughtConditions): OperatingConditions {
  const { gain, gainResistor, feedbackResistor } = network;
  return withNetwork(sought, {
    gain,
    gainResistor: null,
    feedbackResistor: null,
    gainResistance: gainResistor?.resistance ?? 0,
    feedbackResistance: feedbackResistor?.resistance ?? 0,
  });
}
