import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { randomLibrary, sequence } from '../../../test/support/randomLibrary.js';
import { checkConditions, type OperatingConditions } from '../../conditions/index.js';
import { stageModel } from '../stage/stageModel.js';
import { scoreContenders } from './contenders.js';
import { withBounds } from './entrants.js';
import { leastNoise } from './leastNoise.js';
import { rankAmplifiers, type Ranking } from './rankAmplifiers.js';
import { scoreRows } from './scores.js';
import { findQuietest, isInQuietSet } from './quietSet.js';
import { PRICED_RANKING_SORTS } from './sortKeys.js';

const between = (from: number, to: number) =>
  fc.double({ min: Math.log(from), max: Math.log(to), noNaN: true }).map(Math.exp);

const stage = fc.oneof(
  fc.record({
    topology: fc.constant('non-inverting' as const),
    gain: between(1.1, 1e3),
    gainResistance: between(1, 1e5),
  }),
  fc.record({
    topology: fc.constant('inverting' as const),
    gain: between(0.1, 1e3),
    gainResistance: between(10, 1e6),
  }),
  fc.record({
    topology: fc.constant('transimpedance' as const),
    feedbackResistance: between(100, 1e10),
    feedbackCapacitance: fc.oneof(fc.constant('auto' as const), fc.constant(0), between(1e-14, 1e-10)),
  }),
  fc.record({
    topology: fc.constant('difference' as const),
    gain: between(0.1, 1e3),
    gainResistance: between(10, 1e6),
  }),
  fc.record({
    topology: fc.constant('instrumentation' as const),
    gain: between(1, 1e3),
    gainResistance: between(1, 1e6),
    differenceResistance: between(100, 1e6),
  }),
);

const conditions = fc
  .record({
    stage,
    resistance: between(1, 1e8),
    inductance: fc.oneof(fc.constant(0), between(1e-6, 10)),
    capacitance: fc.oneof(fc.constant(0), between(1e-13, 1e-7)),
    lower: between(0.01, 1e6),
    width: between(0.02, 1e5),
    place: fc.double({ min: 0, max: 1, noNaN: true }),
    lowPassOrder: fc.nat(4),
  })
  .map(
    ({
      stage: s,
      resistance,
      inductance,
      capacitance,
      lower,
      width,
      place,
      lowPassOrder,
    }): OperatingConditions => ({
      source: { resistance, inductance: s.topology === 'transimpedance' ? 0 : inductance, capacitance },
      ambientTemperature: 298.15,
      band: { lower, upper: lower * (1 + width), lowPassOrder },
      stage: s,
      referenceFrequency: Math.min(lower * (1 + width) ** place, lower * (1 + width)),
      bandwidthMargin: 0,
      amplifierTemperatureModel: 'none',
    }),
  )
  .filter((c) => checkConditions({ conditions: c }).length === 0);

describe('leastNoise', () => {
  const columns = randomLibrary(1000, 3);
  const rows = Uint32Array.from({ length: columns.count }, (_, row) => row);

  it('is never above the total, for any conditions in which no notch can be tuned', () => {
    fc.assert(
      fc.property(conditions, (c) => {
        const model = stageModel(c);
        fc.pre(!model.canNotch);
        const { total, fixed } = leastNoise(c, model, columns, rows);
        const { inputNoiseRms } = scoreRows(c, model, columns, rows);
        const isBound = (row: number) => total[row] < inputNoiseRms[row] && fixed[row] <= total[row];
        expect(rows.filter((row) => !isBound(row))).toHaveLength(0);
      }),
      { numRuns: 80, seed: 20 },
    );
  });
});

describe('scoreContenders', () => {
  const libraries = [randomLibrary(5000, 5), randomLibrary(4500, 6)];
  const accepted = libraries.map(({ count }) => Uint32Array.from({ length: count }, (_, row) => row));

  it('leaves out neither a part of the page nor one of the quiet set', () => {
    let leftOut = 0;
    fc.assert(
      fc.property(conditions, (c) => {
        const model = stageModel(c);
        const field = { conditions: c, model, libraries, accepted };
        const exhaustive = libraries.map((columns, library) =>
          scoreRows(c, model, columns, accepted[library]),
        );
        const kept = scoreContenders(withBounds(field), 70).map(({ rows }) => new Set(rows));
        const quietest = findQuietest(exhaustive)!;
        const places = exhaustive.flatMap(({ inputNoiseRms }, library) =>
          Array.from(inputNoiseRms, (noise, row) => ({ library, row, noise })),
        );
        const needed = places
          .sort((a, b) => a.noise - b.noise)
          .filter(
            ({ library, row }, place) => place < 70 || isInQuietSet(exhaustive[library], row, quietest),
          );
        expect(needed.filter(({ library, row }) => !kept[library].has(row))).toEqual([]);
        leftOut += places.length - kept[0].size - kept[1].size;
      }),
      { numRuns: 12, seed: 21 },
    );
    expect(leftOut).toBeGreaterThan(20_000);
  });
});

describe('a page of a large library', () => {
  const columns = randomLibrary(5000, 5);
  const random = sequence(9);
  const prices = [
    Float64Array.from({ length: 5000 }, () => (random() < 0.3 ? NaN : Math.round(1e4 * random()))),
  ];
  const whole = { filter: {}, target: {}, prices, limit: 5000, offset: 0 };
  const placesOf = ({ items }: Ranking) => items.map(({ row, quietSet }) => [row, quietSet]);

  it.each(PRICED_RANKING_SORTS)('by %s is what it is where every part is scored', (sort) => {
    fc.assert(
      fc.property(conditions, fc.boolean(), (c, descending) => {
        const query = { ...whole, conditions: c, sort, descending };
        const all = rankAmplifiers(query, [columns]);
        const page = rankAmplifiers({ ...query, limit: 50, offset: 20 }, [columns]);
        expect(placesOf(page)).toEqual(placesOf(all).slice(20, 70));
        expect(page.quietSetTotal).toBe(all.quietSetTotal);
        expect(page.cheapest?.row).toBe(all.cheapest?.row);
        expect(page.frontier.map(({ row }) => row)).toEqual(all.frontier.map(({ row }) => row));
      }),
      { numRuns: 4, seed: 22 },
    );
  });
});
