import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatQuantity } from './formatQuantity.js';
import type { QuantityKind } from './kinds.js';
import { parseQuantity } from './parseQuantity.js';
import { splitQuantity, type FormatOptions } from './splitQuantity.js';

const THIN = '\u2009';

describe('formatQuantity', () => {
  it.each<[number, QuantityKind, string]>([
    [67.8e-9, 'voltage', '67.8 nV'],
    [4700, 'resistance', '4.70 kΩ'],
    [-4700, 'resistance', '\u22124.70 kΩ'],
    [999.96, 'resistance', '1.00 kΩ'],
    [999.4, 'resistance', '999 Ω'],
    [0, 'resistance', '0 Ω'],
    [-0, 'voltage', '0 V'],
    [1e-7, 'capacitance', '100 nF'],
    [4.7e-6, 'inductance', '4.70 \u00B5H'],
    [3.3e-9, 'voltageNoiseDensity', '3.30 nV/√Hz'],
    [20000, 'frequency', '20.0 kHz'],
    [1.23e26, 'resistance', '123 YΩ'],
    [1e30, 'resistance', '1.00e30 Ω'],
    [1.5e-30, 'voltage', '1.50e\u221230 V'],
    [285.15, 'temperature', '12 °C'],
    [298.15, 'temperature', '25 °C'],
    [233.15, 'temperature', '\u221240 °C'],
    [3000, 'temperature', '2727 °C'],
    [77, 'temperature', '77 K'],
    [4.2, 'temperature', '4.2 K'],
    [0.01, 'temperature', '10 mK'],
    [273.15, 'temperature', '0 °C'],
    [0.01, 'fraction', '1.00 %'],
    [0.41, 'fraction', '41.0 %'],
    [5e-5, 'temperatureCoefficient', '50.0 ppm/K'],
    [80, 'temperatureDifference', '80 K'],
    [1.4717, 'decibel', '1.47 dB'],
    [-0.001, 'decibel', '0.00 dB'],
    [100, 'gain', '100'],
    [10.5, 'gain', '10.5'],
    [1234, 'count', '1234'],
    [12345, 'count', `12${THIN}345`],
    [1e9, 'count', `1${THIN}000${THIN}000${THIN}000`],
  ])('writes %d as a %s as “%s”', (value, kind, text) =>
    expect(formatQuantity(value, kind)).toBe(text.replace(' ', THIN)),
  );

  it.each<[number, QuantityKind, FormatOptions, string]>([
    [4700, 'resistance', { trim: true }, '4.7 kΩ'],
    [1000, 'resistance', { trim: true }, '1 kΩ'],
    [100e3, 'resistance', { trim: true }, '100 kΩ'],
    [1e30, 'resistance', { trim: true }, '1e30 Ω'],
    [4712.3, 'resistance', { digits: 5 }, '4.7123 kΩ'],
    [470, 'resistance', { digits: 2 }, '470 Ω'],
    [1, 'decibel', { trim: true }, '1 dB'],
    [0.01, 'fraction', { trim: true }, '1 %'],
  ])('writes %d as a %s with %o as “%s”', (value, kind, options, text) =>
    expect(formatQuantity(value, kind, options)).toBe(text.replace(' ', THIN)),
  );

  it.each([NaN, Infinity, -Infinity])('writes %d as a dash', (value) =>
    expect(formatQuantity(value, 'resistance')).toBe('–'),
  );

  it('gives a text that parses back to within its rounding', () => {
    const value = fc.double({ min: 1e-30, max: 1e30, noNaN: true });
    fc.assert(
      fc.property(
        value,
        fc.constantFrom<QuantityKind>('resistance', 'voltageNoiseDensity', 'fraction', 'gain'),
        (v, kind) => {
          const parsed = parseQuantity(formatQuantity(v, kind), kind);
          expect(parsed.ok && Math.abs(parsed.value / v - 1)).toBeLessThanOrEqual(0.005);
        },
      ),
    );
  });
});

describe('splitQuantity', () => {
  it('keeps number and unit apart', () =>
    expect(splitQuantity(4700, 'resistance')).toEqual({ number: '4.70', unit: 'kΩ' }));
  it('gives a dash without unit for a value that is not finite', () =>
    expect(splitQuantity(NaN, 'voltage')).toEqual({ number: '–', unit: '' }));
});
