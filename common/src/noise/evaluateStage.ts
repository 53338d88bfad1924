import type { OperatingConditions, PartFilter } from '../conditions/index.js';
import type { NoiseAmplifier } from './amplifierNoise.js';
import type { FieldError } from '../parts/index.js';
import { spotNode } from './bandNodes.js';
import type { Contributions } from './contributors.js';
import type { SourceFloor, StageFigures } from './figures.js';
import { hasNoEnd } from './ranking/exclusions.js';
import { stageModel } from './stage/stageModel.js';
import { stageAmplifier } from './stageAmplifier.js';
import { stageCautions } from './stageCautions.js';
import {
  bandEvaluation,
  figuresFrom,
  floorFrom,
  mapContributions,
  referenceEvaluation,
  spotPowers,
} from './stageFigures.js';

/**
 * The noise of one stage: densities and noise figure at the reference frequency, rms values over the band,
 * and the budget by contributor, all referred to the source.
 *
 * @param conditions source, band, stage and temperatures, in SI units and free of `checkConditions` errors
 * @param amplifier its parameters in SI units; unknown current noise counts with its lower bound, an
 *   unknown gain–bandwidth product as ideal, unknown corners and capacitance as 0, each with a caution
 * @returns figures within 0.01 % of exact integration; in a transimpedance stage input figures are in A
 * Source: noise model of Rothe & Dahlke 1956; Motchenbacher & Connelly 1993.
 */
export function evaluateStage(
  conditions: OperatingConditions,
  amplifier: NoiseAmplifier,
  filter?: PartFilter,
): StageFigures {
  const model = stageModel(conditions);
  const inStage = stageAmplifier(conditions, amplifier);
  const overBand = bandEvaluation(conditions, model, inStage);
  const atReference = referenceEvaluation(conditions, model);
  return {
    ...figuresFrom(conditions, model, inStage, overBand, atReference),
    cautions: stageCautions(conditions, model, amplifier, filter),
  };
}

/** The `inputNoiseRms` of `evaluateStage` alone, for searches that compare many stages. */
export function stageNoise(conditions: OperatingConditions, amplifier: NoiseAmplifier): number {
  const model = stageModel(conditions);
  const inStage = stageAmplifier(conditions, amplifier);
  const overBand = bandEvaluation(conditions, model, inStage);
  const atReference = referenceEvaluation(conditions, model);
  return figuresFrom(conditions, model, inStage, overBand, atReference).inputNoiseRms;
}

/**
 * What keeps an amplifier's noise in a stage from being computed, field by field: with an unknown
 * gain–bandwidth product and a noise gain that rises with frequency, a first-order low-pass leaves the rms
 * without bound. Empty = `evaluateStage` answers.
 */
export function checkAmplifier(conditions: OperatingConditions, amplifier: NoiseAmplifier): FieldError[] {
  const { gainBandwidth, inputCapacitance } = stageAmplifier(conditions, amplifier);
  if (!hasNoEnd(conditions, stageModel(conditions), gainBandwidth, inputCapacitance)) return [];
  const message =
    'gain–bandwidth product: needed here, for a first-order low-pass alone doesn’t end the noise of this stage';
  return [{ field: 'amplifier.gainBandwidth', message }];
}

/**
 * The source floor: the source's own noise referred to the source, as a perfect amplifier would show it.
 *
 * @returns density at the reference frequency in V/√Hz and rms over the band in V (A/√Hz and A in a
 *   transimpedance stage); 0 where the source makes no noise
 */
export function sourceFloor(conditions: OperatingConditions): SourceFloor {
  return floorFrom(conditions, stageModel(conditions));
}

/** Density at one frequency, referred to the source, with its contributors. */
export interface SpotDensity {
  frequency: number;
  inputNoiseDensity: number;
  contributions: Contributions;
}

/**
 * Noise density over frequency, each point referred to the source by the signal gain at that frequency.
 *
 * @param frequencies Hz, > 0
 * @returns V/√Hz (A/√Hz in a transimpedance stage)
 */
export function densitySpectrum(
  conditions: OperatingConditions,
  amplifier: NoiseAmplifier,
  frequencies: readonly number[],
): SpotDensity[] {
  const model = stageModel(conditions);
  const inStage = stageAmplifier(conditions, amplifier);
  return frequencies.map((frequency) => {
    const evaluate = model.compile(spotNode(conditions, frequency));
    const { powers, gain2 } = spotPowers(conditions, inStage, frequency, evaluate);
    const contributions = mapContributions(powers, (power) => Math.sqrt(power / gain2));
    return { frequency, inputNoiseDensity: Math.hypot(...Object.values(contributions)), contributions };
  });
}
