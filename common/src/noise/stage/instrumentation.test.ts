import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith } from '../../../test/support/stages.js';
import { evaluateStage } from '../evaluateStage.js';
import { thermalVoltageDensity } from '../thermal.js';
import { instrumentationModel } from './instrumentation.js';

const white = amplifierWith({ voltageNoiseCorner: 0, currentNoiseCorner: 0, inputCapacitance: 0 });
const fast = { ...white, gainBandwidth: null };
const band = { lower: 20, upper: 20_020 };
const topology = 'instrumentation' as const;

describe('an instrumentation stage', () => {
  const stage = { topology, gain: 10, gainResistance: 1000, loadResistance: 1e6, differenceResistance: 5000 };
  const conditions = conditionsWith({ source: { resistance: 600 }, stage, band });
  const figures = evaluateStage(conditions, fast);
  const perRoot = (value: number) => (value / Math.sqrt(20_000)) * (figures.signalGain / 10);

  it('has the gain 1 + 2R_f/R_g behind the load of each leg', () => {
    expect(figures.signalGain).toBeCloseTo(10 / 1.0003, 12);
  });

  it('has e_n of the input pair, and that of the third op-amp twice over the gain', () => {
    expect(perRoot(figures.contributions.amplifierVoltage)).toBeCloseTo(3e-9 * Math.sqrt(2 + 0.2 ** 2), 15);
  });

  it('has i_n in each leg, and in R_f of 4.5 kΩ and the difference resistors', () => {
    const { amplifierCurrentSource, amplifierCurrentFeedback } = figures.contributions;
    const leg = 1 / (1 / 300 + 1 / 1e6);
    expect(perRoot(amplifierCurrentSource)).toBeCloseTo(1e-12 * leg * Math.SQRT2, 15);
    expect(perRoot(amplifierCurrentFeedback)).toBeCloseTo(1e-12 * Math.SQRT2 * Math.hypot(450, 500), 15);
  });

  it('has the thermal noise of R_g, both R_f, four difference resistors and both load resistors', () => {
    const { feedback, bias } = figures.contributions;
    const ofPair = 1000 * 0.9 ** 2 + 2 * 4500 * 0.1 ** 2;
    expect(perRoot(feedback)).toBeCloseTo(thermalVoltageDensity(ofPair + 4 * 5000 * 0.1 ** 2, 290), 15);
    const leg = 1 / (1 / 300 + 1 / 1e6);
    expect(perRoot(bias)).toBeCloseTo(thermalVoltageDensity((2 * leg * leg) / 1e6, 290), 15);
  });

  it('has 10 kΩ for each difference resistor where nothing is stated', () => {
    const with10k = { ...conditions, stage: { ...stage, differenceResistance: 10e3 } };
    const without = { ...conditions, stage: { ...stage, differenceResistance: undefined } };
    expect(evaluateStage(without, white)).toEqual(evaluateStage(with10k, white));
  });

  it('has two followers at gain 1, whatever the gain resistance', () => {
    const followers = conditionsWith({ stage: { topology, gain: 1 } });
    const withResistor = conditionsWith({ stage: { topology, gain: 1, gainResistance: 1e5 } });
    expect(evaluateStage(withResistor, white)).toEqual(evaluateStage(followers, white));
  });
});

describe('the loops of an instrumentation stage', () => {
  const bandwidth = (gain: number, differenceResistance = 10e3, inputCapacitance = 0) =>
    evaluateStage(
      conditionsWith({ stage: { topology, gain, gainResistance: 100, differenceResistance }, band }),
      amplifierWith({ gainBandwidth: 1e7, inputCapacitance }),
    ).closedLoopBandwidth!;

  it('give the closed-loop bandwidth of the slower one', () => {
    expect(bandwidth(10)).toBeCloseTo(1e6, 6);
    expect(bandwidth(1)).toBeCloseTo(5e6, 6);
    expect(bandwidth(1, 1e6, 10e-12)).toBeCloseTo(
      1e7 / Math.hypot(2, 2 * Math.PI * 20_020 * 10e-12 * 1e6),
      3,
    );
  });

  it('are held to a minimum stable gain by the lesser noise gain, at most the third op-amp’s 2', () => {
    const least = (gain: number) =>
      instrumentationModel(conditionsWith({ stage: { topology, gain, gainResistance: 100 } }));
    expect(least(100).crossoverNoiseGain(1e7, 0)).toBe(2);
    expect(least(1.5).crossoverNoiseGain(1e7, 0)).toBe(1.5);
  });
});
