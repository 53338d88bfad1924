import { describe, expect, it } from 'vitest';
import { amplifierWith, libraryOf } from '../../../test/support/stages.js';
import { stageNoise } from '../evaluateStage.js';
import { parallelStage } from '../levers/index.js';
import { findNetworks } from './networks.js';
import { rankStages, type WholeStage } from './rankStages.js';
import { StageCosts } from './stageCosts.js';
import { withNetwork, type SoughtConditions, type SoughtStage } from './stageSearch.js';

const COUNT = 1100;

/** Even in the logarithm, each parameter in a stride of its own. */
const spread = (row: number, stride: number, from: number, to: number) =>
  from * (to / from) ** (((row * stride) % COUNT) / COUNT);

const amplifiers = Array.from({ length: COUNT }, (_, row) =>
  amplifierWith({
    voltageNoise: spread(row, 7, 1e-9, 6e-8),
    currentNoise: row % 17 === 0 ? null : spread(row, 13, 1e-16, 5e-12),
    gainBandwidth: row % 23 === 0 ? null : spread(row, 29, 1e6, 1e9),
    inputCapacitance: spread(row, 37, 1e-12, 3e-11),
    channels: 1 + (row % 2),
  }),
);
const library = libraryOf(amplifiers.map((amplifier) => ({ amplifier })));
const resistors = [100, 220, 1000, 1100, 2200, 10e3, 11e3].map((resistance) => ({
  resistance,
  noiseIndex: null,
}));
const prices = {
  quantity: 10,
  opAmp: ({ row }: { row: number }, pieces: number) =>
    row % 10 === 9 ? NaN : (50 + ((row * 7919) % 800)) * pieces,
  resistor: (index: number, pieces: number) => (3 + ((index * 5) % 7)) * pieces,
};

const sought = (
  stage: Partial<SoughtStage>,
  source: Partial<SoughtConditions['source']> = {},
): SoughtConditions => ({
  source: { resistance: 300, inductance: 0, capacitance: 0, ...source },
  ambientTemperature: 298.15,
  band: { lower: 10, upper: 20e3, lowPassOrder: 0 },
  stage: {
    topology: 'non-inverting',
    gain: 10,
    gainTolerance: 0.2,
    network: { minimumTotal: 500, maximumTotal: 1e5 },
    parallelMaximum: 1,
    ...stage,
  },
  referenceFrequency: 1000,
  bandwidthMargin: 0,
  amplifierTemperatureModel: 'none',
});

interface Stage {
  row: number;
  noise: number;
  price: number;
}

function everyStage(conditions: SoughtConditions): Stage[] {
  const { topology, parallelMaximum } = conditions.stage;
  const costs = new StageCosts(topology, prices);
  return amplifiers.flatMap((amplifier, row) =>
    Array.from({ length: Math.min(parallelMaximum, amplifier.channels) }, (_, n) => n + 1).flatMap((count) =>
      findNetworks(conditions, resistors, costs.network(count)).all.map((network) => {
        const several = parallelStage({ conditions: withNetwork(conditions, network), amplifier }, count);
        const price = costs.opAmp({ library: 0, row }, amplifier.channels) + network.price;
        return { row, noise: stageNoise(several.conditions, several.amplifier), price };
      }),
    ),
  );
}

const byNoise = (a: Stage, b: Stage) => a.noise - b.noise || a.price - b.price;
const byPrice = (a: Stage, b: Stage) => (a.price === b.price ? a.noise - b.noise : a.price - b.price);

function firstOfEach(stages: Stage[]): Stage[] {
  const taken = new Set<number>();
  return stages.filter(({ row }) => !taken.has(row) && taken.add(row));
}

function frontierOf(stages: Stage[]): Stage[] {
  let cheapest = Infinity;
  return stages.toSorted(byNoise).filter(({ price }) => {
    if (price >= cheapest) return false;
    cheapest = price;
    return true;
  });
}

const told = (stages: readonly Stage[]) => stages.map(({ row, noise }) => [row, noise.toExponential(9)]);
const toldOf = (stages: readonly WholeStage[]) =>
  stages.map(({ row, figures }) => [row, figures.inputNoiseRms.toExponential(9)]);

describe('a search among so many op-amps that they are bounded all at once', () => {
  it.each<[string, SoughtConditions]>([
    ['non-inverting stages with channels in parallel', sought({ parallelMaximum: 2 })],
    ['inverting stages', sought({ topology: 'inverting' })],
    ['inverting stages on a capacitive source', sought({ topology: 'inverting' }, { capacitance: 2e-8 })],
    ['transimpedance stages', sought({ topology: 'transimpedance', feedbackResistance: 1e4 })],
  ])('finds what trying every stage finds, for %s', (_, conditions) => {
    const stages = everyStage(conditions);
    const page = { conditions, filter: {}, prices, limit: 20, offset: 15 };
    const quietest = rankStages({ ...page, sort: 'inputNoiseRms', within: 1 }, [library], resistors);
    const inOrder = firstOfEach(stages.toSorted(byNoise));
    expect(toldOf(quietest.items)).toEqual(told(inOrder.slice(15, 35)));
    expect(toldOf(quietest.frontier)).toEqual(told(frontierOf(stages)));
    expect(quietest.total).toBe(COUNT);
    expect(quietest.evaluations.made).toBeLessThan(stages.length / 2);
    for (const within of [1, 12]) {
      const most = inOrder[0].noise * 10 ** (within / 20);
      const cheapest = rankStages({ ...page, sort: 'unitPrice', within }, [library], resistors);
      const expected = firstOfEach(stages.filter(({ noise }) => noise <= most).toSorted(byPrice));
      expect(cheapest.total).toBe(expected.length);
      expect(toldOf(cheapest.items)).toEqual(told(expected.slice(15, 35)));
    }
  });
});
