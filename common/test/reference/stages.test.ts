import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { OperatingConditions } from '../../src/conditions/index.js';
import { evaluateStage, type Contributor, type NoiseAmplifier } from '../../src/noise/index.js';

interface ReferenceCase {
  name: string;
  conditions: OperatingConditions;
  amplifier: NoiseAmplifier;
  expected: {
    inputNoiseDensity: number;
    inputNoiseRms: number;
    outputNoiseRms: number;
    signalGain: number;
    contributions: Partial<Record<Contributor, number>>;
    noiseFigure: number;
    aboveFloor: number;
  };
}

/** Solved by a general circuit simulator (ngspice 39, .noise analysis, 4000 points a decade). */
const { cases } = JSON.parse(readFileSync(new URL('./stage-noise-cases.json', import.meta.url), 'utf8')) as {
  cases: ReferenceCase[];
};

const TOLERANCE = 1e-3;
const DECIBELS = 0.005;

describe('the twelve reference stages', () => {
  it('are all there', () => expect(cases).toHaveLength(12));

  it.each(cases)('$name: every figure within 0.1 % and 0.005 dB', ({ conditions, amplifier, expected }) => {
    const figures = evaluateStage(conditions, amplifier);
    for (const key of ['inputNoiseDensity', 'inputNoiseRms', 'outputNoiseRms', 'signalGain'] as const) {
      expect(Math.abs(figures[key] / expected[key] - 1), key).toBeLessThan(TOLERANCE);
    }
    for (const [contributor, rms] of Object.entries(expected.contributions)) {
      const own = figures.contributions[contributor as Contributor];
      // The simulator writes 1e-145 and the like where there is nothing.
      if (rms < 1e-100) expect(own, contributor).toBe(0);
      else expect(Math.abs(own / rms - 1), contributor).toBeLessThan(TOLERANCE);
    }
    expect(Math.abs(figures.noiseFigure! - expected.noiseFigure)).toBeLessThan(DECIBELS);
    expect(Math.abs(figures.aboveFloor! - expected.aboveFloor)).toBeLessThan(DECIBELS);
  });
});
