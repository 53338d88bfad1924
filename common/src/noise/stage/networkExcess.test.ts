import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith } from '../../../test/support/stages.js';
import { evaluateStage } from '../evaluateStage.js';
import { excessNoiseRms } from '../excess.js';

const fast = amplifierWith({ gainBandwidth: null, inputCapacitance: 0 });
const band = { lower: 0.1, upper: 1000, lowPassOrder: 0 };

describe('excess noise of the feedback network', () => {
  it('is that of R_f and R_g at their share of the output voltage, in a non-inverting stage', () => {
    const stage = {
      gain: 11,
      gainResistance: 1000,
      outputVoltage: 5.5,
      gainNoiseIndex: -10,
      feedbackNoiseIndex: 0,
    };
    const { contributions } = evaluateStage(conditionsWith({ stage, band, referenceFrequency: 100 }), fast);
    const ofFeedback = excessNoiseRms(0, 5, 0.1, 1000) / 11;
    const ofGain = (excessNoiseRms(-10, 0.5, 0.1, 1000) * 10) / 11;
    expect(contributions.excess).toBeCloseTo(Math.hypot(ofFeedback, ofGain), 15);
  });

  it('is amplified from R_g as the source is, in an inverting stage', () => {
    const source = { resistance: 500 };
    const stage = {
      topology: 'inverting' as const,
      gain: 10,
      gainResistance: 1500,
      outputVoltage: 4,
      gainNoiseIndex: 0,
    };
    const conditions = conditionsWith({ source, stage, band, referenceFrequency: 100 });
    const { contributions } = evaluateStage(conditions, fast);
    expect(contributions.excess).toBeCloseTo(excessNoiseRms(0, 0.3, 0.1, 1000), 15);
  });

  it('is that of all four resistors at their own currents, in a difference stage', () => {
    const source = { resistance: 1000 };
    const stage = {
      topology: 'difference' as const,
      gain: 10,
      gainResistance: 500,
      outputVoltage: 4.4,
      gainNoiseIndex: 0,
      feedbackNoiseIndex: -20,
    };
    const conditions = conditionsWith({ source, stage, band, referenceFrequency: 100 });
    const { contributions } = evaluateStage(conditions, fast);
    // 0.44 V at the source lifts both inputs to 0.22 V·10/11 = 0.2 V: R_f of 10 kΩ carry 20 µA and 420 µA.
    const of = (current: number) =>
      Math.hypot(
        excessNoiseRms(0, current * 500, 0.1, 1000) * 10,
        excessNoiseRms(-20, current * 1e4, 0.1, 1000),
      );
    expect(contributions.excess).toBeCloseTo(Math.hypot(of(20e-6), of(420e-6)) / 10, 15);
  });

  it('is that of R_g and both R_f around the input pair, in an instrumentation stage', () => {
    const stage = {
      topology: 'instrumentation' as const,
      gain: 11,
      gainResistance: 1000,
      outputVoltage: 5.5,
      gainNoiseIndex: -10,
      feedbackNoiseIndex: 0,
    };
    const { contributions } = evaluateStage(conditionsWith({ stage, band, referenceFrequency: 100 }), fast);
    const ofFeedback = excessNoiseRms(0, 2.5, 0.1, 1000) / 11;
    const ofGain = (excessNoiseRms(-10, 0.5, 0.1, 1000) * 10) / 11;
    expect(contributions.excess).toBeCloseTo(Math.hypot(ofFeedback, ofFeedback, ofGain), 15);
  });

  it('is a current of V·10^(NI/20)·1e-6/R_f in a transimpedance stage', () => {
    const source = { resistance: 1e9 };
    const stage = {
      topology: 'transimpedance' as const,
      gain: undefined,
      feedbackResistance: 1e6,
      outputVoltage: 2,
      feedbackNoiseIndex: 5,
    };
    const { contributions } = evaluateStage(
      conditionsWith({ source, stage, band, referenceFrequency: 100 }),
      fast,
    );
    expect(contributions.excess / (excessNoiseRms(5, 2, 0.1, 1000) / 1e6)).toBeCloseTo(1, 9);
  });

  it('is none without a direct voltage or a noise index', () => {
    const stage = { gain: 11, gainResistance: 1000 };
    const of = (more: object) =>
      evaluateStage(conditionsWith({ stage: { ...stage, ...more } }), fast).contributions.excess;
    expect(of({ outputVoltage: 5 })).toBe(0);
    expect(of({ gainNoiseIndex: 10, feedbackNoiseIndex: 10 })).toBe(0);
  });
});
