import { describe, expect, it } from 'vitest';
import { PREFERRED_SERIES, preferredValues, preferredValuesBetween } from './preferredValues.js';

/** Source: IEC 60063:2015, tables of the E24, E96 and E192 series (from memory). */
const E24 = [
  1.0, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2.0, 2.2, 2.4, 2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2, 6.8,
  7.5, 8.2, 9.1,
];
const E96 = [
  1.0, 1.02, 1.05, 1.07, 1.1, 1.13, 1.15, 1.18, 1.21, 1.24, 1.27, 1.3, 1.33, 1.37, 1.4, 1.43, 1.47, 1.5, 1.54,
  1.58, 1.62, 1.65, 1.69, 1.74, 1.78, 1.82, 1.87, 1.91, 1.96, 2.0, 2.05, 2.1, 2.15, 2.21, 2.26, 2.32, 2.37,
  2.43, 2.49, 2.55, 2.61, 2.67, 2.74, 2.8, 2.87, 2.94, 3.01, 3.09, 3.16, 3.24, 3.32, 3.4, 3.48, 3.57, 3.65,
  3.74, 3.83, 3.92, 4.02, 4.12, 4.22, 4.32, 4.42, 4.53, 4.64, 4.75, 4.87, 4.99, 5.11, 5.23, 5.36, 5.49, 5.62,
  5.76, 5.9, 6.04, 6.19, 6.34, 6.49, 6.65, 6.81, 6.98, 7.15, 7.32, 7.5, 7.68, 7.87, 8.06, 8.25, 8.45, 8.66,
  8.87, 9.09, 9.31, 9.53, 9.76,
];
/** The last two dozen of E192, with the one that departs from the formula. */
const E192_END = [
  7.59, 7.68, 7.77, 7.87, 7.96, 8.06, 8.16, 8.25, 8.35, 8.45, 8.56, 8.66, 8.76, 8.87, 8.98, 9.09, 9.2, 9.31,
  9.42, 9.53, 9.65, 9.76, 9.88,
];

describe('preferredValues', () => {
  it('gives the published E24 and E96 series', () => {
    expect(preferredValues(24)).toEqual(E24);
    expect(preferredValues(96)).toEqual(E96);
  });

  it('gives the published end of E192', () => {
    expect(preferredValues(192).slice(-E192_END.length)).toEqual(E192_END);
  });

  it('leaves out every second value from series to series', () => {
    expect(preferredValues(12)).toEqual(E24.filter((_, n) => n % 2 === 0));
    expect(preferredValues(6)).toEqual([1, 1.5, 2.2, 3.3, 4.7, 6.8]);
    expect(preferredValues(3)).toEqual([1, 2.2, 4.7]);
    expect(preferredValues(48)).toEqual(E96.filter((_, n) => n % 2 === 0));
  });

  it.each(PREFERRED_SERIES)('gives E%i as many values as its name says, ascending', (series) => {
    const values = preferredValues(series);
    expect(values).toHaveLength(series);
    expect(values).toEqual([...new Set(values)].sort((a, b) => a - b));
  });
});

describe('preferredValuesBetween', () => {
  it('goes through the decades without rounding errors, both ends included', () => {
    expect(preferredValuesBetween(3, 0.22, 470)).toEqual([
      0.22, 0.47, 1, 2.2, 4.7, 10, 22, 47, 100, 220, 470,
    ]);
    expect(preferredValuesBetween(24, 4.7e6, 5.1e6)).toEqual([4.7e6, 5.1e6]);
    expect(preferredValuesBetween(24, 9.5, 9.9)).toEqual([]);
    expect(preferredValuesBetween(24, 2, 1)).toEqual([]);
  });
});
