import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amplifierWith, libraryOf } from '../../../test/support/stages.js';
import { evaluateStage } from '../evaluateStage.js';
import { parallelStage } from '../levers/index.js';
import { networkPieces, opAmpPieces } from './pieces.js';
import { rankStages, type WholeStage } from './rankStages.js';
import type { StagePrices } from './stageCosts.js';
import { withNetwork, type SoughtConditions, type SoughtStage } from './stageSearch.js';

const sought = (stage: Partial<SoughtStage>): SoughtConditions => ({
  source: { resistance: 300, inductance: 0, capacitance: 0 },
  ambientTemperature: 298.15,
  band: { lower: 1, upper: 10e3, lowPassOrder: 0 },
  stage: {
    topology: 'non-inverting',
    gain: 2,
    gainTolerance: 0.2,
    network: { minimumTotal: 500, maximumTotal: 1e5 },
    parallelMaximum: 1,
    ...stage,
  },
  referenceFrequency: 1000,
  bandwidthMargin: 0,
  amplifierTemperatureModel: 'none',
});

const SEARCHES: Record<string, SoughtConditions> = {
  'a non-inverting stage': sought({ gain: 5 }),
  'pairs that may be of one part': sought({}),
  'channels in parallel': sought({ parallelMaximum: 4 }),
  'a direct output voltage': sought({ outputVoltage: 5 }),
  'a direct output voltage and channels in parallel': sought({
    gain: 5,
    outputVoltage: 5,
    parallelMaximum: 4,
  }),
  'an inverting stage': sought({ topology: 'inverting', gain: 1, gainTolerance: 0.19 }),
  'a difference stage': sought({ topology: 'difference', gain: 3, outputVoltage: 3 }),
  'an instrumentation stage': sought({ topology: 'instrumentation', gain: 3, outputVoltage: 2 }),
  'a transimpedance stage': sought({
    topology: 'transimpedance',
    gain: undefined,
    feedbackResistance: 4700,
    outputVoltage: 1,
  }),
  'a follower': sought({ gain: 1 }),
};

/** A price, as MOQ and price make it: more pieces may have to be bought than are needed. */
const priceRule = fc.option(fc.record({ unit: fc.nat(30), least: fc.constantFrom(1, 1, 5, 20) }), {
  freq: 4,
  nil: null,
});

const libraries = fc.record({
  amplifiers: fc.array(
    fc.record({
      voltageNoise: fc.constantFrom(1e-9, 2e-9, 4e-9, 8e-9),
      currentNoise: fc.constantFrom(1e-13, 3e-12),
      gainBandwidth: fc.constantFrom(2e6, 1e8, null),
      channels: fc.constantFrom(1, 2, 4),
      price: priceRule,
    }),
    { minLength: 1, maxLength: 4 },
  ),
  resistors: fc.array(
    fc.record({
      resistance: fc.constantFrom(470, 1000, 1200, 2200, 2400, 4700, 5100),
      noiseIndex: fc.option(fc.constantFrom(-30, -10, 10), { freq: 5, nil: null }),
      price: priceRule,
    }),
    { minLength: 1, maxLength: 30 },
  ),
  quantity: fc.constantFrom(1, 3, 10),
  within: fc.constantFrom(0, 0.5, 3, 30),
});

type Case = typeof libraries extends fc.Arbitrary<infer Value> ? Value : never;
type PriceRule = Case['amplifiers'][number]['price'];

const cost = (rule: PriceRule, pieces: number) =>
  rule === null ? NaN : rule.unit * Math.max(rule.least, pieces);

function pricesOf({ amplifiers, resistors, quantity }: Case): StagePrices {
  return {
    quantity,
    opAmp: ({ row }, pieces) => cost(amplifiers[row].price, pieces),
    resistor: (index, pieces) => cost(resistors[index].price, pieces),
  };
}

const amplifiersOf = ({ amplifiers }: Case) =>
  amplifiers.map(({ price: _price, ...one }) => amplifierWith(one));

function rank(library: Case, conditions: SoughtConditions, sort: 'inputNoiseRms' | 'unitPrice') {
  const { resistors, within } = library;
  const page = { filter: {}, within, limit: 50, offset: 0 };
  const columns = libraryOf(amplifiersOf(library).map((amplifier) => ({ amplifier })));
  return rankStages({ ...page, conditions, sort, prices: pricesOf(library) }, [columns], resistors);
}

interface Stage {
  row: number;
  noise: number;
  price: number;
}

const R_F_ALONE = -1;

/** Every op-amp with every number of channels and every pair of single resistors, one by one. */
function allStages(library: Case, conditions: SoughtConditions): Stage[] {
  const { stage } = conditions;
  const amplifiers = amplifiersOf(library);
  const pairs = pairsOf(library, conditions);
  return amplifiers.flatMap((amplifier, row) =>
    Array.from({ length: Math.min(stage.parallelMaximum, amplifier.channels) }, (_, n) => n + 1).flatMap(
      (count) =>
        pairs.map(([gainResistor, feedbackResistor]) => {
          const network = networkOf(library, conditions, gainResistor, feedbackResistor);
          const several = parallelStage({ conditions: withNetwork(conditions, network), amplifier }, count);
          return {
            row,
            noise: evaluateStage(several.conditions, several.amplifier).inputNoiseRms,
            price: priceOf(library, conditions, row, count, [gainResistor, feedbackResistor]),
          };
        }),
    ),
  );
}

function pairsOf(library: Case, conditions: SoughtConditions): [number, number][] {
  const { stage } = conditions;
  const usable = [...library.resistors.keys()].filter(
    (index) => !stage.outputVoltage || library.resistors[index].noiseIndex !== null,
  );
  if (stage.gain === 1 && stage.topology === 'non-inverting') return [[R_F_ALONE, R_F_ALONE]];
  const firsts = stage.topology === 'transimpedance' ? [R_F_ALONE] : usable;
  const wanted = (stage.topology === 'transimpedance' ? stage.feedbackResistance : stage.gain)!;
  return firsts
    .flatMap((gain) => usable.map((feedback): [number, number] => [gain, feedback]))
    .filter(([gain, feedback]) => {
      const network = networkOf(library, conditions, gain, feedback);
      const { minimumTotal, maximumTotal } = stage.network;
      const total = totalOf(conditions, network);
      const isNear = Math.abs(network.gain / wanted - 1) <= stage.gainTolerance + 1e-12;
      return isNear && total >= minimumTotal && total <= maximumTotal;
    });
}

function networkOf(
  { resistors }: Case,
  { stage, source }: SoughtConditions,
  gainResistor: number,
  feedbackResistor: number,
) {
  const gainResistance = resistors[gainResistor]?.resistance ?? 0;
  const feedbackResistance = resistors[feedbackResistor]?.resistance ?? 0;
  const gain = {
    'non-inverting': 1 + (gainResistance && feedbackResistance / gainResistance),
    inverting: feedbackResistance / (source.resistance + gainResistance),
    difference: feedbackResistance / (source.resistance / 2 + gainResistance),
    instrumentation: 1 + (2 * feedbackResistance) / gainResistance,
    transimpedance: feedbackResistance,
  }[stage.topology];
  const excess = stage.outputVoltage && {
    gainNoiseIndex: resistors[gainResistor]?.noiseIndex ?? undefined,
    feedbackNoiseIndex: resistors[feedbackResistor].noiseIndex!,
  };
  return { gain, gainResistor, feedbackResistor, gainResistance, feedbackResistance, ...excess };
}

function totalOf({ stage: { topology } }: SoughtConditions, network: ReturnType<typeof networkOf>) {
  const share = { 'non-inverting': 1, instrumentation: 0.5 }[topology as 'instrumentation'] ?? 0;
  return network.feedbackResistance + share * network.gainResistance;
}

function priceOf(
  library: Case,
  { stage: { topology } }: SoughtConditions,
  row: number,
  count: number,
  resistors: [number, number],
): number {
  const prices = pricesOf(library);
  const { quantity } = prices;
  const pieces = Object.values(networkPieces(topology, count));
  const needed = new Map<number, number>();
  resistors.forEach((index, place) => {
    if (index !== R_F_ALONE) needed.set(index, (needed.get(index) ?? 0) + quantity * pieces[place]);
  });
  const ofNetwork = [...needed].map(([index, all]) => prices.resistor(index, all));
  const devices = opAmpPieces(topology, library.amplifiers[row].channels);
  const whole = ofNetwork.reduce(
    (sum, one) => sum + one,
    prices.opAmp({ library: 0, row }, devices * quantity),
  );
  return Number.isNaN(whole) ? Infinity : whole;
}

const byNoise = (a: Stage, b: Stage) =>
  near(a.noise, b.noise) ? compare(a.price, b.price) : a.noise - b.noise;
const byPrice = (a: Stage, b: Stage) =>
  compare(a.price, b.price) || (near(a.noise, b.noise) ? 0 : a.noise - b.noise);
const near = (a: number, b: number) => Math.abs(a / b - 1) < 1e-9;
const compare = (a: number, b: number) => (a === b ? 0 : a < b ? -1 : 1);

/** The first stage of each op-amp in an order. */
function firstOfEach(stages: Stage[], order: typeof byNoise): Stage[] {
  const sorted = stages.toSorted(order);
  return sorted.filter(({ row }, place) => sorted.findIndex((stage) => stage.row === row) === place);
}

function frontierOf(stages: Stage[]): Stage[] {
  return stages
    .filter(({ price }) => Number.isFinite(price))
    .toSorted(byNoise)
    .reduce<Stage[]>(
      (kept, stage) => (stage.price < (kept.at(-1)?.price ?? Infinity) ? [...kept, stage] : kept),
      [],
    );
}

const figures = (stages: Stage[]) => stages.map(({ noise, price }) => [noise.toExponential(8), price]);
const figuresOf = (stages: readonly WholeStage[]) =>
  stages.map((stage) => [stage.figures.inputNoiseRms.toExponential(8), stage.price ?? Infinity]);

describe.each(Object.entries(SEARCHES))('whole stages with prices, for %s', (_, conditions) => {
  it('are what trying every stage finds: quietest, cheapest and frontier', () => {
    let onFrontiers = 0;
    fc.assert(
      fc.property(libraries, (library) => {
        const stages = allStages(library, conditions);
        const quietest = rank(library, conditions, 'inputNoiseRms');
        expect(figuresOf(quietest.items)).toEqual(figures(firstOfEach(stages, byNoise)));
        expect(figuresOf(quietest.frontier)).toEqual(figures(frontierOf(stages)));
        onFrontiers += quietest.frontier.length;
        const limit =
          Math.min(...stages.map(({ noise }) => noise)) * 10 ** (library.within / 20) * (1 + 1e-9);
        const cheapest = rank(library, conditions, 'unitPrice');
        const expected = firstOfEach(
          stages.filter(({ noise }) => noise <= limit),
          byPrice,
        );
        expect(figuresOf(cheapest.items)).toEqual(figures(expected));
        expect(cheapest.total).toBe(expected.length);
        expect(figuresOf(cheapest.frontier)).toEqual(figures(frontierOf(stages)));
      }),
      { numRuns: 40, seed: 3 },
    );
    expect(onFrontiers).toBeGreaterThan(10);
  });
});
