import type { StageConditions } from '../conditions/index.js';

/** Ω, the R_g with which the output sees just `total`; null where there is none. */
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
