import { describe, expect, it } from 'vitest';
import { commonPrefix, formatInPrefix, unitInPrefix } from './column.js';

describe('a column of values', () => {
  it('takes the prefix of its median', () =>
    expect(commonPrefix([67e-9, 80e-9, 1.2e-6, 0, NaN], 'voltage')).toBe('n'));

  it('takes no prefix without values, or for kinds that have none', () => {
    expect(commonPrefix([], 'voltage')).toBe('');
    expect(commonPrefix([0, Infinity], 'voltage')).toBe('');
    expect(commonPrefix([1e4], 'gain')).toBe('');
  });

  it('rounds before it chooses', () => expect(commonPrefix([999.96], 'resistance')).toBe('k'));

  it('writes each number in the common prefix', () => {
    expect(formatInPrefix(67.8e-9, 'voltage', 'n')).toBe('67.8');
    expect(formatInPrefix(1.2347e-6, 'voltage', 'n')).toBe('1235');
    expect(formatInPrefix(4.7e-10, 'voltage', 'n')).toBe('0.470');
    expect(formatInPrefix(0, 'voltage', 'n')).toBe('0');
    expect(formatInPrefix(NaN, 'voltage', 'n')).toBe('–');
  });

  it('writes temperatures in °C, fractions in percent and temperature coefficients in ppm/K', () => {
    expect(formatInPrefix(77, 'temperature', '')).toBe('\u2212196');
    expect(formatInPrefix(0.01, 'fraction', '')).toBe('1.00');
    expect(formatInPrefix(-2e-4, 'temperatureCoefficient', '')).toBe('\u2212200');
  });

  it('names the unit for its heading', () => {
    expect(unitInPrefix('voltageNoiseDensity', 'n')).toBe('nV/√Hz');
    expect(unitInPrefix('temperature', '')).toBe('°C');
    expect(unitInPrefix('fraction', '')).toBe('%');
    expect(unitInPrefix('temperatureCoefficient', '')).toBe('ppm/K');
  });
});
