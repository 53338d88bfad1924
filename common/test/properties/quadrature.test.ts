import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateStage, densitySpectrum } from '../../src/noise/index.js';
import { stageModel } from '../../src/noise/stage/stageModel.js';
import {
  amplifiers,
  conditionsAround,
  detectors,
  reactiveSources,
  resistiveSources,
  seeded,
} from '../support/arbitraries.js';
import { bruteForce } from '../support/bruteForce.js';
import { nodalAnalysis, type KnownAmplifier } from '../support/nodalAnalysis.js';

const known = amplifiers.map((amplifier): KnownAmplifier => ({
  voltageNoise: amplifier.voltageNoise,
  voltageNoiseCorner: amplifier.voltageNoiseCorner ?? 0,
  currentNoise: amplifier.currentNoise ?? 0,
  currentNoiseCorner: amplifier.currentNoiseCorner ?? 0,
  gainBandwidth: amplifier.gainBandwidth,
  inputCapacitance: amplifier.inputCapacitance ?? 0,
}));

const stated = conditionsAround(
  fc.oneof(
    resistiveSources,
    reactiveSources,
    detectors.filter(({ stage }) => stage.feedbackCapacitance !== 'auto'),
  ),
).map((conditions) => ({ ...conditions, amplifierTemperatureModel: 'none' as const }));

describe('a stage solved node by node as a circuit', () => {
  it('has the same density by contributor and the same signal gain at any frequency', () => {
    fc.assert(
      fc.property(stated, known, (conditions, amplifier) => {
        const { referenceFrequency } = conditions;
        const { powers, gain2 } = nodalAnalysis(conditions, amplifier)(referenceFrequency);
        const [own] = densitySpectrum(conditions, amplifier, [referenceFrequency]);
        const { signalGain } = evaluateStage(conditions, amplifier);
        expect(signalGain / Math.sqrt(gain2)).toBeCloseTo(1, 6);
        for (const [contributor, density] of Object.entries(own.contributions)) {
          const expected = Math.sqrt(powers[contributor as keyof typeof powers] / gain2);
          expect(Math.abs(density - expected), contributor).toBeLessThanOrEqual(1e-6 * expected);
        }
      }),
      seeded(300),
    );
  });

  it('has the same total and the same contributions over the band within 0.02 %', () => {
    fc.assert(
      fc.property(stated, known, (conditions, amplifier) => {
        const growing = stageModel(conditions).growth(amplifier.inputCapacitance) === 2;
        fc.pre(amplifier.gainBandwidth !== null || conditions.band.lowPassOrder !== 1 || !growing);
        const own = evaluateStage(conditions, amplifier);
        const exact = bruteForce(conditions, amplifier);
        expect(Math.abs(own.outputNoiseRms / exact.outputNoiseRms - 1)).toBeLessThan(2e-4);
        for (const [contributor, rms] of Object.entries(exact.contributions)) {
          if (rms < 1e-4 * exact.inputNoiseRms) continue;
          const share = own.contributions[contributor as keyof typeof own.contributions];
          expect(Math.abs(share / rms - 1), contributor).toBeLessThan(1e-3);
        }
      }),
      seeded(40),
    );
  });
});
