import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromDisplayUnit, toDisplayUnit } from './displayUnit.js';
import type { QuantityKind } from './kinds.js';
import { parseUnit } from './parseUnit.js';

const UNITS = ['nV/√Hz', 'pA/√Hz', 'MHz', 'pF', 'nA', 'mA', 'V', 'kΩ', '%', 'dB', 'K', 'ppm/K', ''];

describe('parseUnit', () => {
  it.each<[string, QuantityKind | null, number, number]>([
    ['nV/√Hz', 'voltageNoiseDensity', 1e-9, 0],
    ['pA/rtHz', 'currentNoiseDensity', 1e-12, 0],
    ['nV/Hz^0.5', 'voltageNoiseDensity', 1e-9, 0],
    ['MHz', 'frequency', 1e6, 0],
    ['pF', 'capacitance', 1e-12, 0],
    ['kOhm', 'resistance', 1e3, 0],
    ['mA', 'current', 1e-3, 0],
    ['V', 'voltage', 1, 0],
    ['%', 'fraction', 0.01, 0],
    ['ppm', 'fraction', 1e-6, 0],
    ['ppm/K', 'temperatureCoefficient', 1e-6, 0],
    ['ppm/°C', 'temperatureCoefficient', 1e-6, 0],
    ['1/K', 'temperatureCoefficient', 1, 0],
    ['°C', 'temperature', 1, 273.15],
    ['K', 'temperature', 1, 0],
    ['F', 'capacitance', 1, 0],
    ['', null, 1, 0],
  ])('reads “%s” as a %s', (text, kind, factor, offset) =>
    expect(parseUnit(text)).toMatchObject({ kind, factor, offset }),
  );

  it('takes F for degrees Fahrenheit where a temperature is expected', () =>
    expect(parseUnit('F', 'temperature')).toMatchObject({ kind: 'temperature', scale: 'fahrenheit' }));

  it('takes K and °C for steps of temperature where a difference is expected', () => {
    for (const unit of ['K', '°C'])
      expect(parseUnit(unit, 'temperatureDifference')).toMatchObject({
        kind: 'temperatureDifference',
        factor: 1,
        offset: 0,
      });
  });

  it.each(['mhz', 'furlong', 'nV/Hz', 'Pa', 'k', 'constructor', '__proto__'])('refuses “%s”', (text) =>
    expect(parseUnit(text)).toBeNull(),
  );
});

describe('a display unit', () => {
  it.each<[number, string, number]>([
    [1.1e-9, 'nV/√Hz', 1.1],
    [40e6, 'MHz', 40],
    [2.2e-12, 'pF', 2.2],
    [4e-3, 'mA', 4],
    [36, 'V', 36],
    [2, '', 2],
    [5e-5, 'ppm/K', 50],
    [233.15, '°C', -40],
    [293.15, '°F', 68],
  ])('shows %d in “%s” as %d, and back, without binary dust', (si, unit, shown) => {
    expect(toDisplayUnit(si, unit)).toBe(shown);
    expect(fromDisplayUnit(shown, unit)).toBe(si);
  });

  it('leaves values that are not finite as they are', () =>
    expect(toDisplayUnit(Infinity, 'MHz')).toBe(Infinity));

  it('refuses a unit that it does not know', () =>
    expect(() => toDisplayUnit(1, 'furlong')).toThrow(new RangeError('unknown unit “furlong”')));

  it('gives every value back', () => {
    const values = fc
      .double({ min: -1e200, max: 1e200, noNaN: true })
      .filter((v) => v === 0 || Math.abs(v) > 1e-200);
    fc.assert(
      fc.property(values, fc.constantFrom(...UNITS), (value, unit) => {
        expect(fromDisplayUnit(toDisplayUnit(value, unit), unit) - value).toBeLessThanOrEqual(
          Math.abs(value) * 1e-15,
        );
      }),
    );
  });
});
