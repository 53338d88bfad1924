import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith } from '../../../test/support/stages.js';
import { evaluateStage } from '../evaluateStage.js';
import { thermalVoltageDensity } from '../thermal.js';

const white = amplifierWith({ voltageNoiseCorner: 0, currentNoiseCorner: 0, inputCapacitance: 0 });
const fast = { ...white, gainBandwidth: null };
const band = { lower: 20, upper: 20_020 };
const stage = { topology: 'difference' as const, gain: 10, gainResistance: 1000 };

describe('a difference stage', () => {
  const conditions = conditionsWith({ source: { resistance: 600 }, stage, band });
  const { contributions, signalGain } = evaluateStage(conditions, fast);

  it('has the gain R_f/(R_g + R/2), and so R_f = 10·1300 Ω', () => {
    expect(signalGain).toBeCloseTo(10, 12);
    const current = contributions.amplifierCurrentFeedback / Math.sqrt(20_000);
    expect(current).toBeCloseTo((1e-12 * 13e3) / 10, 15);
  });

  it('has the noise of four resistors and of both input currents, and the source’s as a whole', () => {
    const perRoot = (value: number) => value / Math.sqrt(20_000);
    expect(perRoot(contributions.source)).toBeCloseTo(thermalVoltageDensity(600, 290), 15);
    // Two R_g count once each at the source, two R_f of 13 kΩ a hundredth.
    expect(perRoot(contributions.feedback)).toBeCloseTo(thermalVoltageDensity(2000 + 260, 290), 15);
    expect(perRoot(contributions.amplifierVoltage)).toBeCloseTo(3e-9 * 1.1, 15);
    expect(contributions.amplifierCurrentSource).toBe(contributions.amplifierCurrentFeedback);
    expect(contributions.bias).toBe(0);
  });

  it('has the closed loop of its noise gain, 1 + gain', () => {
    expect(evaluateStage(conditions, white).closedLoopBandwidth).toBeCloseTo(1e7 / 11, 6);
  });
});
