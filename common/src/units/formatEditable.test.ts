import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatEditable } from './formatEditable.js';
import type { QuantityKind } from './kinds.js';
import { parseQuantity } from './parseQuantity.js';
import { QUANTITIES } from './quantities.js';

const KINDS = Object.keys(QUANTITIES) as QuantityKind[];

describe('formatEditable', () => {
  it.each<[number, QuantityKind, string]>([
    [4700, 'resistance', '4.7 kΩ'],
    [1000, 'resistance', '1 kΩ'],
    [1e-7, 'capacitance', '100 nF'],
    [4712.345678, 'resistance', '4.712345678 kΩ'],
    [0, 'voltage', '0 V'],
    [1e40, 'resistance', '1e40 Ω'],
    [233.15, 'temperature', '\u221240 °C'],
    [298.15, 'temperature', '25 °C'],
    [77, 'temperature', '77 K'],
    [0.01, 'fraction', '1 %'],
    [5e-5, 'temperatureCoefficient', '50 ppm/K'],
    [80, 'temperatureDifference', '80 K'],
    [1.5, 'decibel', '1.5 dB'],
    [12345, 'count', '12345'],
    [NaN, 'voltage', ''],
  ])('writes %d as a %s as “%s”', (value, kind, text) => expect(formatEditable(value, kind)).toBe(text));

  it.each(KINDS.filter((kind) => kind !== 'temperature'))('gives every %s back exactly', (kind) => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(parseQuantity(formatEditable(value, kind), kind)).toEqual({ ok: true, value: value + 0 });
      }),
    );
  });

  it('gives every temperature back to 1e-12', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 1e6, noNaN: true }), (value) => {
        const parsed = parseQuantity(formatEditable(value, 'temperature'), 'temperature');
        expect(parsed.ok && Math.abs(parsed.value / value - 1)).toBeLessThan(1e-12);
      }),
    );
  });
});
