import type { OperatingConditions } from '../conditions/index.js';
import { groupAmplifiers } from './amplifierGroups.js';
import { spotNode } from './bandNodes.js';
import { outputPowers, dominantContributor, type Generators } from './budget.js';
import { STANDARD_NOISE_TEMPERATURE } from './constants.js';
import { CONTRIBUTORS, type Contributions } from './contributors.js';
import type { SourceFloor, StageFigures } from './figures.js';
import { sourcePowerDensity, sourceTemperature } from './sourceNoise.js';
import { INTEGRAL, INTEGRALS, type Evaluate, type StageModel } from './stage/model.js';

/** An amplifier as the stage sees it: its poles' parameters and its generators, nothing unknown. */
export interface StageAmplifier extends Generators {
  /** Hz; Infinity = ideal */
  gainBandwidth: number;
  /** F */
  inputCapacitance: number;
}

/** The noise-free, infinitely fast amplifier against which the source floor is stated. */
const PERFECT_AMPLIFIER: StageAmplifier = {
  gainBandwidth: Infinity,
  inputCapacitance: 0,
  voltage2: 0,
  voltageCorner: 0,
  current2: 0,
  currentCorner: 0,
};

/** Everything that `figuresFrom` states, but for what only the part's data tell. */
export type ComputedFigures = Omit<StageFigures, 'cautions'>;

/** The sum over the band for one amplifier. */
export function bandEvaluation(
  conditions: OperatingConditions,
  model: StageModel,
  amplifier: StageAmplifier,
): Evaluate {
  const columns = {
    gainBandwidth: [amplifier.gainBandwidth],
    inputCapacitance: [amplifier.inputCapacitance],
  };
  return groupAmplifiers(conditions, model, columns)[0].evaluate;
}

/**
 * The figures of one amplifier in a stage.
 *
 * @param overBand sums over the band, from nodes that suit the amplifier
 * @param atReference the value at the reference frequency
 */
export function figuresFrom(
  conditions: OperatingConditions,
  model: StageModel,
  amplifier: StageAmplifier,
  overBand: Evaluate,
  atReference: Evaluate,
): ComputedFigures {
  const integrals = new Float64Array(INTEGRALS);
  const spot = spotPowers(conditions, amplifier, conditions.referenceFrequency, atReference);
  overBand(amplifier.gainBandwidth, amplifier.inputCapacitance, integrals);
  const powers = outputPowers(integrals, amplifier);
  const output2 = sum(powers);
  return {
    inputNoiseDensity: Math.sqrt(sum(spot.powers) / spot.gain2),
    inputNoiseRms: Math.sqrt(output2 / spot.gain2),
    outputNoiseRms: Math.sqrt(output2),
    signalGain: Math.sqrt(spot.gain2),
    closedLoopBandwidth: closedLoopBandwidth(conditions, model, amplifier),
    noiseFigure: noiseFigure(conditions, spot),
    aboveFloor: powers.source > 0 ? decibels(output2, powers.source) : null,
    contributions: mapContributions(powers, (power) => Math.sqrt(power / spot.gain2)),
    dominant: dominantContributor(powers),
  };
}

/** The stage's nodes at the reference frequency. */
export function referenceEvaluation(conditions: OperatingConditions, model: StageModel): Evaluate {
  return model.compile(spotNode(conditions, conditions.referenceFrequency));
}

/** The source floor: what a perfect amplifier would give. */
export function floorFrom(conditions: OperatingConditions, model: StageModel): SourceFloor {
  const overBand = bandEvaluation(conditions, model, PERFECT_AMPLIFIER);
  const figures = figuresFrom(
    conditions,
    model,
    PERFECT_AMPLIFIER,
    overBand,
    referenceEvaluation(conditions, model),
  );
  return {
    inputNoiseDensity: Math.sqrt(
      sourcePowerDensity(conditions, sourceTemperature(conditions), conditions.referenceFrequency),
    ),
    inputNoiseRms: figures.contributions.source,
  };
}

/** Closed-loop bandwidth GBW/|noise gain at the upper end of the band| in Hz, or null where the GBW is unknown. */
export function closedLoopBandwidth(
  { band }: OperatingConditions,
  model: StageModel,
  { gainBandwidth, inputCapacitance }: Pick<StageAmplifier, 'gainBandwidth' | 'inputCapacitance'>,
): number | null {
  if (gainBandwidth === Infinity) return null;
  return gainBandwidth / model.noiseGain(band.upper, gainBandwidth, inputCapacitance);
}

/** Densities squared at the output by contributor at one frequency, and the power gain of the signal there. */
export interface SpotPowers {
  powers: Contributions;
  gain2: number;
}

/** The budget of one amplifier at one frequency; `evaluate` is made from that frequency's node. */
export function spotPowers(
  conditions: OperatingConditions,
  amplifier: StageAmplifier,
  frequency: number,
  evaluate: Evaluate,
): SpotPowers {
  const integrals = new Float64Array(INTEGRALS);
  evaluate(amplifier.gainBandwidth, amplifier.inputCapacitance, integrals);
  const gain2 = integrals[INTEGRAL.source];
  integrals[INTEGRAL.source] *= sourcePowerDensity(conditions, sourceTemperature(conditions), frequency);
  return { powers: outputPowers(integrals, amplifier), gain2 };
}

function noiseFigure(conditions: OperatingConditions, { powers, gain2 }: SpotPowers): number | null {
  const atStandard = sourcePowerDensity(
    conditions,
    STANDARD_NOISE_TEMPERATURE,
    conditions.referenceFrequency,
  );
  if (atStandard === 0) return null;
  return decibels(atStandard + (sum(powers) - powers.source) / gain2, atStandard);
}

/** The ratio of two powers in dB, also where the ratio itself would be too large for a number. */
function decibels(power: number, reference: number): number {
  return 10 * (Math.log10(power) - Math.log10(reference));
}

/** Every contributor's value changed in the same way. */
export function mapContributions(
  contributions: Contributions,
  change: (value: number) => number,
): Contributions {
  return Object.fromEntries(
    CONTRIBUTORS.map((contributor) => [contributor, change(contributions[contributor])]),
  ) as Contributions;
}

function sum(powers: Contributions): number {
  return CONTRIBUTORS.reduce((total, contributor) => total + powers[contributor], 0);
}
