import type { Topology } from '../../conditions/index.js';
import type { PartPlace } from '../ranking/sift.js';
import { networkPieces, opAmpPieces } from './pieces.js';

/**
 * What pieces of a part cost in all, as a whole number of the currency's smallest amounts, so that sums are
 * exact; NaN = without a price.
 */
export interface StagePrices {
  /** how many stages are to be built */
  quantity: number;
  opAmp: (place: PartPlace, pieces: number) => number;
  /** of the resistor at a place of the list that was given */
  resistor: (index: number, pieces: number) => number;
}

/** What the resistors of a network cost for all stages; Infinity = without a price. */
export interface NetworkCosts {
  /** of R_g and R_f that are different parts */
  gain: (resistor: number) => number;
  feedback: (resistor: number) => number;
  /** of both, where they are pieces of one part */
  both: (resistor: number) => number;
}

/** What op-amps and networks of one search cost for all stages; without prices, everything Infinity. */
export class StageCosts {
  private readonly known = new Map<string, number>();

  constructor(
    private readonly topology: Topology,
    private readonly prices: StagePrices | undefined,
  ) {}

  /** The number of channels that a network's price depends on: all the same where there are no prices. */
  distinct(channelsInParallel: number): number {
    return this.prices ? channelsInParallel : 1;
  }

  opAmp(place: PartPlace, channels: number): number {
    if (!this.prices) return Infinity;
    return orInfinity(this.prices.opAmp(place, opAmpPieces(this.topology, channels) * this.prices.quantity));
  }

  network(channelsInParallel: number): NetworkCosts {
    const { gain, feedback } = networkPieces(this.topology, channelsInParallel);
    const cost = (pieces: number) => (resistor: number) => this.resistor(resistor, pieces);
    return { gain: cost(gain), feedback: cost(feedback), both: cost(gain + feedback) };
  }

  private resistor(index: number, pieces: number): number {
    const { prices } = this;
    if (pieces === 0) return 0;
    if (!prices) return Infinity;
    const key = `${index} ${pieces}`;
    const cost = this.known.get(key) ?? orInfinity(prices.resistor(index, pieces * prices.quantity));
    this.known.set(key, cost);
    return cost;
  }
}

function orInfinity(price: number): number {
  return Number.isNaN(price) ? Infinity : price;
}
