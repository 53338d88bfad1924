import type { BandConditions, OperatingConditions } from '../../src/conditions/index.js';
import { CONTRIBUTORS, type Contributor } from '../../src/noise/index.js';
import { nodalAnalysis, type KnownAmplifier } from './nodalAnalysis.js';

const PANELS_PER_DECADE = 60;
/** Beyond the −3 dB frequency, where a first-order low-pass leaves 1e-7 of white noise. */
const TAIL_DECADES = 7;
const TOLERANCE = 1e-4;
const DEEPEST = 20;

type Powers = readonly number[];

/** A stage's rms values by brute force: nodal analysis, integrated by adaptive Simpson panels in ln f. */
export function bruteForce(conditions: OperatingConditions, amplifier: KnownAmplifier) {
  const spot = nodalAnalysis(conditions, amplifier);
  const integrand = (x: number): Powers => {
    const frequency = Math.exp(x);
    const weight = frequency * lowPass(conditions.band, frequency);
    const { powers } = spot(frequency);
    return CONTRIBUTORS.map((contributor) => weight * powers[contributor]);
  };
  const integrals = integrate(conditions.band, integrand);
  const { gain2 } = spot(conditions.referenceFrequency);
  const outputPower = integrals.reduce((sum, power) => sum + power, 0);
  return {
    outputNoiseRms: Math.sqrt(outputPower),
    inputNoiseRms: Math.sqrt(outputPower / gain2),
    contributions: Object.fromEntries(
      CONTRIBUTORS.map((contributor, k) => [contributor, Math.sqrt(integrals[k] / gain2)]),
    ) as Record<Contributor, number>,
  };
}

function lowPass({ upper, lowPassOrder }: BandConditions, frequency: number): number {
  return lowPassOrder === 0 ? 1 : 1 / (1 + (frequency / upper) ** (2 * lowPassOrder));
}

function integrate(
  { lower, upper, lowPassOrder }: BandConditions,
  integrand: (x: number) => Powers,
): number[] {
  const from = Math.log(lower);
  const to = Math.log(upper) + (lowPassOrder === 0 ? 0 : TAIL_DECADES * Math.LN10);
  const count = Math.ceil(((to - from) / Math.LN10) * PANELS_PER_DECADE);
  const sum = CONTRIBUTORS.map(() => 0);
  let atStart = integrand(from);
  for (let i = 0; i < count; i++) {
    const start = from + ((to - from) * i) / count;
    const end = from + ((to - from) * (i + 1)) / count;
    const atEnd = integrand(end);
    addPanel(integrand, start, end, atStart, integrand((start + end) / 2), atEnd, sum, 0);
    atStart = atEnd;
  }
  return sum;
}

function addPanel(
  integrand: (x: number) => Powers,
  start: number,
  end: number,
  atStart: Powers,
  atMiddle: Powers,
  atEnd: Powers,
  sum: number[],
  depth: number,
): void {
  const middle = (start + end) / 2;
  const atLeft = integrand((start + middle) / 2);
  const atRight = integrand((middle + end) / 2);
  const simpson = (half: number, a: Powers, b: Powers, c: Powers, k: number) =>
    (half / 3) * (a[k] + 4 * b[k] + c[k]);
  const coarse = (k: number) => simpson((end - start) / 2, atStart, atMiddle, atEnd, k);
  const fine = (k: number) =>
    simpson((end - start) / 4, atStart, atLeft, atMiddle, k) +
    simpson((end - start) / 4, atMiddle, atRight, atEnd, k);
  const settled = sum.every(
    (_, k) => Math.abs(fine(k) - coarse(k)) <= TOLERANCE * Math.max(fine(k), sum[k] / 1000),
  );
  if (settled || depth === DEEPEST) sum.forEach((_, k) => (sum[k] += fine(k)));
  else {
    addPanel(integrand, start, middle, atStart, atLeft, atMiddle, sum, depth + 1);
    addPanel(integrand, middle, end, atMiddle, atRight, atEnd, sum, depth + 1);
  }
}
