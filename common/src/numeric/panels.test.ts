import { describe, expect, it } from 'vitest';
import { gaussLegendre } from './gaussLegendre.js';
import { gradedPanels, type Feature } from './panels.js';

const RULE = gaussLegendre(6);

function integrate(boundaries: readonly number[], f: (x: number) => number): number {
  let sum = 0;
  for (let p = 0; p < boundaries.length - 1; p++) {
    const half = (boundaries[p + 1] - boundaries[p]) / 2;
    RULE.nodes.forEach((x, k) => (sum += half * RULE.weights[k] * f(boundaries[p] + half * (1 + x))));
  }
  return sum;
}

/** 1/((x − c)² + w²), whose poles lie at the distance w from the axis. */
const peak = (centre: number, width: number) => (x: number) => 1 / ((x - centre) ** 2 + width ** 2);
const peakIntegral = (centre: number, width: number, from: number, to: number) =>
  (Math.atan((to - centre) / width) - Math.atan((from - centre) / width)) / width;

describe('gradedPanels', () => {
  it('covers the range from end to end in ascending order, no panel over the longest', () => {
    const boundaries = gradedPanels(-3, 11, [{ from: 2, to: 2, width: 1e-3 }], 2.4);
    expect(boundaries[0]).toBe(-3);
    expect(boundaries.at(-1)).toBe(11);
    for (let p = 1; p < boundaries.length; p++) {
      expect(boundaries[p]).toBeGreaterThan(boundaries[p - 1]);
      expect(boundaries[p] - boundaries[p - 1]).toBeLessThanOrEqual(2.4 + 1e-12);
    }
  });

  it('makes equal panels where nothing is sharp', () => {
    expect(gradedPanels(0, 4, [], 1)).toEqual([0, 1, 2, 3, 4]);
  });

  it.each([0.3, 1e-2, 1e-4, 1e-8])('integrates a peak of width %d to 1e-4 with a fixed rule', (width) => {
    const boundaries = gradedPanels(0, 10, [{ from: 3.3, to: 3.3, width }], 2.4);
    const exact = peakIntegral(3.3, width, 0, 10);
    expect(Math.abs(integrate(boundaries, peak(3.3, width)) / exact - 1)).toBeLessThan(1e-4);
  });

  it('serves every peak of a range with the same panels', () => {
    const boundaries = gradedPanels(0, 10, [{ from: 3, to: 4, width: 0.05 }], 2.4);
    for (const centre of [3, 3.21, 3.77, 4]) {
      const exact = peakIntegral(centre, 0.05, 0, 10);
      expect(Math.abs(integrate(boundaries, peak(centre, 0.05)) / exact - 1)).toBeLessThan(1e-4);
    }
  });

  it('takes few panels for a sharp peak', () => {
    expect(gradedPanels(0, 10, [{ from: 5, to: 5, width: 1e-6 }], 2.4).length).toBeLessThan(80);
  });

  it.each<[string, Feature]>([
    ['a width of zero', { from: 5, to: 5, width: 0 }],
    ['no place', { from: NaN, to: NaN, width: 1 }],
    ['no width', { from: 5, to: 5, width: NaN }],
    ['a place at infinity', { from: -Infinity, to: -Infinity, width: 1 }],
  ])('ends with a few hundred panels at a feature with %s', (_name, feature) => {
    expect(gradedPanels(0, 10, [feature], 2.4).length).toBeLessThan(300);
  });
});
