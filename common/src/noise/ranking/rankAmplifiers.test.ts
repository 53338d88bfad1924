import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith, libraryOf } from '../../../test/support/stages.js';
import type { Amplifier } from '../../parts/index.js';
import { rankAmplifiers, type RankingQuery } from './rankAmplifiers.js';

const rank = (libraries: Partial<Amplifier>[][], query: Partial<RankingQuery> = {}) =>
  rankAmplifiers(
    {
      conditions: conditionsWith(),
      filter: {},
      target: {},
      sort: 'inputNoiseRms',
      descending: false,
      limit: 100,
      offset: 0,
      ...query,
    },
    libraries.map((parts) => libraryOf(parts.map((changes) => ({ amplifier: amplifierWith(changes) })))),
  );
const places = ({ items }: ReturnType<typeof rank>) => items.map(({ library, row }) => [library, row]);

describe('rankAmplifiers', () => {
  it('puts the quietest part first, whichever library it stands in', () => {
    const ranking = rank([[{ voltageNoise: 9e-9 }, { voltageNoise: 2e-9 }], [{ voltageNoise: 5e-9 }]]);
    expect(places(ranking)).toEqual([
      [0, 1],
      [1, 0],
      [0, 0],
    ]);
    expect(ranking.items.map(({ rank: place }) => place)).toEqual([1, 2, 3]);
    expect(ranking.total).toBe(3);
  });

  it('leaves parts with equal figures in the order of the libraries, upwards and downwards', () => {
    const libraries = [
      [{}, { voltageNoise: 1e-9 }, {}],
      [{}, {}],
    ];
    expect(places(rank(libraries))).toEqual([
      [0, 1],
      [0, 0],
      [0, 2],
      [1, 0],
      [1, 1],
    ]);
    expect(places(rank(libraries, { descending: true }))).toEqual([
      [0, 0],
      [0, 2],
      [1, 0],
      [1, 1],
      [0, 1],
    ]);
  });

  it('puts parts without the figure last, upwards and downwards', () => {
    const parts = [[{ gainBandwidth: null }, { gainBandwidth: 1e9 }, { gainBandwidth: 1e7 }]];
    const sort = 'closedLoopBandwidth';
    expect(places(rank(parts, { sort }))).toEqual([
      [0, 2],
      [0, 1],
      [0, 0],
    ]);
    expect(places(rank(parts, { sort, descending: true }))).toEqual([
      [0, 1],
      [0, 2],
      [0, 0],
    ]);
  });

  describe('with prices', () => {
    const parts = [
      [{ voltageNoise: 1e-9 }, { voltageNoise: 1.01e-9 }, { voltageNoise: 9e-9 }],
      [{ voltageNoise: 1.02e-9 }, { voltageNoise: 1.01e-9 }],
    ];
    const prices = [Float64Array.of(8, NaN, 0.5), Float64Array.of(2, 2)];

    it('sorts by price, with parts that have none last, upwards and downwards', () => {
      const sorted = (descending: boolean) => places(rank(parts, { sort: 'unitPrice', descending, prices }));
      const [first, second, third, without] = [
        [0, 2],
        [1, 0],
        [1, 1],
        [0, 0],
      ];
      expect(sorted(false)).toEqual([first, second, third, without, [0, 1]]);
      expect(sorted(true)).toEqual([without, second, third, first, [0, 1]]);
    });

    it('names the cheapest part of the quiet set and how far it lies above the quietest', () => {
      const { cheapest, items } = rank(parts, { prices });
      expect(cheapest).toMatchObject({ library: 1, row: 1 });
      const total = items.find(({ library, row }) => library === 1 && row === 1)!.figures.inputNoiseRms;
      const inDecibels = 20 * Math.log10(total / items[0].figures.inputNoiseRms);
      expect(cheapest!.aboveQuietest).toBeCloseTo(inDecibels, 12);
      expect(inDecibels).toBeGreaterThan(0);
    });

    it('names none where no part of the quiet set has a price', () => {
      expect(rank(parts).cheapest).toBeNull();
      const onlyLoud = [Float64Array.of(NaN, NaN, 0.5), Float64Array.of(NaN, NaN)];
      expect(rank(parts, { prices: onlyLoud }).cheapest).toBeNull();
    });

    it('leaves the order alone where nothing has a price', () => {
      expect(places(rank(parts, { sort: 'unitPrice' }))).toEqual([
        [0, 0],
        [0, 1],
        [0, 2],
        [1, 0],
        [1, 1],
      ]);
    });
  });

  it('says which parts meet the target', () => {
    const libraries = [[{ voltageNoise: 1e-9 }, { voltageNoise: 20e-9 }]];
    const meets = (target: RankingQuery['target']) =>
      rank(libraries, { target }).items.map(({ meetsTarget }) => meetsTarget);
    expect(meets({ inputNoiseRms: 1e-6 })).toEqual([true, false]);
    expect(meets({})).toEqual([null, null]);
  });

  it('ranks nothing where every part is excluded, and still states the source floor', () => {
    const ranking = rank([[{ gainBandwidth: 10 }], []]);
    expect(ranking).toMatchObject({ total: 0, items: [], quietSetTotal: 0 });
    expect(ranking.excluded).toEqual({ total: 1, reasons: [{ reason: 'too-slow', count: 1 }] });
    expect(ranking.floor.inputNoiseDensity).toBeCloseTo(4.002e-9, 12);
  });

  it('gives an empty page beyond the last part', () => {
    expect(rank([[{}, {}]], { offset: 2 })).toMatchObject({ total: 2, items: [] });
  });
});
