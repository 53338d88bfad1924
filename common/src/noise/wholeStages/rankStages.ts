import { evaluateStage, sourceFloor } from '../evaluateStage.js';
import type { SourceFloor, StageFigures } from '../figures.js';
import { parallelStage } from '../levers/parallelStage.js';
import type { AmplifierColumns } from '../ranking/columns.js';
import { sift, type ExclusionCounts, type PartPlace } from '../ranking/sift.js';
import { stageModel } from '../stage/stageModel.js';
import { Blocks } from './blocks.js';
import { prepareBlockBounds } from './blockBound.js';
import { noiseOf, type Candidate, type FoundStage } from './candidates.js';
import { leastInSeries } from './leastInSeries.js';
import { listCandidates, type Candidates } from './listCandidates.js';
import { findNetworks } from './networks.js';
import { StageCosts } from './stageCosts.js';
import { nominalNetwork, withNetwork, type Network, type NetworkResistor } from './stageSearch.js';
import type { SoughtConditions, StageSearch } from './stageSearch.js';
import { findCheapest, findQuietest, type StageSpace } from './sweeps.js';

/** An amplifier with a network and a number of channels in parallel. */
export interface WholeStage extends PartPlace {
  channelsInParallel: number;
  network: Network;
  figures: StageFigures;
  /** of its parts for all stages that are wanted; null = one of them is without a price */
  price: number | null;
}

export interface RankedStage extends WholeStage {
  rank: number;
}

export interface StageRanking {
  /** how many amplifiers are ranked; 0 where no network gives the gain */
  total: number;
  excluded: ExclusionCounts;
  floor: SourceFloor;
  /** how many pairs of library resistors give the gain */
  pairs: number;
  nearestGain: number | null;
  items: RankedStage[];
  /** the stages that no other beats in both noise and price, the quietest first */
  frontier: WholeStage[];
  /** stages whose noise was computed to find these, and how many there are in all */
  evaluations: { made: number; exhaustive: number };
}

/**
 * Ranks every amplifier with the network of library resistors, and the number of identical channels in
 * parallel, that make the quietest stage with it, or the cheapest within so many dB of the quietest of all. Of
 * equally quiet stages the cheapest counts, of equally cheap ones the quietest. Amplifiers are excluded as
 * at the wanted gain.
 *
 * @param resistors those that may be used, in order of preference among equals
 */
export function rankStages(
  search: StageSearch,
  libraries: readonly AmplifierColumns[],
  resistors: readonly NetworkResistor[],
): StageRanking {
  const { conditions, filter, offset, limit } = search;
  const costs = new StageCosts(conditions.stage.topology, search.prices);
  const nominal = withNetwork(conditions, nominalNetwork(conditions));
  const { accepted, excluded } = sift({ conditions: nominal, filter }, stageModel(nominal), libraries);
  const { pairs, nearestGain, blocksFor } = prepareNetworks(conditions, resistors, costs);
  const candidates = listCandidates(conditions, libraries, pairs === 0 ? [] : accepted, costs, blocksFor);
  const evaluations = { made: 0, exhaustive: pairs * candidates.all.length };
  const countedNoise = (candidate: Candidate, network: Network) => {
    evaluations.made++;
    return noiseOf(conditions, candidate, network);
  };
  const boundOf = prepareBlockBounds(conditions, countedNoise);
  const space = { candidates: candidates.all, blocksFor, noiseOf: countedNoise, boundOf };
  const { total, rows, frontier } = findStages(search, space, candidates);
  return {
    total: total ?? (pairs === 0 ? 0 : accepted.reduce((sum, { length }) => sum + length, 0)),
    excluded,
    floor: sourceFloor(nominal),
    pairs,
    nearestGain,
    items: rows
      .slice(offset, offset + limit)
      .map((stage, n) => ({ ...toStage(search, stage), rank: offset + n + 1 })),
    frontier: frontier.map((stage) => toStage(search, stage)),
    evaluations,
  };
}

/** The networks of one channel, and in blocks those for any number of channels, made at the first asking. */
function prepareNetworks(
  conditions: SoughtConditions,
  resistors: readonly NetworkResistor[],
  costs: StageCosts,
) {
  const single = findNetworks(conditions, resistors, costs.network(1));
  const inSeries = leastInSeries(conditions);
  const known = [new Blocks(single.all, inSeries)];
  const blocksFor: StageSpace['blocksFor'] = (channelsInParallel) => {
    const count = costs.distinct(channelsInParallel);
    return (known[count - 1] ??= new Blocks(
      findNetworks(conditions, resistors, costs.network(count)).all,
      inSeries,
    ));
  };
  return { ...single, blocksFor };
}

function findStages({ sort, within, offset, limit }: StageSearch, space: StageSpace, candidates: Candidates) {
  if (sort === 'inputNoiseRms') return { total: null, ...findQuietest(space, offset + limit) };
  const { rows, frontier } = findQuietest(space, 1);
  const [quietest] = rows;
  if (quietest === undefined) return { total: 0, rows: [], frontier };
  const most = quietest.noise * 10 ** (within / 20);
  const sure = candidates.within(most, quietest.network);
  return { ...findCheapest(space, most, offset + limit, sure), frontier };
}

function toStage({ conditions, filter }: StageSearch, stage: FoundStage): WholeStage {
  const { candidate, network, price } = stage;
  const { library, row, amplifier, channelsInParallel } = candidate;
  const single = withNetwork(conditions, network);
  const several = parallelStage({ conditions: single, amplifier }, channelsInParallel);
  const { cautions } = evaluateStage(single, amplifier, filter);
  const figures = { ...evaluateStage(several.conditions, several.amplifier), cautions };
  return {
    library,
    row,
    channelsInParallel,
    network,
    figures,
    price: Number.isFinite(price) ? price : null,
  };
}
