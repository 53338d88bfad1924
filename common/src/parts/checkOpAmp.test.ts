import { describe, expect, it } from 'vitest';
import type { Amplifier } from './amplifier.js';
import { checkOpAmp } from './checkOpAmp.js';

const withSupply = (supplyMinimum: number | null, supplyMaximum: number | null) => ({
  amplifier: { supplyMinimum, supplyMaximum } as Amplifier,
});

describe('checkOpAmp', () => {
  it('refuses a supply maximum below the minimum', () => {
    expect(checkOpAmp(withSupply(5, 3))).toEqual([
      {
        field: 'amplifier.supplyMaximum',
        message: 'supply maximum: a voltage not below the supply minimum was expected',
      },
    ]);
  });

  it.each([
    [3, 5],
    [5, 5],
    [null, 5],
    [5, null],
    [null, null],
  ])('allows a supply from %s to %s', (minimum, maximum) => {
    expect(checkOpAmp(withSupply(minimum, maximum))).toEqual([]);
  });
});
