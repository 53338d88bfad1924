import { describe, expect, it } from 'vitest';
import { deriveNoise } from './derivedNoise.js';
import { cornerOfPeakToPeak, cornerOfSpot, whiteAndCorner } from './spotNoise.js';

const density = (white: number, corner: number, frequency: number) => ({
  frequency,
  density: white * Math.sqrt(1 + corner / frequency),
});

describe('whiteAndCorner', () => {
  it.each([
    [1e-9, 10, 10, 1000],
    [4.5e-9, 0.3, 1, 1000],
    [2e-12, 300, 1000, 10],
    [1e-9, 0, 10, 1000],
  ])('finds white %d and corner %d from the density at %d and %d Hz', (white, corner, f1, f2) => {
    const reading = whiteAndCorner(density(white, corner, f1), density(white, corner, f2));
    expect(reading.ok).toBe(true);
    if (!reading.ok) return;
    expect(Math.abs(reading.value.white / white - 1)).toBeLessThan(1e-9);
    expect(Math.abs(reading.value.corner - corner)).toBeLessThan(1e-9 * Math.max(1, corner));
  });

  it('refuses noise that rises with frequency', () => {
    const reading = whiteAndCorner({ frequency: 10, density: 1e-9 }, { frequency: 1000, density: 2e-9 });
    expect(reading).toEqual({
      ok: false,
      message: 'it rises with frequency, which white and 1/f noise never do',
    });
  });

  it('refuses noise that falls more steeply than 1/f noise', () => {
    const reading = whiteAndCorner({ frequency: 10, density: 1e-6 }, { frequency: 1000, density: 1e-9 });
    expect(reading.ok).toBe(false);
  });
});

describe('cornerOfPeakToPeak', () => {
  it('gives back the corner from which the peak-to-peak noise was worked out', () => {
    const [white, corner] = [3e-9, 2.7];
    const peaks = 6.6 * white * Math.sqrt(9.9 + corner * Math.log(100));
    expect(cornerOfPeakToPeak(peaks, white)).toBeCloseTo(corner, 9);
  });

  it('is 0 where the white noise alone makes as much', () => {
    expect(cornerOfPeakToPeak(6.6 * 3e-9 * Math.sqrt(9.9) * 0.9, 3e-9)).toBe(0);
  });
});

describe('cornerOfSpot', () => {
  it('gives back the corner, and 0 below the white noise', () => {
    expect(cornerOfSpot(1e-9, density(1e-9, 25, 10))).toBeCloseTo(25, 9);
    expect(cornerOfSpot(1e-9, { frequency: 10, density: 0.9e-9 })).toBe(0);
  });
});

describe('deriveNoise', () => {
  it('takes one spot alone for white and says nothing of the corner', () => {
    const stated = { white: null, spots: [{ frequency: 1000, density: 2e-9 }], peakToPeak: null };
    expect(deriveNoise(stated)).toEqual({ ok: true, value: { white: 2e-9, corner: null } });
  });

  it('keeps a stated white density and takes the corner from the spot', () => {
    const reading = deriveNoise({ white: 1e-9, spots: [density(1e-9, 8, 10)], peakToPeak: 1e-7 });
    expect(reading).toMatchObject({ ok: true, value: { white: 1e-9, corner: expect.closeTo(8, 9) } });
  });

  it('derives nothing from peak-to-peak noise without a density', () => {
    expect(deriveNoise({ white: null, spots: [], peakToPeak: 1e-7 })).toEqual({ ok: true, value: null });
  });
});
