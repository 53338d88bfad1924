import type { Amplifier } from '../../parts/index.js';
import { stageNoise } from '../evaluateStage.js';
import { parallelStage } from '../levers/parallelStage.js';
import { amplifierAt, type AmplifierColumns } from '../ranking/columns.js';
import type { PartPlace } from '../ranking/sift.js';
import type { PricedNetwork } from './networks.js';
import type { StageCosts } from './stageCosts.js';
import { withNetwork, type Network, type SoughtConditions } from './stageSearch.js';

/** An op-amp with a number of its channels in parallel, whose network is to be found. */
export interface Candidate extends PartPlace {
  amplifier: Amplifier;
  channelsInParallel: number;
  /** of the op-amps for all stages; Infinity = without a price */
  price: number;
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

/** Every accepted op-amp with every number of channels that its package and the search allow. */
export function listCandidates(
  { stage }: SoughtConditions,
  libraries: readonly AmplifierColumns[],
  accepted: readonly Uint32Array[],
  costs: StageCosts,
): Candidate[] {
  return accepted.flatMap((rows, library) =>
    Array.from(rows).flatMap((row) => {
      const amplifier = amplifierAt(libraries[library], row);
      const price = costs.opAmp({ library, row }, amplifier.channels);
      const most = Math.min(stage.parallelMaximum, amplifier.channels);
      return Array.from({ length: most }, (_, n) => ({
        library,
        row,
        amplifier,
        channelsInParallel: n + 1,
        price,
      }));
    }),
  );
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
