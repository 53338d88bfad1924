import type { PricedNetwork } from './networks.js';
import type { Network } from './stageSearch.js';

/** Networks that stand next to each other in the order of their gain resistance. */
export interface Block {
  from: number;
  /** the first network after the block */
  to: number;
  /** The corners of the block: its least and largest gain resistance and gain, where the noise is least. */
  corners: Network[];
  /** How much less than at the corners the noise inside may be at least: a factor, 0 = unknown. */
  dip: number;
  /** the least price of its networks */
  price: number;
}

/** From this many networks on, bounds cost less than they save. */
const WORTH_BOUNDING = 8;

/** Halves blocks of networks, each block made once for all amplifiers. */
export class Blocks {
  private readonly known = new Map<string, Block>();

  /** @param neverFalls the noise never falls with more gain resistance */
  constructor(
    private readonly networks: readonly PricedNetwork[],
    private readonly neverFalls: boolean,
  ) {}

  whole(): Block {
    return this.block(0, this.networks.length);
  }

  /** The two halves of a block, or null where it is small enough to evaluate each of its networks. */
  halves({ from, to }: Block): [Block, Block] | null {
    if (to - from <= WORTH_BOUNDING) return null;
    const middle = (from + to) >> 1;
    return [this.block(from, middle), this.block(middle, to)];
  }

  /** The networks of a block. */
  of({ from, to }: Block): readonly PricedNetwork[] {
    return this.networks.slice(from, to);
  }

  private block(from: number, to: number): Block {
    const key = `${from} ${to}`;
    const known = this.known.get(key) ?? this.describe(from, to);
    this.known.set(key, known);
    return known;
  }

  private describe(from: number, to: number): Block {
    const members = this.networks.slice(from, to);
    const [least, most] = ends(members.map(({ gainResistance }) => gainResistance));
    const gains = ends(members.map(({ gain }) => gain));
    const resistances = this.neverFalls ? [least] : [least, most];
    const dip = dipWithin(this.neverFalls ? 1 : most / least, gains[1] / gains[0]);
    const corners = resistances.flatMap((gainResistance) =>
      gains.map((gain) => cornerOf(members, gain, gainResistance)),
    );
    const [price] = ends(members.map((network) => network.price));
    return { from, to, corners, dip, price };
  }
}

/** A network at a corner of its block, with the least excess noise that any of the block has. */
function cornerOf(members: readonly Network[], gain: number, gainResistance: number): Network {
  return {
    ...members[0],
    gain,
    gainResistance,
    ...(members[0].gainResistor === null && { feedbackResistance: gain }),
    gainNoiseIndex: leastKnown(members.map((network) => network.gainNoiseIndex)),
    feedbackNoiseIndex: leastKnown(members.map((network) => network.feedbackNoiseIndex)),
  };
}

/**
 * Along the logarithms of its resistances the noise is a smooth function: over a step h it may dip below both
 * ends by some h²/8 times its curvature, for which h²/2 leaves room.
 */
function dipWithin(resistanceRatio: number, gainRatio: number): number {
  const step = Math.log(resistanceRatio || 1) + Math.log(gainRatio);
  return Number.isFinite(step) ? Math.max(0, 1 - (step * step) / 2) : 0;
}

function ends(values: readonly number[]): [number, number] {
  return values.reduce<[number, number]>(
    ([low, high], value) => [Math.min(low, value), Math.max(high, value)],
    [Infinity, -Infinity],
  );
}

function leastKnown(values: readonly (number | undefined)[]): number | undefined {
  const known = values.filter((value) => value !== undefined);
  return known.length < values.length ? undefined : ends(known)[0];
}
