import { describe, expect, it } from 'vitest';
import {
  normalisePartKey,
  preferredValues,
  readResistorSeries,
  resistorsOfSeries,
  TECHNOLOGIES,
  type PreferredSeries,
  type ResistorPart,
  type Technology,
} from '../../src/parts/index.js';
import { parseQuantity } from '../../src/units/index.js';
import { readCsv, readOpAmps, readResistors } from './readCsv.js';

const series = readCsv('curated/resistor-series.csv').map((row) => {
  const reading = readResistorSeries(row);
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return reading.series;
});
const parts = series.flatMap(resistorsOfSeries);
const keyOf = ({ manufacturer, partNumber }: ResistorPart) => normalisePartKey(manufacturer, partNumber);
const ofTechnology = (technology: Technology) =>
  parts.filter((part) => part.resistor.technology === technology);

/** In dB; common practice, no source. */
const NOISE_INDEX: Record<Technology, readonly [number, number]> = {
  'metal-foil': [-40, -40],
  'thin-film': [-40, -25],
  'metal-film': [-35, -20],
  wirewound: [-38, -38],
  'thick-film': [-15, 10],
  'carbon-film': [-20, 0],
  'carbon-composition': [-12, 6],
};

const SERIES: Partial<Record<Technology, PreferredSeries>> = {
  'thin-film': 96,
  'metal-film': 96,
  'thick-film': 24,
};

describe('the curated resistors', () => {
  it('are at least 4000 of the op-amps’ eight makers, none twice', () => {
    expect(parts.length).toBeGreaterThanOrEqual(4000);
    expect(new Set(parts.map(keyOf))).toHaveProperty('size', parts.length);
    const makers = new Set(readOpAmps('curated/op-amps.csv').map(({ manufacturer }) => manufacturer));
    expect(new Set(parts.map(({ manufacturer }) => manufacturer))).toEqual(makers);
  });

  it('have preferred values alone, which their part numbers tell', () => {
    for (const { lowest, highest, preferred } of series) {
      const mantissas = new Set(preferredValues(preferred));
      const whole = resistorsOfSeries({ lowest, highest, preferred });
      expect(whole[0].resistor.resistance).toBe(lowest.resistor.resistance);
      expect(whole.at(-1)!.resistor.resistance).toBe(highest.resistor.resistance);
      for (const { partNumber, resistor } of whole) {
        const mantissa = Number(resistor.resistance.toExponential(2).split('e')[0]);
        expect(mantissas, partNumber).toContain(mantissa);
        const code = partNumber
          .split('-')
          .at(-1)!
          .replace(/([RKMG])$/, '$10');
        expect(parseQuantity(code, 'resistance')).toEqual({ ok: true, value: resistor.resistance });
      }
    }
  });

  it('are graded as their technology is', () => {
    for (const { lowest, preferred } of series) {
      const expected = SERIES[lowest.resistor.technology!];
      if (expected !== undefined) expect(preferred, lowest.partNumber).toBe(expected);
    }
    expect(
      series.some(
        ({ lowest, preferred }) => lowest.resistor.technology === 'metal-foil' && preferred === 192,
      ),
    ).toBe(true);
  });

  it.each(TECHNOLOGIES)(
    'of %s have all their figures, and a noise index that such a part has',
    (technology) => {
      const [least, most] = NOISE_INDEX[technology];
      expect(ofTechnology(technology).length).toBeGreaterThan(100);
      for (const { partNumber, resistor } of ofTechnology(technology)) {
        expect(Object.values(resistor), partNumber).not.toContain(null);
        expect(resistor.noiseIndex, partNumber).toBeGreaterThanOrEqual(least);
        expect(resistor.noiseIndex, partNumber).toBeLessThanOrEqual(most);
      }
    },
  );

  it('of thick film have a noise index that rises with the value and falls with the size', () => {
    const index = (partNumber: string) =>
      parts.find((part) => part.partNumber === partNumber)!.resistor.noiseIndex!;
    expect(index('SB-K0603-1M00')).toBeGreaterThan(index('SB-K0603-1K00'));
    const sizes = ['0402', '0603', '0805', '1206'].map((size) => index(`SB-K${size}-10K0`));
    expect(sizes).toEqual(sizes.toSorted((one, other) => other - one));
    expect(new Set(sizes).size).toBe(4);
  });
});

describe('Tarnfield’s own resistors', () => {
  const own = readResistors('demo/tarnfield-resistors.csv');

  it('are about forty, none twice, some of them curated parts', () => {
    expect(own).toHaveLength(40);
    expect(new Set(own.map(keyOf)).size).toBe(40);
    const curated = new Set(parts.map(keyOf));
    expect(own.filter((part) => curated.has(keyOf(part))).length).toBeGreaterThan(10);
  });

  it.each(['noiseIndex', 'powerRating', 'temperatureRise', 'tolerance'] as const)(
    'have gaps at %s',
    (key) => {
      const known = own.filter(({ resistor }) => resistor[key] !== null).length;
      expect(known).toBeGreaterThan(20);
      expect(known).toBeLessThan(40);
    },
  );
});
