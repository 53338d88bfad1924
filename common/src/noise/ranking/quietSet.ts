import type { Scores } from './scores.js';

/** The quietest part's total and how far it may lie above. */
export interface Quietest {
  inputNoiseRms: number;
  above: number;
}

/** The quietest part of all libraries, or null where nothing is ranked. */
export function findQuietest(libraries: readonly Scores[]): Quietest | null {
  let best: Quietest | null = null;
  for (const { inputNoiseRms, spreadAbove } of libraries) {
    for (let position = 0; position < inputNoiseRms.length; position++) {
      const total = inputNoiseRms[position];
      if (best === null || total < best.inputNoiseRms)
        best = { inputNoiseRms: total, above: total * spreadAbove[position] };
    }
  }
  return best;
}

/**
 * Whether a part belongs to the quiet set: its total can't be told from the quietest one's at one sigma,
 * T − T_best ≤ √(σ_below² + σ_above,best²), given how well the parameters of both are known.
 *
 * Source: JCGM 100:2008 (GUM), 5.1.2, for the spread of a difference; the criterion is the product's own.
 */
export function isInQuietSet(scores: Scores, position: number, quietest: Quietest): boolean {
  const total = scores.inputNoiseRms[position];
  const difference = total - quietest.inputNoiseRms;
  return difference ** 2 <= (total * scores.spreadBelow[position]) ** 2 + quietest.above ** 2;
}

/** How many parts belong to the quiet set. */
export function countQuietSet(libraries: readonly Scores[], quietest: Quietest | null): number {
  if (quietest === null) return 0;
  let count = 0;
  for (const scores of libraries) {
    for (let i = 0; i < scores.rows.length; i++) if (isInQuietSet(scores, i, quietest)) count++;
  }
  return count;
}
