import { describe, expect, it } from 'vitest';
import type { QuantityKind } from './kinds.js';
import { parseQuantity } from './parseQuantity.js';

function expectValue(text: string, kind: QuantityKind, value: number) {
  expect(parseQuantity(text, kind)).toEqual({ ok: true, value });
}

describe('parseQuantity reads', () => {
  it.each<[string, QuantityKind, number]>([
    ['4k7', 'resistance', 4700],
    ['4K7', 'resistance', 4700],
    ['2M2', 'resistance', 2.2e6],
    ['R47', 'resistance', 0.47],
    ['47R', 'resistance', 47],
    ['47R0', 'resistance', 47],
    ['1G5', 'resistance', 1.5e9],
    ['4k7 Ω', 'resistance', 4700],
    ['4n7', 'capacitance', 4.7e-9],
    ['2p2', 'capacitance', 2.2e-12],
    ['4n7f', 'capacitance', 4.7e-9],
    ['p33', 'capacitance', 0.33e-12],
    ['4m7', 'capacitance', 4.7e-3],
    ['4µ7', 'capacitance', 4.7e-6],
    ['4u7', 'inductance', 4.7e-6],
    ['4\u03BC7', 'inductance', 4.7e-6],
    ['4m7', 'inductance', 4.7e-3],
    ['3V3', 'voltage', 3.3],
  ])('the value code “%s” as a %s', (text, kind, value) => expectValue(text, kind, value));

  it.each<[string, QuantityKind, number]>([
    ['4.7 kΩ', 'resistance', 4700],
    ['4.7kOhm', 'resistance', 4700],
    ['4.7 kohms', 'resistance', 4700],
    ['100 ohm', 'resistance', 100],
    ['10k', 'resistance', 10000],
    ['4.7 k\u2126', 'resistance', 4700],
    ['4.7 k\u03A9', 'resistance', 4700],
    ['2.2 meg', 'resistance', 2.2e6],
    ['2.2 Megohm', 'resistance', 2.2e6],
    ['5 mΩ', 'resistance', 5e-3],
    ['5 MΩ', 'resistance', 5e6],
    ['0,1 µF', 'capacitance', 1e-7],
    ['0.1 uF', 'capacitance', 1e-7],
    ['0.1 \u03BCF', 'capacitance', 1e-7],
    ['100pf', 'capacitance', 1e-10],
    ['1.5 H', 'inductance', 1.5],
    ['1e-9', 'current', 1e-9],
    ['1.5e3', 'resistance', 1500],
    ['1.5E3 k', 'resistance', 1.5e6],
    ['3.3×10⁻⁹', 'current', 3.3e-9],
    ['10 mW', 'power', 0.01],
    ['20 kHz', 'frequency', 20000],
    ['20', 'frequency', 20],
    ['1 MHz', 'frequency', 1e6],
    ['1 Mhz', 'frequency', 1e6],
    ['1 KHz', 'frequency', 1000],
    ['1 khz', 'frequency', 1000],
    ['1 GHz', 'frequency', 1e9],
    ['1 ghz', 'frequency', 1e9],
    ['1 mHz', 'frequency', 1e-3],
    ['100', 'gain', 100],
    ['100 V/V', 'gain', 100],
    ['10k', 'gain', 10000],
    ['4', 'count', 4],
    ['1 %', 'fraction', 0.01],
    ['0.01', 'fraction', 0.01],
    ['50 ppm', 'fraction', 5e-5],
    ['1.5 dB', 'decibel', 1.5],
    ['80 K', 'temperatureDifference', 80],
    ['80 °C', 'temperatureDifference', 80],
    ['80', 'temperatureDifference', 80],
    ['50 ppm/K', 'temperatureCoefficient', 5e-5],
    ['-150 ppm/°C', 'temperatureCoefficient', -1.5e-4],
    ['50 PPM/C', 'temperatureCoefficient', 5e-5],
    ['50·10⁻⁶/K', 'temperatureCoefficient', 5e-5],
    ['50e-6 K⁻¹', 'temperatureCoefficient', 5e-5],
    ['0.00005 1/K', 'temperatureCoefficient', 5e-5],
    ['0.01 %/K', 'temperatureCoefficient', 1e-4],
    ['5e-5', 'temperatureCoefficient', 5e-5],
    ['−3', 'decibel', -3],
    ['+5 V', 'voltage', 5],
  ])('“%s” as a %s', (text, kind, value) => expectValue(text, kind, value));

  it.each([
    '3.3 nV/√Hz',
    '3.3nV/rtHz',
    '3.3 nV/rt(Hz)',
    '3.3 nV/sqrt(Hz)',
    '3.3 nV/Hz^0.5',
    '3.3 nV/Hz^(1/2)',
    '3.3 nV/Hz½',
    '3.3 nV·Hz^-0.5',
    '3.3 nVrms/√Hz',
    '3.3 nv/rthz',
    '3.3n',
    '3.3e-9',
    '３．３ ｎＶ／√Ｈｚ',
  ])('the voltage noise density “%s”', (text) => expectValue(text, 'voltageNoiseDensity', 3.3e-9));

  it('the current noise density “1.2 pA/sqrt(Hz)”', () =>
    expectValue('1.2 pA/sqrt(Hz)', 'currentNoiseDensity', 1.2e-12));

  it.each<[string, number]>([
    ['\u221240 °C', 233.15],
    ['-40 °C', 233.15],
    ['–40 °C', 233.15],
    ['−40 ℃', 233.15],
    ['-40 ºC', 233.15],
    ['77 K', 77],
    ['77 \u212A', 77],
    ['300 mK', 0.3],
    ['25C', 298.15],
    ['25', 298.15],
    ['68 °F', 293.15],
    ['68 F', 293.15],
    ['-459.67 °F', 0],
  ])('the temperature “%s”, a number alone in °C', (text, value) => expectValue(text, 'temperature', value));

  it.each<[string, number]>([
    ['10 000 Ω', 10000],
    ['10\u2009000\u00A0Ω', 10000],
    ['10\u202F000\u202FΩ', 10000],
    ["10'000 Ω", 10000],
    ['1 234 567,5', 1234567.5],
    ['0.123 456', 0.123456],
    ['0,125', 0.125],
    ['1,000', 1],
    ['1.234,56', 1234.56],
    ['1,234.56', 1234.56],
    ['1,234,567', 1234567],
    ['.5', 0.5],
    ['5.', 5],
    ['４．７ ｋΩ', 4700],
    ['４，７ｋ', 4700],
    ['\u200B4.7\u200Bk', 4700],
  ])('the marks, groups and full-width forms of “%s”', (text, value) =>
    expectValue(text, 'resistance', value),
  );
});
