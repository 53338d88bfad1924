import { describe, expect, it } from 'vitest';
import { stepQuantity } from './stepQuantity';

describe('stepping a quantity', () => {
  it('goes to the next value of the series, across decades', () => {
    expect(stepQuantity(8200, 'resistance', 1)).toBe(10000);
    expect(stepQuantity(1e-9, 'capacitance', -1)).toBe(8.2e-10);
    expect(stepQuantity(50, 'resistance', 1)).toBe(56);
    expect(stepQuantity(50, 'resistance', -1)).toBe(47);
  });

  it('goes by one where a series makes no sense', () => {
    expect(stepQuantity(298.15, 'temperature', -1)).toBe(297.15);
    expect(stepQuantity(2, 'count', 1)).toBe(3);
  });

  it('stays at zero', () => {
    expect(stepQuantity(0, 'inductance', 1)).toBe(0);
  });
});
