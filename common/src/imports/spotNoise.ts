import { PEAK_TO_PEAK_OVER_RMS } from '../noise/constants.js';
import type { Reading } from '../parts/index.js';

/** A noise density as the noise model takes it: white part in V/√Hz or A/√Hz, 1/f corner in Hz. */
export interface WhiteAndCorner {
  white: number;
  corner: number;
}

/** A noise density that was stated at one frequency. */
export interface Spot {
  /** Hz, above 0. */
  frequency: number;
  /** V/√Hz or A/√Hz, above 0. */
  density: number;
}

/** The band of the peak-to-peak noise that data sheets state, in Hz. */
const SLOW_BAND = { lower: 0.1, upper: 10 } as const;

/**
 * White density and 1/f corner of a noise that is stated at two frequencies.
 *
 *     e(f)² = w²·(1 + f_c/f)
 *     w²  = (e₁²·f₁ − e₂²·f₂) / (f₁ − f₂)
 *     f_c = (e₁² − e₂²)/w² · f₁·f₂/(f₂ − f₁)
 *
 * Assumes that the noise is white and 1/f alone between and beyond the two frequencies. Refused where it
 * rises with frequency, or falls more steeply than 1/√f.
 *
 * @example whiteAndCorner({ frequency: 10, density: √2 nV/√Hz }, { frequency: 1e3, density: √1.01 nV/√Hz }) → 1 nV/√Hz, 10 Hz
 * Source: the two equations of the model above, solved.
 */
export function whiteAndCorner(one: Spot, other: Spot): Reading<WhiteAndCorner> {
  const [low, high] = one.frequency < other.frequency ? [one, other] : [other, one];
  const [f1, f2] = [low.frequency, high.frequency];
  const [p1, p2] = [low.density ** 2, high.density ** 2];
  if (p1 < p2) return { ok: false, message: 'it rises with frequency, which white and 1/f noise never do' };
  const white = (p2 * f2 - p1 * f1) / (f2 - f1);
  if (!(white > 0)) return { ok: false, message: 'it falls more steeply with frequency than 1/f noise does' };
  const corner = (((p1 - p2) / white) * (f1 * f2)) / (f2 - f1);
  return { ok: true, value: { white: Math.sqrt(white), corner } };
}

/**
 * The 1/f corner that a density at one frequency states beside the known white density; 0 where it isn't
 * above the white one.
 *
 *     f_c = f·(e²/w² − 1)
 */
export function cornerOfSpot(white: number, { frequency, density }: Spot): number {
  return Math.max(0, frequency * ((density / white) ** 2 - 1));
}

/**
 * The 1/f corner that the peak-to-peak noise from 0.1 to 10 Hz states beside the known white density; 0
 * where the white noise alone makes as much.
 *
 *     (e_pp/6.6)² = w²·(9.9 Hz + f_c·ln 100)
 *     f_c = ((e_pp/6.6)²/w² − 9.9 Hz) / ln 100
 *
 * Assumes Gaussian noise, whose peak-to-peak value of 6.6 times the rms is exceeded 0.1 % of the time, and
 * a filter with steep ends.
 *
 * @param peakToPeak V
 * @param white V/√Hz
 * Source: 6.6 is common practice.
 */
export function cornerOfPeakToPeak(peakToPeak: number, white: number): number {
  const { lower, upper } = SLOW_BAND;
  const power = (peakToPeak / PEAK_TO_PEAK_OVER_RMS / white) ** 2;
  return Math.max(0, (power - (upper - lower)) / Math.log(upper / lower));
}
