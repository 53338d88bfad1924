import { describe, expect, it } from 'vitest';
import { randomLibrary, sequence } from '../../../test/support/randomLibrary.js';
import { conditionsWith } from '../../../test/support/stages.js';
import { stageModel } from '../stage/stageModel.js';
import { scoreContenders } from './contenders.js';
import { withBounds } from './entrants.js';
import { findFrontier } from './frontier.js';
import { scoreRows } from './scores.js';

const CONDITIONS = {
  'a resistive source': conditionsWith({ stage: { gain: 100, gainResistance: 10 }, bandwidthMargin: 0 }),
  'a coil before an inverting stage, where notches forbid bounds': conditionsWith({
    source: { resistance: 200, inductance: 0.05 },
    stage: { topology: 'inverting', gain: 10, gainResistance: 1000 },
    bandwidthMargin: 0,
  }),
};

function pricesOf(count: number, seed: number): Float64Array {
  const random = sequence(seed);
  return Float64Array.from({ length: count }, () =>
    random() < 0.2 ? NaN : Math.round(3000 * 100 ** random()),
  );
}

describe('findFrontier', () => {
  it.each(
    Object.entries(CONDITIONS).flatMap(([name, conditions]) =>
      [200, 6000].map((count) => ({ name, count, conditions })),
    ),
  )(
    'holds just the parts that none beats in noise and price, of $count at $name',
    ({ count, conditions }) => {
      const libraries = [randomLibrary(count, 3), randomLibrary(50, 4)];
      const prices = [pricesOf(count, 5), pricesOf(50, 6)];
      const accepted = libraries.map((columns) =>
        Uint32Array.from({ length: columns.count }, (_, row) => row),
      );
      const model = stageModel(conditions);
      const all = libraries.flatMap((columns, library) => {
        const { inputNoiseRms } = scoreRows(conditions, model, columns, accepted[library]);
        return Array.from(inputNoiseRms, (noise, row) => ({
          library,
          row,
          noise,
          price: prices[library][row],
        }));
      });
      const priced = all.filter(({ price }) => !Number.isNaN(price));
      const expected = priced
        .sort((a, b) => a.noise - b.noise || a.price - b.price)
        .filter(({ price }, place, sorted) =>
          sorted.slice(0, place).every((quieter) => quieter.price > price),
        );
      const entrants = withBounds({ conditions, model, libraries, accepted });
      const frontier = findFrontier(entrants, scoreContenders(entrants, 1), prices);
      expect(frontier.map(({ library, row, price }) => [library, row, price])).toEqual(
        expected.map(({ library, row, price }) => [library, row, price]),
      );
      frontier.forEach(({ inputNoiseRms }, n) => expect(inputNoiseRms / expected[n].noise).toBeCloseTo(1, 5));
      expect(frontier.length).toBeGreaterThan(3);
    },
  );

  it('is empty where nothing has a price', () => {
    const conditions = CONDITIONS['a resistive source'];
    const libraries = [randomLibrary(20, 7)];
    const accepted = [Uint32Array.from({ length: 20 }, (_, row) => row)];
    const entrants = withBounds({ conditions, model: stageModel(conditions), libraries, accepted });
    expect(findFrontier(entrants, scoreContenders(entrants, 1))).toEqual([]);
  });
});
