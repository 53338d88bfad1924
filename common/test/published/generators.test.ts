import { describe, expect, it } from 'vitest';
import {
  excessNoiseRms,
  excessPowerDensity,
  planckFactor,
  shotPowerDensity,
  sourceFloor,
  thermalPowerDensity,
  thermalVoltageDensity,
} from '../../src/noise/index.js';
import { conditionsWith } from '../support/stages.js';

describe('thermal noise', () => {
  // 4kTR: Johnson 1928, Nyquist 1928; the figure is common practice.
  it('of 1 kΩ at 290 K is 4.002 nV/√Hz', () => {
    expect(thermalVoltageDensity(1000, 290)).toBeCloseTo(4.002e-9, 12);
  });

  // Common practice: a quarter of 4kT at T₀ = 290 K is −173.98 dBm/Hz.
  it('has an available power of −173.98 dBm/Hz at 290 K', () => {
    expect(10 * Math.log10(thermalPowerDensity(290) / 4 / 1e-3)).toBeCloseTo(-173.98, 2);
  });

  // Horowitz & Hill, The Art of Electronics, 3rd ed., ch. 8, from memory.
  it('of 10 kΩ in 10 kHz at 293 K is 1.27 µV', () => {
    const floor = sourceFloor(
      conditionsWith({
        source: { resistance: 10e3 },
        ambientTemperature: 293,
        band: { lower: 1, upper: 10_001 },
      }),
    );
    expect(floor.inputNoiseRms).toBeCloseTo(1.27e-6, 8);
  });

  // Common practice, no source: thermal noise is white up to tens of gigahertz.
  it('is flat within 0.5 % at 50 GHz and 300 K, and no longer at 100 GHz', () => {
    expect(planckFactor(50e9, 300)).toBeGreaterThan(0.995);
    expect(planckFactor(100e9, 300)).toBeLessThan(0.995);
  });

  // Planck 1901: x/(eˣ − 1) at x = 1 is 1/(e − 1).
  it('falls to 0.582 of its density where a quantum holds kT', () => {
    expect(planckFactor(20.836619e9 * 300, 300)).toBeCloseTo(1 / (Math.E - 1), 6);
  });

  it('is gone at terahertz and millikelvins, without an overflow', () => {
    expect(planckFactor(1e12, 0.01)).toBe(0);
    expect(planckFactor(0, 0.01)).toBe(1);
  });
});

describe('shot noise', () => {
  // Schottky 1918; the figure is common practice.
  it('of 1 µA is 0.566 pA/√Hz', () => {
    expect(Math.sqrt(shotPowerDensity(1e-6))).toBeCloseTo(0.566e-12, 15);
  });

  it('is the same for either direction of the current', () => {
    expect(shotPowerDensity(-1e-6)).toBe(shotPowerDensity(1e-6));
  });
});

describe('excess noise', () => {
  // IEC 60195: a noise index of 0 dB is 1 µV for each volt in a decade of frequency.
  it('of 0 dB and 1 V is 1 µV in one decade', () => {
    expect(excessNoiseRms(0, 1, 10, 100)).toBeCloseTo(1e-6, 15);
  });

  it('of −20 dB and 5 V is 1 µV in four decades', () => {
    expect(excessNoiseRms(-20, -5, 1, 1e4)).toBeCloseTo(1e-6, 15);
  });

  it('has the density whose integral over the band is its square', () => {
    const steps = 100_000;
    let power = 0;
    for (let i = 0; i < steps; i++) power += excessPowerDensity(-10, 3, 10 + ((i + 0.5) * 90) / steps);
    expect((power * 90) / steps / excessNoiseRms(-10, 3, 10, 100) ** 2).toBeCloseTo(1, 6);
  });
});
