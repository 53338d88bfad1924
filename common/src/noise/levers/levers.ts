import {
  checkConditions,
  USUAL_DIFFERENCE_RESISTANCE,
  type OperatingConditions,
  type StageConditions,
  type Topology,
} from '../../conditions/index.js';
import { formatQuantity, type QuantityKind } from '../../units/index.js';
import type { NoiseAmplifier } from '../amplifierNoise.js';
import { evaluateStage } from '../evaluateStage.js';
import { leastGainResistance } from '../leastGainResistance.js';
import { sourceTemperature } from '../sourceNoise.js';
import { LEAST_NETWORK } from '../stageCautions.js';
import { parallelStage } from './parallelStage.js';
import { behindTransformer, optimumSourceResistance } from './transformer.js';

/** What can be changed about a stage to make it quieter. */
export type LeverKey =
  | 'cool-source'
  | 'cool-circuit'
  | 'halve-band'
  | 'lower-network'
  | 'raise-feedback'
  | 'lower-voltage'
  | 'parallel'
  | 'transformer'
  | 'quieter-part';

export interface Lever {
  key: LeverKey;
  /** a few words with the value, such as "Halve the band to 250 Hz" */
  label: string;
  /** dB by which the total input noise changes; negative = quieter */
  change: number;
  /** what it does, in one sentence */
  sentence: string;
  /** What the figure was computed with: an ordinary ranking there tells the same. */
  conditions: OperatingConditions;
  amplifier: NoiseAmplifier;
  /** step-up ratio in front of the stage: figures there count 1/N; 1 = no transformer */
  ratio: number;
}

export interface LeverPart {
  amplifier: NoiseAmplifier;
  name: string;
}

type Proposal = Omit<Lever, 'change' | 'ratio'> & { ratio?: number };

/**
 * The levers of a part in a stage, those that help most first: each is the stage evaluated anew at the
 * changed conditions. What doesn't apply to the stage, or can't be changed any further, is left out, and so is what
 * leads beyond the conditions that can be ranked.
 *
 * @param conditions free of `checkConditions` errors
 * @param quieter the next-quieter part of the ranking, where there is one
 */
export function findLevers(conditions: OperatingConditions, part: LeverPart, quieter?: LeverPart): Lever[] {
  const { amplifier } = part;
  const { inputNoiseRms: now, contributions } = evaluateStage(conditions, amplifier);
  const proposals = [
    coolSource(conditions, amplifier),
    coolCircuit(conditions, amplifier),
    halveBand(conditions, amplifier),
    lowerNetwork(conditions, amplifier),
    raiseFeedback(conditions, amplifier),
    contributions.excess > 0 ? lowerVoltage(conditions, amplifier) : null,
    inParallel(conditions, amplifier),
    stepUp(conditions, amplifier),
    quieter && quieterPart(conditions, quieter),
  ];
  return proposals
    .flatMap((proposal) => (proposal && canBeRanked(proposal) ? [{ ratio: 1, ...proposal }] : []))
    .map((proposal) => ({ ...proposal, change: 20 * Math.log10(noiseOf(proposal) / now) }))
    .filter(({ change }) => Number.isFinite(change))
    .sort((a, b) => a.change - b.change);
}

function canBeRanked({ conditions }: Proposal): boolean {
  return checkConditions({ conditions }).length === 0;
}

function noiseOf({
  conditions,
  amplifier,
  ratio,
}: Pick<Lever, 'conditions' | 'amplifier' | 'ratio'>): number {
  return evaluateStage(conditions, amplifier).inputNoiseRms / ratio;
}

/** K, −20 °C: what an outdoor box or a small cooler reaches. */
const COLD = 253.15;

function coolSource(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal | null {
  const { source } = conditions;
  const temperature = colder(sourceTemperature(conditions));
  if (source.resistance === 0) return null;
  return {
    key: 'cool-source',
    label: `Cool the source to ${show(temperature, 'temperature')}`,
    sentence: 'The thermal noise power of the source goes with its absolute temperature.',
    conditions: { ...conditions, source: { ...source, temperature } },
    amplifier,
  };
}

function coolCircuit(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal {
  const ambientTemperature = colder(conditions.ambientTemperature);
  const source = { ...conditions.source, temperature: sourceTemperature(conditions) };
  return {
    key: 'cool-circuit',
    label: `Cool the circuit to ${show(ambientTemperature, 'temperature')}`,
    sentence:
      'The resistors’ thermal noise falls, and by estimate the amplifier’s own; the source stays as warm.',
    conditions: { ...conditions, ambientTemperature, source },
    amplifier,
  };
}

function colder(temperature: number): number {
  return temperature > COLD ? COLD : temperature / 2;
}

function halveBand(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal | null {
  const { band, referenceFrequency } = conditions;
  const upper = band.upper / 2;
  if (upper <= band.lower || referenceFrequency > upper) return null;
  return {
    key: 'halve-band',
    label: `Halve the band to ${show(upper, 'frequency')}`,
    sentence: 'White noise power goes with the bandwidth; what lies below the 1/f corner falls less.',
    conditions: { ...conditions, band: { ...band, upper } },
    amplifier,
  };
}

function lowerNetwork(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal | null {
  const { stage, source } = conditions;
  const total = stage.network?.minimumTotal ?? LEAST_NETWORK;
  const lower = lowerResistances(stage, source.resistance, total);
  if (Object.keys(lower).length === 0) return null;
  return {
    key: 'lower-network',
    label: `Lower the ${resistancesText(lower)}`,
    sentence: `The feedback network’s noise falls with it; ${show(total, 'resistance')} is what the output is to drive.`,
    conditions: { ...conditions, stage: { ...stage, ...lower } },
    amplifier,
  };
}

type NetworkResistances = Pick<StageConditions, 'gainResistance' | 'differenceResistance'>;

/** Those of the network's resistances that can be lowered until the outputs see just `total`. */
function lowerResistances(
  stage: StageConditions,
  sourceResistance: number,
  total: number,
): NetworkResistances {
  const gainResistance = leastGainResistance(stage, sourceResistance, total);
  const { topology, differenceResistance = USUAL_DIFFERENCE_RESISTANCE } = stage;
  return {
    ...(gainResistance !== null && gainResistance < (stage.gainResistance ?? 0) && { gainResistance }),
    ...(topology === 'instrumentation' && total < differenceResistance && { differenceResistance: total }),
  };
}

function resistancesText({ gainResistance, differenceResistance }: NetworkResistances): string {
  const parts = [
    gainResistance !== undefined && `gain resistance to ${show(gainResistance, 'resistance')}`,
    differenceResistance !== undefined &&
      `difference resistances to ${show(differenceResistance, 'resistance')}`,
  ];
  return parts.filter((part) => part !== false).join(', the ');
}

const FEEDBACK_FACTOR = 10;

function raiseFeedback(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal | null {
  const { stage } = conditions;
  if (stage.topology !== 'transimpedance') return null;
  const feedbackResistance = stage.feedbackResistance! * FEEDBACK_FACTOR;
  return {
    key: 'raise-feedback',
    label: `Raise the feedback resistance to ${show(feedbackResistance, 'resistance')}`,
    sentence:
      'The current noise of a resistor falls with its value; check that the bandwidth is still enough.',
    conditions: { ...conditions, stage: { ...stage, feedbackResistance } },
    amplifier,
  };
}

function lowerVoltage(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal {
  const { stage } = conditions;
  const outputVoltage = stage.outputVoltage! / 2;
  return {
    key: 'lower-voltage',
    label: `Halve the direct output voltage to ${show(outputVoltage, 'voltage')}`,
    sentence: 'The excess noise of the resistors goes with the direct voltage across them.',
    conditions: { ...conditions, stage: { ...stage, outputVoltage } },
    amplifier,
  };
}

function inParallel(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal | null {
  if (conditions.stage.topology !== 'non-inverting') return null;
  const count = Math.max(2, Math.min(8, amplifier.channels ?? 2));
  return {
    key: 'parallel',
    label: `${count} channels in parallel`,
    sentence: `The voltage noise falls by √${count}, the current noise into the source rises by as much.`,
    ...parallelStage({ conditions, amplifier }, count),
  };
}

/** Stages that the source's resistance doesn't set the gain of. */
const TRANSFORMABLE: readonly Topology[] = ['non-inverting', 'instrumentation'];

function stepUp(conditions: OperatingConditions, amplifier: NoiseAmplifier): Proposal | null {
  const { source, stage } = conditions;
  const optimum = optimumSourceResistance(conditions, amplifier);
  const ratio = Math.sqrt(optimum / source.resistance);
  if (!TRANSFORMABLE.includes(stage.topology) || !Number.isFinite(ratio) || ratio <= 1) return null;
  return {
    key: 'transformer',
    label: `Step-up transformer 1:${Number(ratio.toPrecision(2))} (ideal)`,
    sentence: `It shows the amplifier its optimum of ${show(optimum, 'resistance')}; a real one adds the noise of its windings.`,
    conditions: behindTransformer(conditions, ratio),
    amplifier,
    ratio,
  };
}

function quieterPart(conditions: OperatingConditions, { amplifier, name }: LeverPart): Proposal {
  return {
    key: 'quieter-part',
    label: `Take ${name}`,
    sentence: 'The next-quieter part of the ranking, with everything else as it is.',
    conditions,
    amplifier,
  };
}

function show(value: number, kind: QuantityKind): string {
  return formatQuantity(value, kind, { trim: true });
}

/** What is often tried and can't help, said where the levers are listed. */
export const NO_LEVER =
  'Lowering the source resistance is no lever: it lowers the noise voltage, but not the noise power that the source ' +
  'offers to the stage. What counts is how much signal comes with it.';
