import type { Amplifier } from '../../parts/index.js';
import { stageNoise } from '../evaluateStage.js';
import { parallelStage } from '../levers/parallelStage.js';
import { amplifierAt, type AmplifierColumns } from '../ranking/columns.js';
import type { PartPlace } from '../ranking/sift.js';
import type { PricedNetwork } from './networks.js';
import { withNetwork, type Network, type SoughtConditions } from './stageSearch.js';

/** An op-amp with a number of its channels in parallel, whose network is to be found. */
export class Candidate implements PartPlace {
  private known?: Amplifier;

  /**
   * @param price of the op-amps for all stages; Infinity = without a price
   * @param leastNoise V or A: with no network is its input noise rms below that
   */
  constructor(
    private readonly columns: AmplifierColumns,
    readonly library: number,
    readonly row: number,
    readonly channelsInParallel: number,
    readonly price: number,
    readonly leastNoise: number,
  ) {}

  get amplifier(): Amplifier {
    return (this.known ??= amplifierAt(this.columns, this.row));
  }
}

/** A whole stage as the search compares it. */
export interface FoundStage {
  candidate: Candidate;
  network: PricedNetwork;
  /** V or A, the input noise rms */
  noise: number;
  /** of op-amps and network for all stages; Infinity = a part is without a price */
  price: number;
}

/** The input noise rms of a candidate with a network, in V (A in a transimpedance stage). */
export function noiseOf(
  sought: SoughtConditions,
  { amplifier, channelsInParallel }: Candidate,
  network: Network,
): number {
  const single = { conditions: withNetwork(sought, network), amplifier };
  const several = parallelStage(single, channelsInParallel);
  return stageNoise(several.conditions, several.amplifier);
}
