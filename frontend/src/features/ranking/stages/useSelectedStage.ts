import type { OperatingConditions, RankingRequest, StageConditions } from '@roothertz/common/conditions';
import { parallelStage, type SoughtConditions, withNetwork } from '@roothertz/common/noise';
import { useMemo } from 'react';
import type { WholeStage } from '../../../api/stages';
import { comparedWith } from '../comparedPart';
import type { SelectedPart } from '../useSelectedPart';
import { stageKey } from './stageKey';
import type { ShownStages } from './useStages';

/** A stage that is looked at, as an op-amp in a stage of its own. */
export interface SelectedStage {
  stage: WholeStage;
  selected: SelectedPart;
  /** The conditions with the stage's network, those of several channels as one. */
  request: RankingRequest;
  /** One channel of it. */
  single: StageConditions;
}

/** Curves of stages nearer than this to the quietest lie on one another. */
const ALIKE = 1.05;

/**
 * The chosen stage, or that of the chosen part; the first where neither is ranked.
 *
 * @param chosenKey of a stage, as `stageKey` makes it, or the id of a part
 */
export function useSelectedStage(
  stages: ShownStages | undefined,
  chosenKey: string | null,
): SelectedStage | null {
  return useMemo(() => {
    if (!stages) return null;
    const stage = chosenStage(stages, chosenKey);
    return stage ? selectedStage(stage, stages) : null;
  }, [stages, chosenKey]);
}

function chosenStage({ items, first }: ShownStages, chosenKey: string | null): WholeStage | undefined {
  const all: WholeStage[] = [...items, ...first.frontier];
  const [partId] = chosenKey?.split('.') ?? [];
  return (
    all.find((stage) => stageKey(stage) === chosenKey) ?? all.find(({ part }) => part.id === partId) ?? all[0]
  );
}

function selectedStage(stage: WholeStage, { items, request: { conditions: sought, filter } }: ShownStages) {
  const alone = { conditions: conditionsOf(stage, sought), amplifier: stage.part.amplifier };
  const { conditions, amplifier } = parallelStage(alone, stage.channelsInParallel);
  const limit = Math.min(...items.map(({ inputNoiseRms }) => inputNoiseRms)) * ALIKE;
  const others = items.map(({ part, inputNoiseRms }) => ({ part, quietSet: inputNoiseRms <= limit }));
  return {
    stage,
    selected: {
      part: { ...stage.part, amplifier: { ...stage.part.amplifier, ...amplifier } },
      figures: stage,
      compared: comparedWith(stage.part.id, others),
    },
    request: { conditions, filter },
    single: alone.conditions.stage,
  };
}

/** The operating conditions with the network of a ranked stage. */
function conditionsOf({ network }: WholeStage, sought: SoughtConditions): OperatingConditions {
  const { gain, gainResistor, feedbackResistor } = network;
  return withNetwork(sought, {
    gain,
    gainResistor: null,
    feedbackResistor: null,
    gainResistance: gainResistor?.resistance ?? 0,
    feedbackResistance: feedbackResistor?.resistance ?? 0,
    ...noiseIndicesOf(network, sought),
  });
}

/** Noise indices count where a direct output voltage drives excess noise. */
function noiseIndicesOf(
  { gainResistor, feedbackResistor }: WholeStage['network'],
  { stage }: SoughtConditions,
) {
  if (!stage.outputVoltage) return {};
  return {
    gainNoiseIndex: gainResistor?.noiseIndex ?? undefined,
    feedbackNoiseIndex: feedbackResistor?.noiseIndex ?? undefined,
  };
}
