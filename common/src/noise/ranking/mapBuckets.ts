import type { OperatingConditions } from '../../conditions/index.js';
import type { Generators } from '../budget.js';
import type { AmplifierColumns } from './columns.js';
import { prepareGenerators } from './generators.js';

/** Rows of a library with nearly the same white noise, and generators than which none of theirs makes less noise. */
export interface Bucket {
  library: number;
  rows: number[];
  least: Generators;
}

/** Puts the rows of each library into buckets whose squared densities lie within a factor of two. */
export function bucketsOf(
  conditions: OperatingConditions,
  libraries: readonly AmplifierColumns[],
  candidates: readonly Uint32Array[],
): Bucket[] {
  return candidates.flatMap((rows, library) => {
    const generatorsAt = prepareGenerators(conditions, libraries[library]);
    const buckets = new Map<number, Bucket>();
    for (const row of rows) {
      const generators = generatorsAt(row);
      const key = octave(generators.voltage2) * 10_000 + octave(generators.current2);
      const bucket = buckets.get(key);
      if (bucket === undefined) buckets.set(key, { library, rows: [row], least: { ...generators } });
      else {
        bucket.rows.push(row);
        lower(bucket.least, generators);
      }
    }
    return [...buckets.values()];
  });
}

/** The whole binary logarithm of a squared density; no current noise counts as next to none. */
function octave(density2: number): number {
  return Math.floor(Math.log2(Math.max(density2, 1e-300)));
}

/** Lowers the white and the 1/f noise of `least` to those of `other`, each on its own. */
function lower(least: Generators, other: Generators): void {
  const voltageFlicker = Math.min(least.voltage2 * least.voltageCorner, other.voltage2 * other.voltageCorner);
  const currentFlicker = Math.min(least.current2 * least.currentCorner, other.current2 * other.currentCorner);
  least.voltage2 = Math.min(least.voltage2, other.voltage2);
  least.current2 = Math.min(least.current2, other.current2);
  least.voltageCorner = voltageFlicker / least.voltage2;
  least.currentCorner = least.current2 > 0 ? currentFlicker / least.current2 : 0;
}
