import { describe, expect, it } from 'vitest';
import { ORIGIN_SPREAD } from './relativeSpread.js';

describe('ORIGIN_SPREAD', () => {
  // Common practice, no source; agreed for this product.
  it.each([
    ['typical', 0.2, 0.2],
    ['maximum', 0.4, 0],
    ['measured', 0.03, 0.03],
    ['estimated', 0.4, 0.4],
  ] as const)('takes a %s figure as %d below and %d above', (origin, below, above) => {
    expect(ORIGIN_SPREAD[origin]).toEqual({ below, above });
  });
});
