import type { AmplifierColumns } from '../ranking/columns.js';
import type { Blocks } from './blocks.js';
import { CandidateGroup } from './candidateGroup.js';
import { Candidate } from './candidates.js';
import type { StageCosts } from './stageCosts.js';
import type { Network, SoughtConditions } from './stageSearch.js';

/** All that a search chooses among, and what it can say of many at once. */
export interface Candidates {
  all: Candidate[];
  /** Those that surely make at most so much noise with a network. */
  within(limit: number, network: Network): Candidate[];
}

const NONE = new Uint32Array();

/** Every accepted op-amp with every number of channels that its package and the search allow. */
export function listCandidates(
  sought: SoughtConditions,
  libraries: readonly AmplifierColumns[],
  accepted: readonly Uint32Array[],
  costs: StageCosts,
  blocksFor: (channelsInParallel: number) => Blocks,
): Candidates {
  const groups = libraries.flatMap((columns, library) =>
    Array.from({ length: sought.stage.parallelMaximum }, (_, n) => {
      const rows = (accepted[library] ?? NONE).filter((row) => columns.parameters.channels[row] > n);
      const group = new CandidateGroup(sought, columns, library, rows, n + 1);
      const bounds = group.leastNoises(blocksFor(n + 1));
      const members = Array.from(rows, (row, place) => {
        const price = costs.opAmp({ library, row }, columns.parameters.channels[row]);
        return new Candidate(columns, library, row, n + 1, price, bounds[place]);
      });
      return { group, members };
    }),
  );
  return {
    all: groups.flatMap(({ members }) => members),
    within: (limit, network) =>
      groups.flatMap(({ group, members }) => {
        const isWithin = group.isWithin(limit, network);
        return members.filter((_, place) => isWithin[place]);
      }),
  };
}
