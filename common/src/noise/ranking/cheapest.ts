import { isInQuietSet, type Quietest } from './quietSet.js';
import type { Scores } from './scores.js';
import type { PartPlace } from './sift.js';

export interface CheapestPart extends PartPlace {
  /** dB, its total over the quietest part's */
  aboveQuietest: number;
}

/**
 * The cheapest part of the quiet set, of equally cheap ones the quieter; null where none has a price.
 *
 * @param prices what each row of each library costs; NaN = without a price
 */
export function findCheapest(
  libraries: readonly Scores[],
  quietest: Quietest | null,
  prices: readonly Float64Array[] = [],
): CheapestPart | null {
  if (quietest === null) return null;
  let cheapest: PartPlace | null = null;
  let least = { price: Infinity, noise: Infinity };
  libraries.forEach((scores, library) => {
    scores.rows.forEach((row, position) => {
      const price = prices[library]?.[row] ?? NaN;
      const noise = scores.inputNoiseRms[position];
      const isLess = price < least.price || (price === least.price && noise < least.noise);
      if (!isLess || !isInQuietSet(scores, position, quietest)) return;
      cheapest = { library, row };
      least = { price, noise };
    });
  });
  if (cheapest === null) return null;
  const aboveQuietest = 20 * Math.log10(least.noise / quietest.inputNoiseRms);
  return { ...(cheapest as PartPlace), aboveQuietest };
}
