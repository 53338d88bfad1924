import type { PricedNetwork } from './networks.js';
import type { Network } from './stageSearch.js';

/** Networks that lie near to each other in gain resistance and gain. */
export interface Block {
  networks: readonly PricedNetwork[];
  /** The corners at the least gain resistance: one with the least gain, one with the largest. */
  least: Network[];
  /** The corners at the largest gain resistance, alike. */
  most: Network[];
  /** How much less than at its least corners the noise along the gain may be at least: a factor. */
  gainDip: number;
  /** How much less than at all corners the noise inside may be at least: a factor, 0 = unknown. */
  dip: number;
  /** the least price of its networks */
  price: number;
}

/** From this many networks on, bounds cost less than they save. */
const WORTH_BOUNDING = 8;
/** Blocks whose noise may dip further say too little of what is inside. */
const TELLING_DIP = 0.5;
/** Halves blocks of networks, each block made once for all amplifiers. */
export class Blocks {
  private readonly known = new Map<Block, [Block, Block]>();
  private all?: Block;

  /**
   * @param networks at least one, where any block is asked for
   * @param inSeries Ω, what the gain resistance counts together with
   */
  constructor(
    private readonly networks: readonly PricedNetwork[],
    private readonly inSeries: number,
  ) {}

  whole(): Block {
    return (this.all ??= describe(this.networks, this.inSeries));
  }

  /** The two halves of a block, or null where it is small enough to evaluate each of its networks. */
  halves(block: Block): [Block, Block] | null {
    if (block.networks.length <= WORTH_BOUNDING) return null;
    const halves = this.known.get(block) ?? halve(block, this.inSeries);
    this.known.set(block, halves);
    return halves;
  }

  /** All networks, in blocks that are small enough for their corners to tell of what is inside. */
  telling(block = this.whole()): Block[] {
    const halves = block.dip < TELLING_DIP ? this.halves(block) : null;
    return halves ? halves.flatMap((half) => this.telling(half)) : [block];
  }
}

/** Halves across the wider of the two ranges. */
function halve({ networks, least, most }: Block, inSeries: number): [Block, Block] {
  const alongGain = span(least[0].gain, least[1].gain);
  const alongResistance = span(inSeries + least[0].gainResistance, inSeries + most[0].gainResistance);
  const key = alongGain > alongResistance ? 'gain' : 'gainResistance';
  const inOrder = networks.toSorted((a, b) => a[key] - b[key]);
  const middle = inOrder.length >> 1;
  return [describe(inOrder.slice(0, middle), inSeries), describe(inOrder.slice(middle), inSeries)];
}

function describe(networks: readonly PricedNetwork[], inSeries: number): Block {
  const [low, high] = ends(networks.map(({ gainResistance }) => gainResistance));
  const gains = ends(networks.map(({ gain }) => gain));
  const cornersAt = (gainResistance: number) => gains.map((gain) => cornerOf(networks, gain, gainResistance));
  const alongGain = span(...gains);
  const [price] = ends(networks.map((network) => network.price));
  return {
    networks,
    least: cornersAt(low),
    most: cornersAt(high),
    gainDip: dipWithin(alongGain),
    dip: dipWithin(span(inSeries + low, inSeries + high) + alongGain),
    price,
  };
}

/** Step between two values along the logarithm; that of none is 0. */
function span(least: number, most: number): number {
  return most === least ? 0 : Math.log(most / least);
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
function dipWithin(step: number): number {
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
