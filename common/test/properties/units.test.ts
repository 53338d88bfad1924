import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  formatEditable,
  formatQuantity,
  parseQuantity,
  QUANTITIES,
  type QuantityKind,
} from '../../src/units/index.js';
import { decades, seeded } from '../support/arbitraries.js';

const KINDS = Object.keys(QUANTITIES) as QuantityKind[];
const PREFIXED = KINDS.filter((kind) => QUANTITIES[kind].style === 'prefixed');

function parsed(text: string, kind: QuantityKind): number {
  const result = parseQuantity(text, kind);
  if (!result.ok) throw new Error(result.message);
  return result.value;
}

describe('what is shown, read back', () => {
  it.each(PREFIXED)('is a %s within half of the third digit', (kind) => {
    fc.assert(
      fc.property(decades(1e-23, 1e23), fc.boolean(), (magnitude, negative) => {
        const value = negative ? -magnitude : magnitude;
        expect(Math.abs(parsed(formatQuantity(value, kind), kind) / value - 1)).toBeLessThan(0.00501);
      }),
      seeded(200),
    );
  });

  it.each(PREFIXED)('is shown the same again as a %s', (kind) => {
    fc.assert(
      fc.property(decades(1e-23, 1e23), (value) => {
        const text = formatQuantity(value, kind);
        expect(formatQuantity(parsed(text, kind), kind)).toBe(text);
      }),
      seeded(200),
    );
  });

  it('is a decibel within its second decimal', () => {
    fc.assert(
      fc.property(fc.double({ min: -200, max: 200, noNaN: true }), (value) => {
        expect(Math.abs(parsed(formatQuantity(value, 'decibel'), 'decibel') - value)).toBeLessThan(0.00501);
      }),
      seeded(200),
    );
  });
});

describe('what stands in a field, read back', () => {
  it.each(KINDS.filter((kind) => kind !== 'temperature'))('is exactly the same %s', (kind) => {
    fc.assert(
      fc.property(decades(1e-20, 1e15), (value) => {
        expect(parsed(formatEditable(value, kind), kind)).toBe(value);
      }),
      seeded(200),
    );
  });

  it('is the same temperature to 1e-12', () => {
    fc.assert(
      fc.property(decades(0.01, 3000), (value) => {
        expect(parsed(formatEditable(value, 'temperature'), 'temperature') / value).toBeCloseTo(1, 11);
      }),
      seeded(200),
    );
  });
});
