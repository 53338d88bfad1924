import type { OperatingConditions, StageConditions } from '../../conditions/index.js';
import { leastCurrentNoise, type NoiseAmplifier } from '../amplifierNoise.js';

/** One stage, or several alike whose inputs are joined and whose outputs are averaged. */
export interface ParallelStage {
  conditions: OperatingConditions;
  amplifier: NoiseAmplifier;
}

/**
 * The single stage that makes the noise of `count` identical channels in parallel, each with a network of
 * its own: e_n falls with √n, i_n into the source rises with √n, the input capacitances add up, and each
 * network's resistances count as 1/n, with a noise index 10·lg n lower: their excess noises are uncorrelated.
 *
 * @param count channels, a whole number ≥ 1
 * Source: Motchenbacher & Connelly 1993, parallel input stages.
 */
export function parallelStage({ conditions, amplifier }: ParallelStage, count: number): ParallelStage {
  if (count === 1) return { conditions, amplifier };
  const { inputType = null, inputBiasCurrent = null, inputCapacitance = null } = amplifier;
  const currentNoise = amplifier.currentNoise ?? leastCurrentNoise(inputType, inputBiasCurrent);
  return {
    amplifier: {
      ...amplifier,
      voltageNoise: amplifier.voltageNoise / Math.sqrt(count),
      currentNoise: currentNoise * Math.sqrt(count),
      inputCapacitance: inputCapacitance && inputCapacitance * count,
    },
    conditions: parallelConditions(conditions, count),
  };
}

/** What of a parallel stage doesn't depend on the amplifier: the networks of all channels as one. */
export function parallelConditions(conditions: OperatingConditions, count: number): OperatingConditions {
  if (count === 1) return conditions;
  const { stage } = conditions;
  return { ...conditions, stage: { ...stage, ...networkOfMany(stage, count) } };
}

function networkOfMany(stage: StageConditions, count: number): Partial<StageConditions> {
  const { gainResistance, gainNoiseIndex, feedbackNoiseIndex, network } = stage;
  const lower = 10 * Math.log10(count);
  return {
    ...(gainResistance !== undefined && { gainResistance: gainResistance / count }),
    ...(gainNoiseIndex !== undefined && { gainNoiseIndex: gainNoiseIndex - lower }),
    ...(feedbackNoiseIndex !== undefined && { feedbackNoiseIndex: feedbackNoiseIndex - lower }),
    ...(network && { network: { ...network, minimumTotal: network.minimumTotal / count } }),
  };
}
