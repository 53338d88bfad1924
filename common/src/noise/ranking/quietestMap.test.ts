import { describe, expect, it } from 'vitest';
import { randomLibrary } from '../../../test/support/randomLibrary.js';
import type { OperatingConditions } from '../../conditions/index.js';
import type { AmplifierColumns } from './columns.js';
import { axisPoints, cellConditions, quietestMap, type MapQuery } from './quietestMap.js';
import { rankAmplifiers } from './rankAmplifiers.js';

function library(count: number, seed: number): AmplifierColumns {
  const columns = randomLibrary(count, seed);
  for (let row = 0; row < count; row++) {
    if (row % 3 > 0) columns.parameters.minimumStableGain[row] = 1 + (row % 20);
    columns.searchText[row] = row % 11 === 0 ? 'odd' : 'plain';
  }
  return columns;
}

const base: OperatingConditions = {
  source: { resistance: 600, inductance: 0, capacitance: 1e-10 },
  ambientTemperature: 298.15,
  band: { lower: 20, upper: 20000, lowPassOrder: 2 },
  stage: { topology: 'non-inverting', gain: 10, gainResistance: 100 },
  referenceFrequency: 1000,
  bandwidthMargin: 3,
  amplifierTemperatureModel: 'estimated',
};

const stages: [string, OperatingConditions][] = [
  ['a non-inverting stage', base],
  ['a non-inverting stage with a coil', { ...base, source: { ...base.source, inductance: 0.1 } }],
  ['an inverting stage', { ...base, stage: { topology: 'inverting', gain: 5, gainResistance: 1000 } }],
  [
    'an inverting stage with a coil',
    {
      ...base,
      source: { ...base.source, inductance: 0.01 },
      stage: { topology: 'inverting', gain: 5, gainResistance: 10 },
    },
  ],
  [
    'a difference stage with a coil',
    {
      ...base,
      source: { resistance: 600, inductance: 1.5, capacitance: 0 },
      stage: { topology: 'difference', gain: 5, gainResistance: 100 },
    },
  ],
  ['a difference stage', { ...base, stage: { topology: 'difference', gain: 5, gainResistance: 1000 } }],
  [
    'an instrumentation stage of high impedance',
    {
      ...base,
      stage: { topology: 'instrumentation', gain: 3, gainResistance: 1e6, differenceResistance: 1e5 },
    },
  ],
  [
    'a transimpedance stage',
    { ...base, stage: { topology: 'transimpedance', feedbackResistance: 1e6, feedbackCapacitance: 'auto' } },
  ],
];

const query = (conditions: OperatingConditions): MapQuery => ({
  conditions,
  filter: { search: 'plain' },
  resistance: { from: 1, to: 1e7, steps: 8 },
  frequency: { from: 0.1, to: 1e7, steps: 9 },
});

describe('quietestMap', () => {
  const libraries = [library(60, 1), library(400, 2)];

  it.each(stages)('has in each cell the leader of a ranking at that cell, for %s', (_, conditions) => {
    const map = quietestMap(query(conditions), libraries);
    map.resistances.forEach((resistance, r) =>
      map.frequencies.forEach((frequency, f) => {
        const { items } = rankAmplifiers(
          {
            conditions: cellConditions(conditions, resistance, frequency),
            filter: { search: 'plain' },
            target: {},
            sort: 'inputNoiseDensity',
            descending: false,
            limit: 1,
            offset: 0,
          },
          libraries,
        );
        const leader = items[0] && { library: items[0].library, row: items[0].row };
        expect(map.parts[map.winners[r][f]]).toEqual(leader);
      }),
    );
  });

  it('gives cells to the first of two parts that only rounding tells apart', () => {
    const twins = library(2, 5);
    for (const column of Object.values(twins.parameters))
      if (column instanceof Float64Array) column[1] = column[0];
    twins.parameters.gainBandwidth.set([35e6, 170e6]);
    const conditions = { ...base, bandwidthMargin: 0, source: { ...base.source, inductance: 0.1 } };
    const { parts, winners } = quietestMap({ ...query(conditions), filter: {} }, [twins]);
    expect(parts).toEqual([{ library: 0, row: 0 }]);
    expect(new Set(winners.flat())).toEqual(new Set([0]));
  });

  it('has cells without a winner where nothing is fast enough, and territories of several parts', () => {
    const { winners, parts } = quietestMap(query(base), [library(40, 3)]);
    expect(parts.length).toBeGreaterThan(2);
    const slow = { ...query(base), frequency: { from: 1e12, to: 1e12, steps: 1 }, filter: {} };
    const columns = library(10, 4);
    columns.parameters.gainBandwidth.fill(1e6);
    expect(quietestMap(slow, [columns]).winners.flat()).toEqual(Array(8).fill(-1));
    expect(winners.flat().every((index) => index < parts.length)).toBe(true);
  });

  it('answers an empty library with an empty map', () => {
    const map = quietestMap(query(base), []);
    expect(map.parts).toEqual([]);
    expect(map.winners.flat()).toEqual(Array(72).fill(-1));
  });
});

describe('axisPoints', () => {
  it('goes in equal factors from end to end', () => {
    expect(axisPoints({ from: 1, to: 1000, steps: 4 }).map((x) => Math.round(x))).toEqual([1, 10, 100, 1000]);
    expect(axisPoints({ from: 5, to: 9, steps: 1 })).toEqual([5]);
  });
});
