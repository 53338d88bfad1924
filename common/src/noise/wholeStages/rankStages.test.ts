import { describe, expect, it } from 'vitest';
import { amplifierWith, libraryOf } from '../../../test/support/stages.js';
import { preferredValuesBetween } from '../../parts/index.js';
import { evaluateStage } from '../evaluateStage.js';
import { parallelStage } from '../levers/index.js';
import { findExcluded } from '../ranking/index.js';
import { findNetworks } from './networks.js';
import { unsoughtPieces } from './pieces.js';
import { rankStages } from './rankStages.js';
import { StageCosts } from './stageCosts.js';
import {
  nominalNetwork,
  STAGE_SORTS,
  withNetwork,
  type NetworkResistor,
  type SoughtConditions,
  type SoughtStage,
} from './stageSearch.js';

const base: SoughtConditions = {
  source: { resistance: 200, inductance: 0, capacitance: 0 },
  ambientTemperature: 298.15,
  band: { lower: 20, upper: 20e3, lowPassOrder: 0 },
  stage: {
    topology: 'non-inverting',
    gain: 100,
    gainTolerance: 0.01,
    network: { minimumTotal: 500, maximumTotal: 1e5 },
    parallelMaximum: 1,
  },
  referenceFrequency: 1000,
  bandwidthMargin: 3,
  amplifierTemperatureModel: 'none',
};

const sought = (stage: Partial<SoughtStage>, change: Partial<SoughtConditions> = {}): SoughtConditions => ({
  ...base,
  ...change,
  stage: { ...base.stage, ...stage },
});

const resistors: NetworkResistor[] = [-35, -20, 5].flatMap((noiseIndex, series) =>
  preferredValuesBetween(series === 2 ? 24 : 12, 2.2, 1e6).map((resistance) => ({
    resistance,
    noiseIndex: resistance > 1e5 && series === 0 ? null : noiseIndex,
  })),
);

const amplifiers = [
  amplifierWith({ channels: 4 }),
  amplifierWith({ voltageNoise: 1e-9, currentNoise: 3e-12, channels: 2 }),
  amplifierWith({ voltageNoise: 6e-9, currentNoise: 1e-14, inputType: 'jfet' }),
  amplifierWith({ voltageNoise: 0.9e-9, gainBandwidth: 7e6 }),
  amplifierWith({ voltageNoise: 1.1e-9, gainBandwidth: 8e7, inputCapacitance: 4e-11, channels: 2 }),
];
const library = libraryOf(amplifiers.map((amplifier) => ({ amplifier })));

const NO_PRICES = new StageCosts('non-inverting', undefined).network(1);

const rank = (
  conditions: SoughtConditions,
  among: readonly NetworkResistor[] = resistors,
  limit = 10,
  offset = 0,
) =>
  rankStages({ conditions, filter: {}, sort: 'inputNoiseRms', within: 1, limit, offset }, [library], among);

/** Every amplifier with every network and number of channels, one by one. */
function exhaustive(conditions: SoughtConditions, rows: readonly number[]) {
  const { all } = findNetworks(conditions, resistors, NO_PRICES);
  return rows
    .map((row) => {
      const amplifier = amplifiers[row];
      const counts = Math.min(conditions.stage.parallelMaximum, amplifier.channels);
      const totals = all.flatMap((network) =>
        Array.from({ length: counts }, (_, n) => {
          const one = { conditions: withNetwork(conditions, network), amplifier };
          const several = parallelStage(one, n + 1);
          return evaluateStage(several.conditions, several.amplifier).inputNoiseRms;
        }),
      );
      return { row, inputNoiseRms: Math.min(...totals) };
    })
    .sort((a, b) => a.inputNoiseRms - b.inputNoiseRms);
}

describe('rankStages', () => {
  it.each<[string, SoughtConditions]>([
    ['a resistive source', base],
    [
      'a direct output voltage',
      sought(
        { outputVoltage: 5, gain: 20 },
        { band: { lower: 0.1, upper: 100, lowPassOrder: 2 }, referenceFrequency: 10 },
      ),
    ],
    ['channels in parallel', sought({ parallelMaximum: 8, gain: 10 })],
    [
      'a high source resistance and a wide window',
      sought(
        { gain: 5, gainTolerance: 0.1 },
        { source: { resistance: 1e5, inductance: 0, capacitance: 1e-11 } },
      ),
    ],
    [
      'a coil with a capacitance',
      sought({ gain: 50 }, { source: { resistance: 300, inductance: 0.05, capacitance: 5e-9 } }),
    ],
    ['an inverting stage', sought({ topology: 'inverting', gain: 10 })],
    ['an inverting stage of gain 1', sought({ topology: 'inverting', gain: 1 })],
    ['a difference stage', sought({ topology: 'difference', gain: 10, outputVoltage: 2 })],
    ['a difference stage of gain 1', sought({ topology: 'difference', gain: 1 })],
    [
      'an instrumentation stage',
      sought({ topology: 'instrumentation', gain: 21, differenceResistance: 2000, outputVoltage: 2 }),
    ],
    [
      'an inverting stage with a reactive source',
      sought(
        { topology: 'inverting', gain: 10 },
        { source: { resistance: 100, inductance: 0.01, capacitance: 1e-9 } },
      ),
    ],
    [
      'a transimpedance stage',
      sought(
        {
          topology: 'transimpedance',
          gain: undefined,
          feedbackResistance: 1e5,
          gainTolerance: 0.3,
          feedbackCapacitance: 'auto',
          network: { minimumTotal: 500, maximumTotal: 1e9 },
        },
        { source: { resistance: 1e8, inductance: 0, capacitance: 1e-11 } },
      ),
    ],
  ])('finds what trying every network finds, for %s', (_, conditions) => {
    const ranking = rank(conditions);
    const nominal = withNetwork(conditions, nominalNetwork(conditions));
    const page = { limit: amplifiers.length, offset: 0 };
    const { items } = findExcluded({ conditions: nominal, filter: {} }, [library], page);
    const excluded = new Set(items.map(({ row }) => row));
    expect(ranking.excluded.total).toBe(excluded.size);
    const expected = exhaustive(
      conditions,
      amplifiers.map((_, row) => row).filter((row) => !excluded.has(row)),
    );
    expect(ranking.items.map(({ row }) => row)).toEqual(expected.map(({ row }) => row));
    ranking.items.forEach(({ figures }, n) => {
      expect(figures.inputNoiseRms / expected[n].inputNoiseRms).toBeCloseTo(1, 9);
    });
    expect(ranking.items.length).toBeGreaterThan(2);
    expect(ranking.total).toBe(ranking.items.length);
  });

  it('gives pages that join', () => {
    const page = (offset: number, limit: number) => rank(base, resistors, limit, offset).items;
    expect([...page(0, 2), ...page(2, 10)]).toEqual(page(0, 10));
  });

  it('looks at few of the networks of a large library', () => {
    const many = preferredValuesBetween(192, 1, 1e6).map((resistance) => ({ resistance, noiseIndex: -30 }));
    const { evaluations, pairs } = rank(base, many, 3);
    expect(pairs).toBeGreaterThan(500);
    expect(evaluations.made).toBeLessThan(evaluations.exhaustive / 10);
  });

  it('says the nearest gain where no pair gives the wanted one', () => {
    const few = [
      { resistance: 100, noiseIndex: null },
      { resistance: 4700, noiseIndex: null },
    ];
    const ranking = rank(base, few);
    expect(ranking).toMatchObject({ total: 0, items: [], pairs: 0, nearestGain: 48 });
    const none = rank(base, []);
    expect(none).toMatchObject({ total: 0, items: [], nearestGain: null });
  });

  it('ranks a follower without a network', () => {
    const conditions = sought({ gain: 1 });
    const { items } = rank(conditions, []);
    expect(items[0].network).toMatchObject({ gain: 1, gainResistor: null, feedbackResistor: null });
  });

  it('finds pairs that give the gain with the source in series, or doubled around a pair of inputs', () => {
    const two = [
      { resistance: 900, noiseIndex: null },
      { resistance: 5000, noiseIndex: null },
    ];
    const gainOf = (stage: Partial<SoughtStage>) => findNetworks(sought(stage), two, NO_PRICES).all[0]?.gain;
    // The source has 200 Ω.
    expect(gainOf({ topology: 'difference', gain: 5 })).toBe(5);
    expect(gainOf({ topology: 'instrumentation', gain: 12, gainTolerance: 0.02 })).toBeCloseTo(1 + 1e4 / 900);
  });

  it('ranks the followers of an instrumentation stage without a network', () => {
    const conditions = sought({ topology: 'instrumentation', gain: 1 });
    const { items } = rank(conditions, []);
    expect(items[0].network).toMatchObject({ gain: 1, gainResistor: null, feedbackResistor: null });
    expect(items[0].figures.signalGain).toBeCloseTo(1, 3);
  });

  it('takes no resistor of unknown noise index where a direct voltage drives excess noise', () => {
    const conditions = sought({ outputVoltage: 5, network: { minimumTotal: 1.5e5, maximumTotal: 1e6 } });
    const { items } = rank(conditions);
    for (const { network } of items) {
      expect(resistors[network.feedbackResistor!].noiseIndex).not.toBeNull();
      expect(network.feedbackNoiseIndex).toBe(-20);
    }
  });

  it('answers an empty library with an empty ranking', () => {
    const search = { conditions: base, filter: {}, within: 1, limit: 5, offset: 0 };
    for (const sort of STAGE_SORTS)
      expect(rankStages({ ...search, sort }, [], resistors)).toMatchObject({
        total: 0,
        items: [],
        frontier: [],
      });
  });
});

describe('what a stage takes besides what is sought', () => {
  const told = (stage: Partial<SoughtStage>, channels = 1) =>
    unsoughtPieces(sought(stage).stage, channels).map(({ place, pieces, value }) => [place, pieces, value]);

  it('is nothing where op-amp and network are the whole stage', () => {
    for (const topology of ['non-inverting', 'inverting', 'difference', 'transimpedance'] as const)
      expect(told({ topology, biasResistance: 0, feedbackCapacitance: 0 })).toEqual([]);
  });

  it('is each stated resistor, and each that the stage can’t do without', () => {
    expect(told({ loadResistance: 47e3 }, 2)).toEqual([
      ['load', 1, 47e3],
      ['averaging', 2, null],
    ]);
    expect(told({ topology: 'inverting', biasResistance: 1000 })).toEqual([['bias', 1, 1000]]);
    expect(told({ topology: 'instrumentation', loadResistance: 1e6 })).toEqual([
      ['load', 2, 1e6],
      ['difference', 4, 10e3],
    ]);
    expect(told({ topology: 'transimpedance', feedbackCapacitance: 'auto' })).toEqual([
      ['feedback-capacitor', 1, null],
    ]);
  });
});
