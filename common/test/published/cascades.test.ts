import { describe, expect, it } from 'vitest';
import { BOLTZMANN, evaluateStage, flatFeedbackCapacitance, sourceFloor } from '../../src/noise/index.js';
import { amplifierWith, conditionsWith, SILENT } from '../support/stages.js';

const factor = (decibels: number | null) => 10 ** (decibels! / 10);

describe('a matched load', () => {
  // Common practice, no source: the available power kTB doesn't depend on R.
  it.each([50, 1e4, 1e7])('takes kTB from a source of %d Ω', (resistance) => {
    const conditions = conditionsWith({ source: { resistance }, stage: { loadResistance: resistance } });
    const { contributions, signalGain } = evaluateStage(conditions, SILENT);
    const power = (contributions.source * signalGain) ** 2 / resistance;
    expect(power / (BOLTZMANN * 290 * 19_980)).toBeCloseTo(1, 6);
  });
});

describe('cascades after Friis 1944', () => {
  it('give a matched attenuator at T₀ the noise figure of its loss', () => {
    const conditions = conditionsWith({ source: { resistance: 75 }, stage: { loadResistance: 75 } });
    expect(factor(evaluateStage(conditions, SILENT).noiseFigure)).toBeCloseTo(2, 6);
  });

  it('give a shunt of any resistance at T₀ the noise figure of its loss in available power', () => {
    const conditions = conditionsWith({ source: { resistance: 300 }, stage: { loadResistance: 100 } });
    expect(factor(evaluateStage(conditions, SILENT).noiseFigure)).toBeCloseTo(4, 6);
  });

  it('add the second stage’s excess over the first one’s gain: F = F₁ + (F₂ − 1)/G₁', () => {
    const amplifier = amplifierWith({ gainBandwidth: null, inputCapacitance: 0 });
    const whole = conditionsWith({ source: { resistance: 1000 }, stage: { loadResistance: 3000 } });
    const second = conditionsWith({ source: { resistance: 750 } });
    const first = factor(evaluateStage(whole, SILENT).noiseFigure);
    const cascade = first + (factor(evaluateStage(second, amplifier).noiseFigure) - 1) / 0.75;
    expect(factor(evaluateStage(whole, amplifier).noiseFigure) / cascade).toBeCloseTo(1, 9);
  });
});

describe('the noise figure', () => {
  // IEEE: the source counts at 290 K; an amplifier of 1 kΩ's density doubles the power.
  it('is 3.01 dB where the amplifier’s voltage noise equals the source’s at 290 K', () => {
    const amplifier = { ...SILENT, voltageNoise: sourceFloor(conditionsWith()).inputNoiseDensity };
    const cold = conditionsWith({ source: { temperature: 77 } });
    expect(evaluateStage(cold, amplifier).noiseFigure).toBeCloseTo(3.0103, 4);
  });

  // Rothe & Dahlke 1956; Motchenbacher & Connelly 1993: F_min = 1 + e_n·i_n/(2kT₀) for uncorrelated generators.
  it('is least at the optimum source resistance e_n/i_n, and there 1 + e_n·i_n/(2kT₀)', () => {
    const amplifier = { ...SILENT, voltageNoise: 4e-9, currentNoise: 2e-12 };
    const at = (resistance: number) =>
      factor(evaluateStage(conditionsWith({ source: { resistance } }), amplifier).noiseFigure);
    expect(at(2000)).toBeCloseTo(1 + (4e-9 * 2e-12) / (2 * BOLTZMANN * 290), 9);
    for (const away of [0.5, 0.95, 1.05, 2]) expect(at(2000 * away)).toBeGreaterThan(at(2000));
  });
});

describe('the flat feedback capacitance', () => {
  // Graeme 1996: C_f = √(C/(π·R_f·GBW)); the figures are worked out by hand.
  it('of 100 pF, 1 MΩ and 10 MHz is 1.784 pF', () => {
    expect(flatFeedbackCapacitance(100e-12, 1e6, 10e6)).toBeCloseTo(1.784e-12, 15);
  });

  it('leaves the transimpedance without a peak and −3 dB at √(GBW/(2π·R_f·C))', () => {
    const natural = Math.sqrt(10e6 / (2 * Math.PI * 1e6 * 1000e-12));
    const gainAt = (referenceFrequency: number) =>
      evaluateStage(
        conditionsWith({
          source: { resistance: 1e12, capacitance: 1000e-12 },
          stage: {
            topology: 'transimpedance',
            gain: undefined,
            feedbackResistance: 1e6,
            feedbackCapacitance: 'auto',
          },
          band: { lower: 1, upper: 1e6 },
          referenceFrequency,
        }),
        amplifierWith({ gainBandwidth: 10e6, inputCapacitance: 0 }),
      ).signalGain / 1e6;
    expect(gainAt(natural)).toBeCloseTo(Math.SQRT1_2, 1);
    for (let f = natural / 100; f < natural * 10; f *= 1.1) expect(gainAt(f)).toBeLessThan(1.005);
  });
});
