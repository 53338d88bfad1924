import type { Reading } from '../parts/index.js';
import { cornerOfPeakToPeak, cornerOfSpot, type Spot, whiteAndCorner } from './spotNoise.js';

/** What a row states of one noise density, in SI units. */
export interface StatedNoise {
  /** The white density where a column of its own states it. */
  white: number | null;
  spots: readonly Spot[];
  peakToPeak: number | null;
}

/** A noise density that was worked out; the corner is null where nothing states it. */
export interface DerivedNoise {
  white: number;
  corner: number | null;
}

/**
 * White density and corner of what a row states; null where it states no density.
 *
 * A stated white density stands as it is, and the lowest spot or else the peak-to-peak noise gives the corner.
 * Two spots give both. One spot alone is taken for white, which assumes that it lies well above the corner.
 */
export function deriveNoise({ white, spots, peakToPeak }: StatedNoise): Reading<DerivedNoise | null> {
  const [lowest, next] = [...spots].sort((one, other) => one.frequency - other.frequency);
  if (white === null && next !== undefined) return whiteAndCorner(lowest, next);
  const density = white ?? lowest?.density ?? null;
  if (density === null) return { ok: true, value: null };
  return { ok: true, value: { white: density, corner: cornerBeside(white, lowest, peakToPeak, density) } };
}

function cornerBeside(
  white: number | null,
  spot: Spot | undefined,
  peakToPeak: number | null,
  density: number,
): number | null {
  if (white !== null && spot !== undefined) return cornerOfSpot(white, spot);
  return peakToPeak === null ? null : cornerOfPeakToPeak(peakToPeak, density);
}
