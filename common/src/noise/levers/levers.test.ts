import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith, libraryOf } from '../../../test/support/stages.js';
import { checkConditions } from '../../conditions/index.js';
import { evaluateStage } from '../evaluateStage.js';
import { rankAmplifiers } from '../ranking/index.js';
import { findLevers, type LeverKey } from './levers.js';
import { parallelStage } from './parallelStage.js';
import { behindTransformer, optimumSourceResistance } from './transformer.js';

const amplifier = amplifierWith({ channels: 2 });
const part = { amplifier, name: 'VR-1' };
const quieter = { amplifier: amplifierWith({ voltageNoise: 1e-9 }), name: 'VR-2' };

const stages = {
  'a low source resistance': conditionsWith({
    source: { resistance: 50, temperature: 300 },
    stage: { gain: 100, gainResistance: 100 },
    amplifierTemperatureModel: 'estimated',
  }),
  'a coil with a capacitance': conditionsWith({
    source: { resistance: 200, inductance: 0.05, capacitance: 1e-9 },
    stage: { gain: 10, gainResistance: 220 },
    band: { lowPassOrder: 2 },
  }),
  'an inverting stage': conditionsWith({ stage: { topology: 'inverting', gain: 10, gainResistance: 1000 } }),
  'a difference stage': conditionsWith({
    stage: { topology: 'difference', gain: 10, gainResistance: 1000 },
  }),
  'an instrumentation stage': conditionsWith({
    source: { resistance: 300 },
    stage: { topology: 'instrumentation', gain: 10, gainResistance: 1000 },
  }),
  'a direct output voltage': conditionsWith({
    stage: { gain: 10, gainResistance: 1000, outputVoltage: -5, gainNoiseIndex: -10, feedbackNoiseIndex: 0 },
    band: { lower: 0.1, upper: 100 },
    referenceFrequency: 10,
  }),
  'a transimpedance stage': conditionsWith({
    source: { resistance: 1e8, capacitance: 1e-11 },
    stage: {
      topology: 'transimpedance',
      gain: undefined,
      feedbackResistance: 1e6,
      feedbackCapacitance: 'auto',
    },
  }),
};

const rank = (conditions: ReturnType<typeof conditionsWith>, ranked: typeof amplifier) =>
  rankAmplifiers(
    {
      conditions: { ...conditions, bandwidthMargin: 0 },
      filter: {},
      target: {},
      sort: 'inputNoiseRms',
      descending: false,
      limit: 1,
      offset: 0,
    },
    [libraryOf([{ amplifier: ranked }])],
  ).items[0].figures;

describe.each(Object.entries(stages))('levers of %s', (_, conditions) => {
  const now = evaluateStage(conditions, amplifier).inputNoiseRms;

  it('tell what a ranking at the changed conditions tells', () => {
    const levers = findLevers(conditions, part, quieter);
    expect(levers.length).toBeGreaterThan(3);
    for (const lever of levers) {
      expect(checkConditions({ conditions: lever.conditions })).toEqual([]);
      const ranked = rank(lever.conditions, lever.amplifier as typeof amplifier);
      expect(lever.change).toBeCloseTo(20 * Math.log10(ranked.inputNoiseRms / lever.ratio / now), 6);
    }
  });

  it('stand in the order in which they help', () => {
    const changes = findLevers(conditions, part, quieter).map(({ change }) => change);
    expect(changes).toEqual([...changes].sort((a, b) => a - b));
  });
});

describe('findLevers', () => {
  const keysOf = (conditions: ReturnType<typeof conditionsWith>) =>
    findLevers(conditions, part).map(({ key }) => key);

  it.each<[LeverKey, ReturnType<typeof conditionsWith>]>([
    ['lower-network', conditionsWith({ stage: { gain: 100, gainResistance: 5 } })],
    ['lower-voltage', stages['a low source resistance']],
    ['lower-voltage', conditionsWith({ stage: { gain: 10, gainResistance: 1000, outputVoltage: 5 } })],
    ['lower-voltage', conditionsWith({ stage: { gain: 10, gainResistance: 1000, feedbackNoiseIndex: 0 } })],
    ['raise-feedback', stages['a low source resistance']],
    ['halve-band', conditionsWith({ band: { lower: 15e3 }, referenceFrequency: 16e3 })],
    ['cool-source', conditionsWith({ source: { resistance: 0 } })],
    ['transformer', conditionsWith({ source: { resistance: 1e5 } })],
    ['transformer', conditionsWith({ source: { resistance: 1, inductance: 100 } })],
    ['halve-band', conditionsWith({ band: { lower: 1e4, upper: 2e4 + 1e-11 }, referenceFrequency: 1e4 })],
    ['quieter-part', stages['a low source resistance']],
    ['parallel', stages['a difference stage']],
    ['parallel', stages['an instrumentation stage']],
    ['transformer', stages['a difference stage']],
    [
      'lower-network',
      conditionsWith({ stage: { topology: 'instrumentation', gain: 1, differenceResistance: 500 } }),
    ],
  ])('leaves out %s where it can’t help', (key, conditions) => {
    expect(keysOf(conditions)).not.toContain(key);
  });

  it('writes the ratio of a transformer in full', () => {
    const conditions = conditionsWith({ source: { resistance: 1e-3 } });
    const lever = findLevers(conditions, part).find(({ key }) => key === 'transformer')!;
    expect(lever.ratio).toBeGreaterThan(1000);
    expect(lever.label).toMatch(/^Step-up transformer 1:\d{4} \(ideal\)$/);
  });

  it('halves the direct output voltage, and with it the excess noise', () => {
    const conditions = stages['a direct output voltage'];
    const lever = findLevers(conditions, part).find(({ key }) => key === 'lower-voltage')!;
    expect(lever.conditions.stage.outputVoltage).toBe(-2.5);
    const excess = (at: typeof conditions) => evaluateStage(at, amplifier).contributions.excess;
    expect(excess(lever.conditions)).toBeCloseTo(excess(conditions) / 2, 12);
    expect(lever.change).toBeLessThan(0);
  });

  it('lowers the network to what the output is to drive', () => {
    const conditions = conditionsWith({
      stage: { gain: 100, gainResistance: 100, network: { minimumTotal: 2000 } },
    });
    const lever = findLevers(conditions, part).find(({ key }) => key === 'lower-network')!;
    expect(lever.conditions.stage.gainResistance).toBe(20);
    expect(lever.change).toBeLessThan(0);
  });
});

describe('the network of a stage with two inputs', () => {
  const lowered = (key: keyof typeof stages) =>
    findLevers(stages[key], part).find((lever) => lever.key === 'lower-network')!;

  it('is lowered in both legs of a difference stage until its R_f is what the output is to drive', () => {
    const lever = lowered('a difference stage');
    // 500 Ω = 10·(R_g + 1000 Ω/2) leaves nothing for R_g.
    expect(lever.conditions.stage.gainResistance).toBe(0);
    expect(lever.label.replaceAll('\u2009', ' ')).toBe('Lower the gain resistance to 0 Ω');
  });

  it('is lowered around the input pair and behind it, in an instrumentation stage', () => {
    const lever = lowered('an instrumentation stage');
    expect(lever.conditions.stage).toMatchObject({ gainResistance: 100, differenceResistance: 500 });
    expect(lever.label.replaceAll('\u2009', ' ')).toBe(
      'Lower the gain resistance to 100 Ω, the difference resistances to 500 Ω',
    );
    expect(lever.change).toBeLessThan(0);
  });
});

describe('parallelStage', () => {
  it('lets voltage noise and network fall with n and current noise into the source rise with n', () => {
    const direct = { outputVoltage: 5, gainNoiseIndex: 0, feedbackNoiseIndex: -10 };
    const conditions = conditionsWith({ stage: { gain: 100, gainResistance: 100, ...direct } });
    const fast = amplifierWith({ gainBandwidth: null, inputCapacitance: 0 });
    const one = evaluateStage(conditions, fast).contributions;
    const four = parallelStage({ conditions, amplifier: fast }, 4);
    const many = evaluateStage(four.conditions, four.amplifier).contributions;
    expect(many.source).toBeCloseTo(one.source, 15);
    expect(many.amplifierVoltage / one.amplifierVoltage).toBeCloseTo(1 / 2, 9);
    expect(many.feedback / one.feedback).toBeCloseTo(1 / 2, 9);
    expect(many.excess / one.excess).toBeCloseTo(1 / 2, 9);
    expect(many.amplifierCurrentFeedback / one.amplifierCurrentFeedback).toBeCloseTo(1 / 2, 9);
    expect(many.amplifierCurrentSource / one.amplifierCurrentSource).toBeCloseTo(2, 9);
  });
});

describe('transformer', () => {
  it('brings the noise figure to its least, 1 + 2·e_n·i_n/(4kT₀) (Rothe & Dahlke 1956)', () => {
    const conditions = conditionsWith({ source: { resistance: 10 } });
    const white = amplifierWith({
      voltageNoiseCorner: 0,
      currentNoiseCorner: 0,
      gainBandwidth: null,
      inputCapacitance: 0,
    });
    const optimum = optimumSourceResistance(conditions, white);
    expect(optimum).toBeCloseTo(3000, 9);
    const matched = behindTransformer(conditions, Math.sqrt(optimum / 10));
    const least = 10 * Math.log10(1 + (2 * 3e-9 * 1e-12) / (4 * 1.380649e-23 * 290));
    expect(evaluateStage(matched, white).noiseFigure).toBeCloseTo(least, 6);
  });

  it('has its optimum at 2·e_n/i_n before the two inputs of an instrumentation stage', () => {
    const at = (resistance: number) =>
      conditionsWith({
        source: { resistance },
        // So much gain that source and input pair alone count.
        stage: { topology: 'instrumentation', gain: 1e5, gainResistance: 1e-4, differenceResistance: 1 },
      });
    const white = amplifierWith({ voltageNoiseCorner: 0, currentNoiseCorner: 0, gainBandwidth: null });
    const optimum = optimumSourceResistance(at(10), white);
    expect(optimum).toBeCloseTo(6000, 9);
    const figure = (resistance: number) => evaluateStage(at(resistance), white).noiseFigure!;
    expect(figure(optimum)).toBeLessThan(figure(optimum * 1.2));
    expect(figure(optimum)).toBeLessThan(figure(optimum / 1.2));
  });
});
