import type { Block } from './blocks.js';
import type { Candidate } from './candidates.js';
import { risingShare } from './risingNoise.js';
import type { Network, SoughtConditions } from './stageSearch.js';

/** The quadratures of neighbouring stages, each with nodes of its own, agree so far. */
const ACCURACY = 5e-5;

/**
 * A lower bound of a candidate's noise with any network of a block, from what it makes at the block's corners:
 * at those of the least gain resistance where the noise is known to rise from there, else at all.
 */
export function prepareBlockBounds(
  sought: SoughtConditions,
  noiseOf: (candidate: Candidate, network: Network) => number,
): (candidate: Candidate, block: Block) => number {
  const known = new Map<Block, ReturnType<typeof risingShare>>();
  const shareOf = (block: Block, { amplifier }: Candidate) => {
    const share = known.get(block) ?? risingShare(sought, block);
    known.set(block, share);
    const { gainBandwidth, inputCapacitance } = amplifier;
    return share({ gainBandwidth: gainBandwidth ?? Infinity, inputCapacitance: inputCapacitance ?? 0 });
  };
  return (candidate, block) => {
    const risen = block.gainDip * shareOf(block, candidate);
    const share = Math.max(risen, block.dip);
    if (share === 0) return 0;
    const corners = risen >= block.dip ? block.least : [...block.least, ...block.most];
    return (1 - ACCURACY) * share * Math.min(...corners.map((corner) => noiseOf(candidate, corner)));
  };
}
