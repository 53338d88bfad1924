import { distinctValues, pairChoices, type Value } from './resistorChoices.js';
import type { NetworkCosts } from './stageCosts.js';
import { isFollower, type Network, type NetworkResistor, type SoughtConditions } from './stageSearch.js';

/** A network and what its resistors cost for all stages. */
export interface PricedNetwork extends Network {
  /** Infinity = one of them is without a price */
  price: number;
}

/** All networks that the library's resistors make, in ascending order of the gain resistance. */
export interface Networks {
  all: PricedNetwork[];
  /** how many pairs of library resistors they stand for, those of equal values counted each */
  pairs: number;
  /** the gain nearest to the wanted one within the limits, also where it misses the tolerance; null = none at all */
  nearestGain: number | null;
}

/** Decimal values: a gain of 101 lies within 1 % of 100 whatever the rounding of its double. */
const ROUNDING = 1e-12;

/**
 * The networks that give the wanted gain within its tolerance and keep the limits of their total: R_g and
 * R_f of a stage on a voltage source, R_f alone of a transimpedance stage, none of a follower. Of resistors
 * with equal values only those count that no other beats in excess noise and price; where a direct output
 * voltage drives excess noise, resistors of unknown noise index don't count.
 */
export function findNetworks(
  conditions: SoughtConditions,
  resistors: readonly NetworkResistor[],
  costs: NetworkCosts,
): Networks {
  const { stage } = conditions;
  if (isFollower(stage)) return { all: [FOLLOWER], pairs: 1, nearestGain: 1 };
  const values = distinctValues(resistors, (stage.outputVoltage ?? 0) !== 0, costs);
  return stage.topology === 'transimpedance'
    ? findSingle(conditions, values)
    : findPairs(conditions, values, costs);
}

const FOLLOWER: PricedNetwork = {
  gain: 1,
  gainResistor: null,
  feedbackResistor: null,
  gainResistance: 0,
  feedbackResistance: 0,
  price: 0,
};

function findSingle({ stage }: SoughtConditions, values: readonly Value[]): Networks {
  const wanted = stage.feedbackResistance!;
  const within = values.filter(({ resistance }) => isWithin(resistance, stage.network));
  const chosen = within.filter(
    ({ resistance }) => Math.abs(resistance / wanted - 1) <= stage.gainTolerance + ROUNDING,
  );
  return {
    all: chosen.flatMap((value) => value.feedback.map((choice) => singleNetwork(value, choice))),
    pairs: chosen.reduce((sum, { count }) => sum + count, 0),
    nearestGain: within.reduce<number | null>(
      (best, { resistance }) => nearer(best, resistance, wanted),
      null,
    ),
  };
}

function singleNetwork({ resistance }: Value, choice: Value['feedback'][number]): PricedNetwork {
  return {
    gain: resistance,
    gainResistor: null,
    feedbackResistor: choice.resistor,
    gainResistance: 0,
    feedbackResistance: resistance,
    feedbackNoiseIndex: choice.noiseIndex,
    price: choice.price,
  };
}

function isWithin(
  total: number,
  { minimumTotal, maximumTotal }: { minimumTotal: number; maximumTotal: number },
) {
  return total >= minimumTotal && total <= maximumTotal;
}

function nearer(best: number | null, gain: number, wanted: number): number {
  return best === null || Math.abs(gain - wanted) < Math.abs(best - wanted) ? gain : best;
}

function findPairs(conditions: SoughtConditions, values: readonly Value[], costs: NetworkCosts): Networks {
  const { stage } = conditions;
  const wanted = stage.gain!;
  const { least, times, series, share } = gainLaw(conditions);
  const all: PricedNetwork[] = [];
  let pairs = 0;
  let nearestGain: number | null = null;
  const spread = wanted * (stage.gainTolerance + ROUNDING);
  for (const gainValue of values) {
    const perGain = (series + gainValue.resistance) / times;
    const from = firstAtLeast(values, (wanted - spread - least) * perGain);
    for (let i = Math.max(0, from - 1); i < values.length; i++) {
      const feedback = values[i];
      const gain = least + feedback.resistance / perGain;
      const total = feedback.resistance + share * gainValue.resistance;
      if (isWithin(total, stage.network)) {
        nearestGain = nearer(nearestGain, gain, wanted);
        if (Math.abs(gain - wanted) <= spread) {
          all.push(...pairNetworks(gain, gainValue, feedback, costs));
          pairs += gainValue.count * feedback.count;
        }
      }
      if (gain > wanted + spread) break;
    }
  }
  return { all, pairs, nearestGain };
}

/** Gain least + times·R_f/(series + R_g), and R_f + share·R_g that an output sees. */
interface GainLaw {
  least: 0 | 1;
  times: 1 | 2;
  /** Ω, of the source */
  series: number;
  share: number;
}

function gainLaw({ stage, source }: SoughtConditions): GainLaw {
  switch (stage.topology) {
    case 'inverting':
      return { least: 0, times: 1, series: source.resistance, share: 0 };
    case 'difference':
      return { least: 0, times: 1, series: source.resistance / 2, share: 0 };
    case 'instrumentation':
      return { least: 1, times: 2, series: 0, share: 1 / 2 };
    default:
      return { least: 1, times: 1, series: 0, share: 1 };
  }
}

function firstAtLeast(values: readonly Value[], least: number): number {
  let low = 0;
  let high = values.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (values[middle].resistance < least) low = middle + 1;
    else high = middle;
  }
  return low;
}

function pairNetworks(
  gain: number,
  gainValue: Value,
  feedbackValue: Value,
  costs: NetworkCosts,
): PricedNetwork[] {
  return pairChoices(gainValue, feedbackValue, costs).map(({ gain: one, feedback, price }) => ({
    gain,
    gainResistor: one.resistor,
    feedbackResistor: feedback.resistor,
    gainResistance: gainValue.resistance,
    feedbackResistance: feedbackValue.resistance,
    gainNoiseIndex: one.noiseIndex,
    feedbackNoiseIndex: feedback.noiseIndex,
    price,
  }));
}
