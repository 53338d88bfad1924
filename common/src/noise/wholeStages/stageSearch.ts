import { leastGainResistance } from '../leastGainResistance.js';
import type { OperatingConditions, PartFilter, StageConditions } from '../../conditions/index.js';
import type { StagePrices } from './stageCosts.js';

/** What the network of a whole stage must keep. */
export interface NetworkLimits {
  /** Ω, what the output can drive */
  minimumTotal: number;
  /** Ω, what noise and leakage allow */
  maximumTotal: number;
}

/** The stage that is sought: the network's resistors are what is to be found. */
export interface SoughtStage extends Omit<
  StageConditions,
  'gainResistance' | 'gainNoiseIndex' | 'feedbackNoiseIndex' | 'network'
> {
  /** how far the gain (feedback resistance of a transimpedance stage) may lie from the wanted one; 0.01 = 1 % */
  gainTolerance: number;
  network: NetworkLimits;
  /** at most so many identical channels of one package in parallel, 1 to 8 */
  parallelMaximum: number;
}

export interface SoughtConditions extends Omit<OperatingConditions, 'stage'> {
  stage: SoughtStage;
}

/** What whole stages can be sorted by. */
export const STAGE_SORTS = ['inputNoiseRms', 'unitPrice'] as const;
export type StageSort = (typeof STAGE_SORTS)[number];

export interface StageSearch {
  conditions: SoughtConditions;
  filter: PartFilter;
  sort: StageSort;
  /** dB above the quietest stage that one sorted by price may lie at most */
  within: number;
  limit: number;
  offset: number;
  /** left out = nothing has a price */
  prices?: StagePrices;
}

/** A resistor of the library as a network's part. */
export interface NetworkResistor {
  /** Ω */
  resistance: number;
  /** dB; null = unknown */
  noiseIndex: number | null;
}

/** Two resistors of the library, by their places in the list that was given, that give the gain. */
export interface Network {
  /** V/V as the two values give it; V/A in a transimpedance stage */
  gain: number;
  /** null in a transimpedance stage and in a follower */
  gainResistor: number | null;
  /** null in a follower */
  feedbackResistor: number | null;
  /** Ω; 0 where there is none */
  gainResistance: number;
  /** Ω; 0 where there is none */
  feedbackResistance: number;
  gainNoiseIndex?: number;
  feedbackNoiseIndex?: number;
}

/** The operating conditions of a sought stage with one network. */
export function withNetwork({ stage, ...rest }: SoughtConditions, network: Network): OperatingConditions {
  const { topology, loadResistance, biasResistance, differenceResistance } = stage;
  const { feedbackCapacitance, outputVoltage } = stage;
  const { gain, gainResistance, feedbackResistance, gainNoiseIndex, feedbackNoiseIndex } = network;
  const pair = { gain, ...(!isFollower(stage) && { gainResistance }) };
  return {
    ...rest,
    stage: {
      topology,
      ...(topology === 'transimpedance' ? { feedbackResistance, feedbackCapacitance } : pair),
      ...stated({ loadResistance, biasResistance, differenceResistance, outputVoltage }),
      ...stated({ gainNoiseIndex, feedbackNoiseIndex }),
      network: { minimumTotal: stage.network.minimumTotal },
    },
  };
}

function stated<Fields extends object>(fields: Fields): Partial<Fields> {
  return Object.fromEntries(
    Object.entries(fields).filter(([, value]) => value !== undefined),
  ) as Partial<Fields>;
}

/** Whether the stage has a gain of 1 without a network. */
export function isFollower({ topology, gain }: Pick<SoughtStage, 'topology' | 'gain'>): boolean {
  return gain === 1 && (topology === 'non-inverting' || topology === 'instrumentation');
}

/** A network that gives just the wanted gain, for what doesn't depend on its values. */
export function nominalNetwork({ stage, source }: SoughtConditions): Network {
  const isTransimpedance = stage.topology === 'transimpedance';
  const gain = (isTransimpedance ? stage.feedbackResistance : stage.gain)!;
  const gainResistance = leastGainResistance(stage, source.resistance, stage.network.minimumTotal) ?? 0;
  return { gain, gainResistor: null, feedbackResistor: null, gainResistance, feedbackResistance: gain };
}
