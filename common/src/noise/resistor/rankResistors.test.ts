import { describe, expect, it } from 'vitest';
import { BOLTZMANN } from '../constants.js';
import { rankResistors, type LibraryResistor, type ResistorQuery } from './rankResistors.js';
import type { ResistorConditions } from '../../conditions/index.js';
import { resistorNoise } from './resistorNoise.js';

const conditions: ResistorConditions = {
  resistance: 1000,
  resistanceTolerance: 0.02,
  dcVoltage: 2.5,
  ambientTemperature: 298.15,
  band: { lower: 0.1, upper: 1000, lowPassOrder: 0 },
};

const resistor: LibraryResistor = {
  resistance: 1000,
  tolerance: 0.01,
  temperatureCoefficient: 5e-5,
  powerRating: 0.125,
  technology: 'thick-film',
  noiseIndex: -10,
  temperatureRise: 80,
  lifecycle: 'active',
  approval: 'approved',
  package: '0805',
  searchText: 'tarn micro tr-1',
};

const query: ResistorQuery = {
  conditions,
  filter: {},
  sort: 'totalRms',
  descending: false,
  limit: 50,
  offset: 0,
};

const make = (change: Partial<LibraryResistor>) => ({ ...resistor, ...change });

describe('resistorNoise', () => {
  it('heats the resistor by its share of the rated temperature rise', () => {
    const { temperature, dissipation, thermalRms } = resistorNoise(conditions, resistor);
    expect(dissipation).toBeCloseTo(6.25e-3, 12);
    expect(temperature).toBeCloseTo(298.15 + 80 * 0.05, 9);
    expect(thermalRms).toBeCloseTo(Math.sqrt(4 * BOLTZMANN * temperature * 1000 * 999.9), 12);
  });

  /** Source: IEC 60195: 0 dB is 1 µV per volt in one decade of frequency. */
  it('makes 1 µV per volt in a decade at a noise index of 0 dB', () => {
    const decade = { ...conditions, dcVoltage: 3, band: { lower: 10, upper: 100, lowPassOrder: 0 } };
    expect(resistorNoise(decade, make({ noiseIndex: 0 })).excessRms).toBeCloseTo(3e-6, 12);
  });

  it('adds thermal and excess noise as squares', () => {
    const { thermalRms, excessRms, totalRms, aboveThermal } = resistorNoise(conditions, resistor);
    expect(excessRms).toBeCloseTo(2.5 * 10 ** -0.5 * 1e-6 * 2, 12);
    expect(totalRms).toBeCloseTo(Math.sqrt(thermalRms ** 2 + excessRms! ** 2), 15);
    expect(aboveThermal).toBeCloseTo(20 * Math.log10(totalRms / thermalRms), 9);
  });

  it('says that an unknown noise index is missing from the total, but not without a direct voltage', () => {
    const unknown = make({ noiseIndex: null });
    expect(resistorNoise(conditions, unknown)).toMatchObject({
      excessRms: null,
      cautions: ['noise-index-unknown'],
    });
    expect(resistorNoise({ ...conditions, dcVoltage: 0 }, unknown)).toMatchObject({
      excessRms: 0,
      aboveThermal: 0,
      cautions: [],
    });
  });

  it.each([
    [{ powerRating: 0.01 }, ['near-rating']],
    [{ powerRating: null }, ['rating-unknown']],
    [{ temperatureRise: null }, ['self-heating-unknown']],
    [{ temperatureRise: null, powerRating: 1 }, []],
  ])('cautions of %j', (change, cautions) => {
    expect(resistorNoise({ ...conditions, dcVoltage: 2.6 }, make(change)).cautions).toEqual(cautions);
  });
});

describe('rankResistors', () => {
  it('puts the quieter technology first and leaves out what lies outside the window', () => {
    const parts = [
      resistor,
      make({ noiseIndex: -40, technology: 'metal-foil' }),
      make({ resistance: 1020 }),
      make({ resistance: 1021 }),
    ];
    const { items, total } = rankResistors(query, parts);
    expect(items.map(({ index }) => index)).toEqual([1, 0, 2]);
    expect(total).toBe(3);
    expect(items[0]).toEqual({ index: 1, rank: 1, figures: resistorNoise(conditions, parts[1]) });
  });

  it.each([
    ['over-rating', { powerRating: 0.005 }, {}, /6\.25\smW, rated for 5\smW/],
    ['lifecycle', { lifecycle: 'obsolete' }, { lifecycle: ['active'] }, /obsolete/],
    ['retired', { lifecycle: 'obsolete', approval: 'not-approved' }, {}, /retired/],
    ['approval', { approval: 'restricted' }, { approval: ['approved'] }, /restricted/],
    ['technology', {}, { technology: ['thin-film'] }, /thick film/],
    ['package', {}, { package: '0603' }, /0805/],
  ] as const)('excludes with the reason %s', (reason, change, filter, detail) => {
    const asked = { ...query, filter: filter as ResistorQuery['filter'] };
    const { excluded, total } = rankResistors(asked, [make(change)]);
    expect(total).toBe(0);
    expect(excluded).toEqual([{ index: 0, reason, detail: expect.stringMatching(detail) }]);
  });

  it('sorts by other figures, unknown ones last', () => {
    const parts = [make({ tolerance: null }), make({ tolerance: 0.05 }), make({ tolerance: 0.001 })];
    const order = (sort: ResistorQuery['sort'], descending = false) =>
      rankResistors({ ...query, sort, descending }, parts).items.map(({ index }) => index);
    expect(order('tolerance')).toEqual([2, 1, 0]);
    expect(order('tolerance', true)).toEqual([1, 2, 0]);
  });

  it('puts parts of unknown noise index last where a direct voltage makes excess noise', () => {
    const parts = [make({ noiseIndex: null }), make({ noiseIndex: 20 })];
    const order = (dcVoltage: number) =>
      rankResistors({ ...query, conditions: { ...conditions, dcVoltage } }, parts).items.map(
        ({ index }) => index,
      );
    expect(order(2.5)).toEqual([1, 0]);
    expect(order(0)).toEqual([0, 1]);
  });

  it('sorts by price, those without one last', () => {
    const parts = [make({}), make({}), make({})];
    const order = (descending: boolean, prices?: Float64Array) =>
      rankResistors({ ...query, sort: 'unitPrice', descending, prices }, parts).items.map(
        ({ index }) => index,
      );
    expect(order(false, Float64Array.of(NaN, 0.9, 0.01))).toEqual([2, 1, 0]);
    expect(order(true, Float64Array.of(NaN, 0.9, 0.01))).toEqual([1, 2, 0]);
    expect(order(false)).toEqual([0, 1, 2]);
  });

  it('finds by words and gives pages', () => {
    const parts = [make({ searchText: 'a b' }), make({ searchText: 'b c' }), make({ searchText: 'c' })];
    const asked = { ...query, filter: { search: 'B' }, limit: 1, offset: 1 };
    expect(rankResistors(asked, parts)).toMatchObject({ total: 2, items: [{ index: 1, rank: 2 }] });
  });
});
