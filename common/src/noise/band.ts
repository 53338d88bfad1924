import type { BandConditions } from '../conditions/index.js';
import { gaussLegendre } from '../numeric/index.js';

/**
 * Power response |H(f)|² of the band's filter above its lower end: 1 up to `upper` and 0 beyond for a
 * brick wall, 1/(1 + (f/upper)^2n) for a Butterworth low-pass of n-th order. 0 below `lower`.
 *
 * @param band lower and upper end in Hz, order of the low-pass
 * @param frequency Hz, > 0
 * Source: Butterworth 1930.
 */
export function filterPower(band: BandConditions, frequency: number): number {
  if (frequency < band.lower) return 0;
  if (band.lowPassOrder === 0) return frequency <= band.upper ? 1 : 0;
  return 1 / (1 + (frequency / band.upper) ** (2 * band.lowPassOrder));
}

/**
 * ∫|H|² df from `lower` on: the bandwidth that white noise sees.
 *
 * Brick wall: f₂ − f₁. Butterworth: f₂·(π/2n)/sin(π/2n) from zero on, less the part below `lower`.
 *
 * @returns Hz, relative accuracy 1e-12
 * Source: Motchenbacher & Connelly 1993, noise bandwidth.
 */
export function whiteNoiseBandwidth(band: BandConditions): number {
  const { lower, upper, lowPassOrder: order } = band;
  if (order === 0) return upper - lower;
  const whole = (upper * (Math.PI / (2 * order))) / Math.sin(Math.PI / (2 * order));
  return whole - upper * lowPassIntegral(lower / upper, 2 * order);
}

const RULE = gaussLegendre(64);

/** ∫₀ˣ du/(1 + u^p) for 0 < x < 1. */
function lowPassIntegral(x: number, power: number): number {
  let sum = 0;
  for (let k = 0; k < RULE.nodes.length; k++) {
    sum += RULE.weights[k] / (1 + ((x / 2) * (1 + RULE.nodes[k])) ** power);
  }
  return (x / 2) * sum;
}

/**
 * ∫|H|²/f df from `lower` on: what 1/f noise of unit corner sees.
 *
 * Brick wall: ln(f₂/f₁). Butterworth: ln(1 + (f₂/f₁)^2n)/2n.
 *
 * @returns a pure number, relative accuracy 1e-12
 * Source: elementary integration; Motchenbacher & Connelly 1993 for the brick wall.
 */
export function flickerNoiseBandwidth(band: BandConditions): number {
  const { lower, upper, lowPassOrder: order } = band;
  if (order === 0) return Math.log(upper / lower);
  return Math.log(upper / lower) + Math.log1p((lower / upper) ** (2 * order)) / (2 * order);
}
