import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith } from '../../test/support/stages.js';
import { leastCurrentNoise, temperatureFactors } from './amplifierNoise.js';
import { evaluateStage } from './evaluateStage.js';

const estimatedAt = (ambientTemperature: number) =>
  conditionsWith({ ambientTemperature, amplifierTemperatureModel: 'estimated' });

describe('temperatureFactors', () => {
  it.each(['jfet', 'cmos'] as const)('doubles i_n of %s inputs per 20 K', (inputType) => {
    expect(Math.sqrt(temperatureFactors('estimated', 318.15, inputType).current)).toBeCloseTo(2, 12);
    expect(Math.sqrt(temperatureFactors('estimated', 278.15, inputType).current)).toBeCloseTo(0.5, 12);
  });

  it.each(['bipolar', 'zero-drift', null] as const)('leaves i_n of %s inputs as it is', (inputType) => {
    expect(temperatureFactors('estimated', 398.15, inputType).current).toBe(1);
  });

  it('carries e_n² with the absolute temperature from 25 °C on', () => {
    expect(temperatureFactors('estimated', 298.15, 'cmos')).toEqual({ voltage: 1, current: 1 });
    expect(temperatureFactors('estimated', 149.075, 'bipolar').voltage).toBeCloseTo(0.5, 12);
  });

  it('changes nothing in the model “none”', () => {
    expect(temperatureFactors('none', 400, 'jfet')).toEqual({ voltage: 1, current: 1 });
  });

  it('reaches the contributions of a stage', () => {
    const jfet = amplifierWith({ inputType: 'jfet' });
    const warm = evaluateStage(estimatedAt(318.15), jfet).contributions;
    const cool = evaluateStage(estimatedAt(298.15), jfet).contributions;
    expect(warm.amplifierCurrentSource / cool.amplifierCurrentSource).toBeCloseTo(2, 9);
    expect((warm.amplifierVoltage / cool.amplifierVoltage) ** 2).toBeCloseTo(318.15 / 298.15, 9);
  });
});

describe('leastCurrentNoise', () => {
  // Schottky 1918: √(2·q·I).
  it('is the shot noise of the bias current where that is known', () => {
    expect(leastCurrentNoise('cmos', 1e-6)).toBeCloseTo(0.566e-12, 15);
    expect(leastCurrentNoise(null, 1e-12)).toBeCloseTo(0.566e-15, 18);
  });

  it('is what the input type is made with at least where it isn’t', () => {
    const least = (['bipolar', 'zero-drift', 'jfet', 'cmos'] as const).map((type) =>
      leastCurrentNoise(type, null),
    );
    expect(least).toEqual([1e-13, 3e-15, 3e-16, 1e-16]);
  });

  it('is nothing only where nothing at all is known', () => {
    expect(leastCurrentNoise(null, null)).toBe(0);
  });
});

describe('an unknown current noise', () => {
  const unknown = amplifierWith({ currentNoise: null, currentNoiseCorner: 0, inputBiasCurrent: 1e-6 });

  it('counts with its lower bound and not as zero', () => {
    const shot = amplifierWith({ currentNoise: leastCurrentNoise(null, 1e-6), currentNoiseCorner: 0 });
    const { contributions, cautions } = evaluateStage(conditionsWith(), unknown);
    expect(contributions).toEqual(evaluateStage(conditionsWith(), shot).contributions);
    expect(contributions.amplifierCurrentSource).toBeGreaterThan(0);
    expect(cautions).toContain('current-noise-unknown');
  });

  it('makes the total a lower bound of what any real current noise makes', () => {
    const total = evaluateStage(conditionsWith(), unknown).inputNoiseRms;
    for (const factor of [1, 1.5, 10]) {
      const currentNoise = 0.5661e-12 * factor;
      const real = evaluateStage(conditionsWith(), { ...unknown, currentNoise });
      expect(real.inputNoiseRms).toBeGreaterThanOrEqual(total);
    }
  });
});
