import { PriorityQueue } from '../../numeric/index.js';
import type { Block, Blocks } from './blocks.js';
import type { Candidate, FoundStage } from './candidates.js';
import type { PricedNetwork } from './networks.js';
import type { Network } from './stageSearch.js';

/** What any stage of an entry has at least. */
export type Bound = Pick<FoundStage, 'candidate' | 'noise' | 'price'>;

export interface OrderedSearch {
  candidates: readonly Candidate[];
  /** the networks for a number of channels in parallel */
  blocksFor: (channelsInParallel: number) => Blocks;
  /** what comes first; among equals the other counts */
  by: 'noise' | 'price';
  noiseOf: (candidate: Candidate, network: Network) => number;
  /** with no network of the block is the candidate's noise lower */
  boundOf: (candidate: Candidate, block: Block) => number;
  /** Nothing at or above the bound is wanted any more. */
  isOut: (bound: Bound) => boolean;
}

/** A block that is rough has no bound of its own yet, but the candidate's. */
type Entry = Bound &
  ({ block: Block; isRough?: boolean } | { network: PricedNetwork; block?: undefined; isRough?: undefined });

/**
 * Whole stages in ascending order of noise or price, by best-first search: blocks of networks wait with lower
 * bounds of noise and price, single networks with both themselves; the least is taken and, if it is a
 * block, halved. What comes out as a single network is the next stage, and most networks are never looked at.
 */
export function* stagesInOrder(search: OrderedSearch): Generator<FoundStage> {
  const waiting = new Waiting(search);
  for (let entry = waiting.next(); entry !== undefined; entry = waiting.next()) {
    const { candidate, block, noise, price, isRough } = entry;
    if (block === undefined) yield { candidate, network: entry.network, noise, price };
    else if (isRough) waiting.addBlock(candidate, block);
    else waiting.divide(candidate, block);
  }
}

class Waiting {
  private readonly queue = new PriorityQueue<Entry>();

  constructor(private readonly search: OrderedSearch) {
    for (const candidate of search.candidates) {
      const block = search.blocksFor(candidate.channelsInParallel).whole();
      this.add(candidate, block.price, (price) => {
        return { candidate, block, price, noise: candidate.leastNoise, isRough: true };
      });
    }
  }

  /** The least entry that is still wanted. */
  next(): Entry | undefined {
    let entry = this.queue.take();
    while (entry !== undefined && this.search.isOut(entry)) entry = this.queue.take();
    return entry;
  }

  addBlock(candidate: Candidate, block: Block): void {
    this.add(candidate, block.price, (price) => {
      return { candidate, block, price, noise: this.search.boundOf(candidate, block) };
    });
  }

  divide(candidate: Candidate, block: Block): void {
    const blocks = this.search.blocksFor(candidate.channelsInParallel);
    const halves = blocks.halves(block);
    if (halves) for (const half of halves) this.addBlock(candidate, half);
    else for (const network of block.networks) this.addNetwork(candidate, network);
  }

  private addNetwork(candidate: Candidate, network: PricedNetwork): void {
    this.add(candidate, network.price, (price) => {
      return { candidate, network, price, noise: this.search.noiseOf(candidate, network) };
    });
  }

  /** What the price alone rules out is never evaluated. */
  private add(candidate: Candidate, ofNetwork: number, entryAt: (price: number) => Entry): void {
    const { isOut, by } = this.search;
    const price = candidate.price + ofNetwork;
    if (isOut({ candidate, price, noise: candidate.leastNoise })) return;
    const entry = entryAt(price);
    if (!isOut(entry)) this.queue.add(by === 'noise' ? [entry.noise, price] : [price, entry.noise], entry);
  }
}
