import type { StageConditions } from '../conditions/index.js';

/**
 * The R_g with which the output sees just `total`, so that any smaller one loads it more.
 *
 * @param sourceResistance Ω
 * @param total Ω, of the network from the output to ground
 * @returns Ω; null where the stage has no R_g to choose
 */
export function leastGainResistance(
  { topology, gain = 1 }: Pick<StageConditions, 'topology' | 'gain'>,
  sourceResistance: number,
  total: number,
): number | null {
  switch (topology) {
    case 'non-inverting':
      return gain > 1 ? total / gain : null;
    case 'instrumentation':
      return gain > 1 ? (2 * total) / gain : null;
    case 'inverting':
      return Math.max(0, total / gain - sourceResistance);
    case 'difference':
      return Math.max(0, total / gain - sourceResistance / 2);
    case 'transimpedance':
      return null;
  }
}
