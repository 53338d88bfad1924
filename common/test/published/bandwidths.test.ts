import { describe, expect, it } from 'vitest';
import {
  evaluateStage,
  filterPower,
  flickerNoiseBandwidth,
  whiteNoiseBandwidth,
} from '../../src/noise/index.js';
import { conditionsWith, SILENT } from '../support/stages.js';

const BAND = { lower: 1e-6, upper: 1000 };

describe('noise bandwidth', () => {
  // Motchenbacher & Connelly 1993, from memory: noise bandwidth over −3 dB frequency.
  it.each([
    [1, 1.571],
    [2, 1.111],
    [3, 1.047],
    [4, 1.026],
  ])('of a Butterworth low-pass of order %i is %d times its −3 dB frequency', (lowPassOrder, ratio) => {
    expect(whiteNoiseBandwidth({ ...BAND, lowPassOrder }) / BAND.upper).toBeCloseTo(ratio, 3);
  });

  it('of a brick wall is the width of the band', () => {
    expect(whiteNoiseBandwidth({ lower: 20, upper: 20e3, lowPassOrder: 0 })).toBe(19_980);
  });

  it.each([1, 2, 5, 10])('of a low-pass of order %i is the integral of its response', (lowPassOrder) => {
    const band = { lower: 300, upper: 1000, lowPassOrder };
    const integral = (weight: (frequency: number) => number) => {
      const steps = 200_000;
      const length = Math.log(1e9 / band.lower) / steps;
      let sum = 0;
      for (let i = 0; i < steps; i++) {
        const frequency = band.lower * Math.exp((i + 0.5) * length);
        sum += filterPower(band, frequency) * weight(frequency) * frequency * length;
      }
      return sum;
    };
    expect(whiteNoiseBandwidth(band) / integral(() => 1)).toBeCloseTo(1, 5);
    expect(flickerNoiseBandwidth(band) / integral((frequency) => 1 / frequency)).toBeCloseTo(1, 5);
  });

  // Motchenbacher & Connelly 1993: 1/f noise has the same power in each decade.
  it('of 1/f noise is ln 10 in each decade of a brick wall', () => {
    expect(flickerNoiseBandwidth({ lower: 7, upper: 70, lowPassOrder: 0 })).toBeCloseTo(Math.LN10, 12);
  });

  // Butterworth 1930.
  it('comes from a response that is halved at the −3 dB frequency and nothing below the band', () => {
    expect(filterPower({ lower: 10, upper: 1000, lowPassOrder: 5 }, 1000)).toBe(0.5);
    expect(filterPower({ lower: 10, upper: 1000, lowPassOrder: 5 }, 9.9)).toBe(0);
    expect(filterPower({ lower: 10, upper: 1000, lowPassOrder: 0 }, 1000.1)).toBe(0);
  });
});

describe('noise of a capacitor', () => {
  // Common practice, no source: √(kT/C) whatever the resistance; 64.3 µV (64.36) for 1 pF at 300 K.
  it.each([1e3, 1e6, 1e9])('of 1 pF at 300 K charged through %d Ω is 64.3 µV', (resistance) => {
    const corner = 1 / (2 * Math.PI * resistance * 1e-12);
    const { contributions, signalGain } = evaluateStage(
      conditionsWith({
        source: { resistance, capacitance: 1e-12 },
        ambientTemperature: 300,
        band: { lower: corner / 1e6, upper: corner * 1e5 },
        referenceFrequency: corner / 1e6,
      }),
      SILENT,
    );
    expect(contributions.source * signalGain).toBeCloseTo(64.36e-6, 7);
  });
});
