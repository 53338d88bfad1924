import { describe, expect, it } from 'vitest';
import { parseQuantity } from '../units/index.js';
import { preferredValuesBetween } from './preferredValues.js';
import { valueCode } from './valueCode.js';

describe('valueCode', () => {
  it.each([
    [0.01, 'R010'],
    [0.22, 'R220'],
    [1, '1R00'],
    [47, '47R0'],
    [470, '470R'],
    [999.6, '1K00'],
    [4700, '4K70'],
    [10200, '10K2'],
    [1e6, '1M00'],
    [2.2e9, '2G20'],
  ])('writes %d Ω as %s', (resistance, code) => {
    expect(valueCode(resistance)).toBe(code);
  });

  it('gives every preferred value a code that reads back to it', () => {
    for (const resistance of preferredValuesBetween(192, 0.1, 1e9))
      expect(parseQuantity(valueCode(resistance).replace(/([RKMG])$/, '$10'), 'resistance')).toEqual({
        ok: true,
        value: resistance,
      });
  });
});
