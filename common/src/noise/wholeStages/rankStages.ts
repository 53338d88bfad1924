import { PriorityQueue } from '../../numeric/index.js';
import type { Amplifier } from '../../parts/index.js';
import type { OperatingConditions } from '../../conditions/index.js';
import { evaluateStage, sourceFloor, stageNoise } from '../evaluateStage.js';
import type { SourceFloor, StageFigures } from '../figures.js';
import { parallelStage } from '../levers/parallelStage.js';
import { amplifierAt, type AmplifierColumns } from '../ranking/columns.js';
import { sift, type ExcludedPart, type PartPlace } from '../ranking/sift.js';
import { stageModel } from '../stage/stageModel.js';
import { Blocks, type Block } from './blocks.js';
import { findNetworks } from './networks.js';
import {
  nominalNetwork,
  withNetwork,
  type Network,
  type NetworkResistor,
  type SoughtConditions,
  type StageSearch,
} from './stageSearch.js';

/** An amplifier with the network, and the number of channels in parallel, that make it quietest. */
export interface RankedStage extends PartPlace {
  rank: number;
  channelsInParallel: number;
  network: Network;
  figures: StageFigures;
}

export interface StageRanking {
  /** how many amplifiers are ranked; 0 where no network gives the gain */
  total: number;
  excluded: ExcludedPart[];
  floor: SourceFloor;
  /** how many pairs of library resistors give the gain */
  pairs: number;
  nearestGain: number | null;
  items: RankedStage[];
  /** stages whose noise was computed to find these, and how many there are in all */
  evaluations: { made: number; exhaustive: number };
}

interface Candidate extends PartPlace {
  amplifier: Amplifier;
  channelsInParallel: number;
}

type Entry = Candidate & ({ block: Block } | { network: Network; block?: undefined });

/**
 * Ranks every amplifier with the network of library resistors, and the number of identical channels in
 * parallel, that make the quietest stage with it. Amplifiers are excluded as at the wanted gain.
 *
 * Best-first search: blocks of networks wait with a lower bound of their noise, single networks with their
 * noise itself; the least is taken and, if it is a block, halved. What comes out as a single network is the
 * next-quietest stage, and most networks are never looked at.
 *
 * @param resistors those that may be used, in order of preference among equals
 */
export function rankStages(
  search: StageSearch,
  libraries: readonly AmplifierColumns[],
  resistors: readonly NetworkResistor[],
): StageRanking {
  const { conditions, filter } = search;
  const { all, pairs, nearestGain } = findNetworks(conditions, resistors);
  const nominal = withNetwork(conditions, nominalNetwork(conditions));
  const { accepted, excluded } = sift({ conditions: nominal, filter }, stageModel(nominal), libraries);
  const candidates = listCandidates(conditions, libraries, accepted);
  const found = { evaluations: 0, stages: [] as (Candidate & { network: Network })[] };
  if (all.length > 0) findQuietest(search, candidates, all, found);
  return {
    total: all.length === 0 ? 0 : accepted.reduce((total, rows) => total + rows.length, 0),
    excluded,
    floor: sourceFloor(nominal),
    pairs,
    nearestGain,
    items: found.stages
      .slice(search.offset)
      .map((stage, n) => toRanked(search, stage, search.offset + n + 1)),
    evaluations: { made: found.evaluations, exhaustive: pairs * candidates.length },
  };
}

function listCandidates(
  { stage }: SoughtConditions,
  libraries: readonly AmplifierColumns[],
  accepted: readonly Uint32Array[],
): Candidate[] {
  return accepted.flatMap((rows, library) =>
    Array.from(rows).flatMap((row) => {
      const amplifier = amplifierAt(libraries[library], row);
      const most = Math.min(stage.parallelMaximum, amplifier.channels);
      return Array.from({ length: most }, (_, n) => ({ library, row, amplifier, channelsInParallel: n + 1 }));
    }),
  );
}

function findQuietest(
  { conditions, offset, limit }: StageSearch,
  candidates: readonly Candidate[],
  networks: readonly Network[],
  found: { evaluations: number; stages: (Candidate & { network: Network })[] },
): void {
  const blocks = new Blocks(networks, conditions.stage.topology === 'non-inverting');
  const queue = new PriorityQueue<Entry>();
  const taken = new Set<string>();
  const noise = (candidate: Candidate, network: Network) => {
    found.evaluations++;
    return totalNoise(conditions, candidate, network);
  };
  const addBlock = (candidate: Candidate, block: Block) => {
    const least =
      block.dip === 0 ? 0 : block.dip * Math.min(...block.corners.map((corner) => noise(candidate, corner)));
    queue.add(least, { ...candidate, block });
  };
  for (const candidate of candidates) addBlock(candidate, blocks.whole());
  while (found.stages.length < offset + limit) {
    const entry = queue.take();
    if (entry === undefined) return;
    const key = `${entry.library} ${entry.row}`;
    if (taken.has(key)) continue;
    if (entry.block === undefined) {
      taken.add(key);
      found.stages.push(entry);
      continue;
    }
    const halves = blocks.halves(entry.block);
    if (halves) for (const half of halves) addBlock(entry, half);
    else
      for (const network of networks.slice(entry.block.from, entry.block.to))
        queue.add(noise(entry, network), { ...entry, block: undefined, network });
  }
}

function stageOf(
  conditions: SoughtConditions,
  { amplifier, channelsInParallel }: Candidate,
  network: Network,
) {
  return parallelStage({ conditions: withNetwork(conditions, network), amplifier }, channelsInParallel);
}

function totalNoise(sought: SoughtConditions, candidate: Candidate, network: Network): number {
  const { conditions, amplifier } = stageOf(sought, candidate, network);
  return stageNoise(conditions, amplifier);
}

function toRanked(
  { conditions, filter }: StageSearch,
  stage: Candidate & { network: Network },
  rank: number,
): RankedStage {
  const { library, row, channelsInParallel, network } = stage;
  const single: OperatingConditions = withNetwork(conditions, network);
  const several = parallelStage({ conditions: single, amplifier: stage.amplifier }, channelsInParallel);
  const { cautions } = evaluateStage(single, stage.amplifier, filter);
  const figures = { ...evaluateStage(several.conditions, several.amplifier), cautions };
  return { library, row, rank, channelsInParallel, network, figures };
}
