import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { randomLibrary } from '../../../test/support/randomLibrary.js';
import { checkConditions, type OperatingConditions } from '../../conditions/index.js';
import { stageModel } from '../stage/stageModel.js';
import { findContenders } from './contenders.js';
import { leastNoise } from './leastNoise.js';
import { rankAmplifiers } from './rankAmplifiers.js';
import { scoreRows } from './scores.js';
import { findQuietest, isInQuietSet } from './quietSet.js';

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
  const columns = randomLibrary(250, 3);
  const rows = Uint32Array.from({ length: columns.count }, (_, row) => row);

  it('is never above the total, for any conditions in which no notch can be tuned', () => {
    fc.assert(
      fc.property(conditions, (c) => {
        const model = stageModel(c);
        fc.pre(!model.canNotch);
        const { total, fixed } = leastNoise(c, model, columns, rows);
        const { inputNoiseRms } = scoreRows(c, model, columns, rows);
        for (const row of rows) {
          expect(total[row]).toBeLessThan(inputNoiseRms[row]);
          expect(fixed[row]).toBeLessThanOrEqual(total[row]);
        }
      }),
      { numRuns: 80, seed: 20 },
    );
  });
});

describe('findContenders', () => {
  const columns = randomLibrary(5000, 5);
  const all = Uint32Array.from({ length: columns.count }, (_, row) => row);
  const page = {
    filter: {},
    target: {},
    sort: 'inputNoiseRms',
    descending: false,
    limit: 50,
    offset: 20,
  } as const;

  it('leaves out neither a part of the page nor one of the quiet set', () => {
    let leftOut = 0;
    fc.assert(
      fc.property(conditions, (c) => {
        const model = stageModel(c);
        const exhaustive = scoreRows(c, model, columns, all);
        const order = [...all].sort(
          (a, b) => exhaustive.inputNoiseRms[a] - exhaustive.inputNoiseRms[b] || a - b,
        );
        const [contenders] = findContenders(c, model, [columns], [all], 70);
        const kept = new Set(contenders);
        const quietest = findQuietest([exhaustive])!;
        for (const row of order.slice(0, 70)) expect(kept).toContain(row);
        for (const row of all) if (isInQuietSet(exhaustive, row, quietest)) expect(kept).toContain(row);
        leftOut += all.length - contenders.length;
        const ranking = rankAmplifiers({ ...page, conditions: c }, [columns]);
        fc.pre(ranking.excluded.length === 0);
        expect(ranking.total).toBe(columns.count);
        expect(ranking.items.map(({ row }) => row)).toEqual(order.slice(20, 70));
      }),
      { numRuns: 8, seed: 21 },
    );
    expect(leftOut).toBeGreaterThan(5000);
  });
});
