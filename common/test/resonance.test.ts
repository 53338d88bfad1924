import { describe, expect, it } from 'vitest';
import type { OperatingConditions, StageConditions } from '../src/conditions/index.js';
import { CONTRIBUTORS, evaluateStage, rankAmplifiers } from '../src/noise/index.js';
import { bruteForce } from './support/bruteForce.js';
import type { KnownAmplifier } from './support/nodalAnalysis.js';
import { amplifierWith, conditionsWith, libraryOf } from './support/stages.js';

const IDEAL: KnownAmplifier = {
  voltageNoise: 3e-9,
  voltageNoiseCorner: 20,
  currentNoise: 1e-12,
  currentNoiseCorner: 200,
  gainBandwidth: null,
  inputCapacitance: 0,
};
const REAL: KnownAmplifier = { ...IDEAL, gainBandwidth: 20e6, inputCapacitance: 12e-12 };

const QUALITIES = [50, 300, 2000];
const ORDERS = [0, 1, 4];

/** A coil of 100 mH that resonates with its capacitance and the amplifier's at a frequency. */
function coil(quality: number, frequency: number, inputCapacitance: number) {
  const inductance = 0.1;
  const angular = 2 * Math.PI * frequency;
  return {
    resistance: (angular * inductance) / quality,
    inductance,
    capacitance: 1 / (angular * angular * inductance) - inputCapacitance,
  };
}

function expectExact(conditions: OperatingConditions, amplifier: KnownAmplifier): void {
  const own = evaluateStage(conditions, amplifier);
  const exact = bruteForce(conditions, amplifier);
  expect(Math.abs(own.outputNoiseRms / exact.outputNoiseRms - 1)).toBeLessThan(1e-3);
  expect(Math.abs(own.inputNoiseRms / exact.inputNoiseRms - 1)).toBeLessThan(1e-3);
  for (const contributor of CONTRIBUTORS) {
    const difference = own.contributions[contributor] - exact.contributions[contributor];
    expect(Math.abs(difference), contributor).toBeLessThan(1e-3 * exact.contributions[contributor] + 1e-30);
  }
}

const shapes = QUALITIES.flatMap((quality) => ORDERS.map((lowPassOrder) => [quality, lowPassOrder] as const));

describe('a resonance is integrated within 0.1 %', () => {
  describe.each([
    ['an ideal amplifier', IDEAL],
    ['gain–bandwidth product and input capacitance', REAL],
  ])('with %s', (_name, amplifier) => {
    it.each(shapes)(
      'of an undamped coil with Q %i through a low-pass of order %i',
      (quality, lowPassOrder) => {
        expectExact(
          conditionsWith({
            source: coil(quality, 5000, amplifier.inputCapacitance),
            stage: { gain: 100, gainResistance: 10 },
            band: { lowPassOrder },
          }),
          amplifier,
        );
      },
    );

    it.each(shapes)('of an inverting stage on a coil with Q %i, order %i', (quality, lowPassOrder) => {
      expectExact(
        conditionsWith({
          source: coil(quality, 5000, 0),
          stage: { topology: 'inverting', gain: 20, gainResistance: 50e3, biasResistance: 1000 },
          band: { lowPassOrder },
        }),
        amplifier,
      );
    });

    // As measured between both legs, with half the capacitance of two inputs in series.
    it.each(shapes)('of an instrumentation stage on a coil with Q %i, order %i', (quality, lowPassOrder) => {
      expectExact(
        conditionsWith({
          source: coil(quality, 5000, amplifier.inputCapacitance / 2),
          stage: { topology: 'instrumentation', gain: 20, gainResistance: 100 },
          band: { lowPassOrder },
        }),
        amplifier,
      );
    });

    it.each(shapes)('of a difference stage on a coil with Q %i, order %i', (quality, lowPassOrder) => {
      expectExact(
        conditionsWith({
          source: coil(quality, 5000, 0),
          stage: { topology: 'difference', gain: 20, gainResistance: 50e3 },
          band: { lowPassOrder },
        }),
        amplifier,
      );
    });
  });

  // Q of a loop with the noise gain G + jωC_in·R is √(2π·GBW·C_in·R)/G.
  it.each(shapes)(
    'of both loops of an instrumentation stage with Q %i, order %i',
    (quality, lowPassOrder) => {
      const loop = quality ** 2 / (2 * Math.PI * REAL.gainBandwidth! * REAL.inputCapacitance);
      const natural = REAL.gainBandwidth! / quality;
      expectExact(
        conditionsWith({
          source: { resistance: 1000 },
          stage: {
            topology: 'instrumentation',
            gain: 2,
            gainResistance: 8 * loop,
            differenceResistance: 4.5 * loop,
          },
          band: { lower: natural / 1000, upper: natural * 3, lowPassOrder },
          referenceFrequency: natural / 100,
        }),
        REAL,
      );
    },
  );

  const ringing = (quality: number): { conditions: OperatingConditions; amplifier: KnownAmplifier } => {
    const feedbackResistance = 1e6;
    const gainBandwidth = 20e6;
    // Q of a transimpedance stage without C_f is √(2π·GBW·R_f·C) over 1 + R_f/R.
    const capacitance = quality ** 2 / (2 * Math.PI * gainBandwidth * feedbackResistance);
    const natural = Math.sqrt(gainBandwidth / (2 * Math.PI * feedbackResistance * capacitance));
    const stage: StageConditions = { topology: 'transimpedance', feedbackResistance, feedbackCapacitance: 0 };
    return {
      conditions: conditionsWith({
        source: { resistance: 1e12, capacitance: capacitance - REAL.inputCapacitance },
        stage: { ...stage, gain: undefined },
        band: { lower: natural / 100, upper: natural * 10 },
        referenceFrequency: natural / 10,
      }),
      amplifier: { ...REAL, gainBandwidth },
    };
  };

  it.each(shapes)('of a transimpedance stage that rings with Q %i, order %i', (quality, lowPassOrder) => {
    const { conditions, amplifier } = ringing(quality);
    expectExact({ ...conditions, band: { ...conditions.band, lowPassOrder } }, amplifier);
  });

  it.each([0.999, 1, 1.001])('where a brick wall cuts the peak at %d times its frequency', (place) => {
    expectExact(conditionsWith({ source: coil(500, 5000, 0), band: { upper: 5000 * place } }), IDEAL);
  });

  it.each([
    [1, 1e5],
    [1, 1e6],
    [1, 1e8],
    [2, 1e6],
  ])('where it lies beyond a low-pass of order %i at 1 Hz, at %d Hz', (lowPassOrder, frequency) => {
    const capacitance = 1e-12;
    const inductance = 1 / ((2 * Math.PI * frequency) ** 2 * capacitance);
    expectExact(
      conditionsWith({
        source: { resistance: 10, inductance },
        band: { lower: 0.01, upper: 1, lowPassOrder },
        referenceFrequency: 0.5,
      }),
      { ...IDEAL, voltageNoise: 1e-9, inputCapacitance: capacitance },
    );
  });
});

describe('parts that are ranked together', () => {
  const query = {
    filter: {},
    target: {},
    sort: 'inputNoiseRms' as const,
    descending: false,
    limit: 100,
    offset: 0,
  };
  const spread = Array.from({ length: 12 }, (_, k): KnownAmplifier => ({
    ...REAL,
    gainBandwidth: 1e6 * 3 ** k,
    inputCapacitance: 1e-12 * 1.15 ** (((k * 7) % 12) * 2),
  }));
  const library = libraryOf(spread.map((amplifier) => ({ amplifier: amplifierWith(amplifier) })));

  it.each<[string, OperatingConditions]>([
    [
      'a coil of Q 1000 that each input capacitance tunes elsewhere',
      conditionsWith({
        source: coil(1000, 15e3, 0),
        stage: { gain: 10, gainResistance: 100 },
        bandwidthMargin: 0,
      }),
    ],
    [
      'an instrumentation stage with three resonances',
      conditionsWith({
        source: coil(200, 20e3, 0),
        stage: { topology: 'instrumentation', gain: 3, gainResistance: 1e6, differenceResistance: 3e5 },
        band: { upper: 1e6, lowPassOrder: 2 },
        bandwidthMargin: 0,
      }),
    ],
    [
      'a ringing transimpedance stage',
      conditionsWith({
        source: { resistance: 1e9, capacitance: 100e-12 },
        stage: { topology: 'transimpedance', gain: undefined, feedbackResistance: 1e6 },
        band: { upper: 1e6, lowPassOrder: 2 },
        bandwidthMargin: 0,
      }),
    ],
    [
      'an inverting stage with two resonances',
      conditionsWith({
        source: coil(200, 5e3, 0),
        stage: { topology: 'inverting', gain: 3, gainResistance: 10 },
        band: { upper: 1e6, lowPassOrder: 1 },
        bandwidthMargin: 0,
      }),
    ],
  ])('each have their own resonance met within 0.1 %, on %s', (_name, conditions) => {
    const { items } = rankAmplifiers({ ...query, conditions }, [library]);
    expect(items).toHaveLength(spread.length);
    for (const { row, figures } of items) {
      const exact = bruteForce(conditions, spread[row]);
      expect(Math.abs(figures.inputNoiseRms / exact.inputNoiseRms - 1)).toBeLessThan(1e-3);
    }
  });
});
