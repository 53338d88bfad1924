import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { USUAL_DIFFERENCE_RESISTANCE, type OperatingConditions } from '../../src/conditions/index.js';
import { CONTRIBUTORS, densitySpectrum, evaluateStage, sourceFloor } from '../../src/noise/index.js';
import {
  amplifiers,
  anyStage,
  bands,
  conditionsAround,
  decades,
  detectors,
  reactiveSources,
  resistiveSources,
  seeded,
} from '../support/arbitraries.js';

/** Quadratures may differ by 0.01 % where sums in closed form would be equal. */
const ROUNDING = 1 - 1e-4;

const sumOfSquares = (contributions: Record<string, number>) =>
  CONTRIBUTORS.reduce((sum, key) => sum + contributions[key] ** 2, 0);

describe('the budget of any stage', () => {
  it('adds up to the total: its squares over the band, and its squares at each frequency', () => {
    fc.assert(
      fc.property(anyStage, amplifiers, (conditions, amplifier) => {
        const figures = evaluateStage(conditions, amplifier);
        expect(sumOfSquares(figures.contributions) / figures.inputNoiseRms ** 2).toBeCloseTo(1, 9);
        expect(figures.outputNoiseRms / (figures.inputNoiseRms * figures.signalGain)).toBeCloseTo(1, 9);
        const [spot] = densitySpectrum(conditions, amplifier, [conditions.referenceFrequency]);
        expect(sumOfSquares(spot.contributions) / figures.inputNoiseDensity ** 2).toBeCloseTo(1, 9);
      }),
      seeded(200),
    );
  });

  it('names the contributor with the largest share', () => {
    fc.assert(
      fc.property(anyStage, amplifiers, (conditions, amplifier) => {
        const { contributions, dominant } = evaluateStage(conditions, amplifier);
        expect(contributions[dominant]).toBe(Math.max(...Object.values(contributions)));
      }),
      seeded(100),
    );
  });

  it('holds the source floor, which no amplifier passes and a noise-free one reaches', () => {
    fc.assert(
      fc.property(anyStage, amplifiers, (conditions, amplifier) => {
        const floor = sourceFloor(conditions);
        const figures = evaluateStage(conditions, { ...amplifier, gainBandwidth: null, inputCapacitance: 0 });
        expect(figures.contributions.source / floor.inputNoiseRms).toBeCloseTo(1, 4);
        expect(figures.inputNoiseRms).toBeGreaterThanOrEqual(floor.inputNoiseRms * ROUNDING);
        expect(figures.inputNoiseDensity).toBeGreaterThanOrEqual(floor.inputNoiseDensity * (1 - 1e-9));
      }),
      seeded(100),
    );
  });
});

describe('with a purely resistive source', () => {
  const resistive = conditionsAround(resistiveSources);
  const withoutCapacitance = amplifiers.map((amplifier) => ({ ...amplifier, inputCapacitance: 0 }));
  const factor = fc.double({ min: 1, max: 100, noNaN: true });

  it('more source resistance never lowers the total', () => {
    fc.assert(
      fc.property(resistive, withoutCapacitance, factor, (conditions, amplifier, times) => {
        const { source } = conditions;
        const more = { ...conditions, source: { ...source, resistance: source.resistance * times } };
        const total = evaluateStage(conditions, amplifier).inputNoiseRms;
        expect(evaluateStage(more, amplifier).inputNoiseRms).toBeGreaterThanOrEqual(total * ROUNDING);
      }),
      seeded(150),
    );
  });

  it('a wider band never lowers the total, whether it begins lower or ends higher', () => {
    fc.assert(
      fc.property(resistive, amplifiers, factor, factor, (conditions, amplifier, below, above) => {
        const { lower, upper, lowPassOrder } = conditions.band;
        const band = { lower: lower / below, upper: upper * above, lowPassOrder };
        const total = evaluateStage(conditions, amplifier).inputNoiseRms;
        expect(evaluateStage({ ...conditions, band }, amplifier).inputNoiseRms).toBeGreaterThanOrEqual(
          total * ROUNDING,
        );
      }),
      seeded(150),
    );
  });

  it('the closed form equals the quadrature, which an amplifier of 1 PHz takes', () => {
    const slowBands = bands.filter(({ upper }) => upper < 1e6);
    fc.assert(
      fc.property(resistive, slowBands, amplifiers, (conditions, band, amplifier) => {
        const within = { ...conditions, band, referenceFrequency: band.lower };
        const ideal = { ...amplifier, gainBandwidth: null, inputCapacitance: 0 };
        const closedForm = evaluateStage(within, ideal);
        const quadrature = evaluateStage(within, { ...ideal, gainBandwidth: 1e15 });
        for (const key of CONTRIBUTORS) {
          if (closedForm.contributions[key] === 0) expect(quadrature.contributions[key]).toBe(0);
          else expect(quadrature.contributions[key] / closedForm.contributions[key], key).toBeCloseTo(1, 4);
        }
      }),
      seeded(150),
    );
  });

  it('the closed form of a brick wall equals a plain sum over the density spectrum', () => {
    fc.assert(
      fc.property(resistive, amplifiers, (conditions, amplifier) => {
        const band = { ...conditions.band, lowPassOrder: 0 };
        const ideal = { ...amplifier, gainBandwidth: null, inputCapacitance: 0 };
        const steps = 2000;
        const length = Math.log(band.upper / band.lower) / steps;
        const middles = Array.from({ length: steps }, (_, k) => band.lower * Math.exp((k + 0.5) * length));
        const power = densitySpectrum(conditions, ideal, middles).reduce(
          (sum, { frequency, inputNoiseDensity }) => sum + inputNoiseDensity ** 2 * frequency * length,
          0,
        );
        const total = evaluateStage({ ...conditions, band }, ideal).inputNoiseRms;
        expect(Math.sqrt(power) / total).toBeCloseTo(1, 4);
      }),
      seeded(25),
    );
  });
});

describe('a higher temperature', () => {
  it('never lowers the total, of the source or of everything around it', () => {
    const kelvins = fc.double({ min: 0, max: 200, noNaN: true });
    fc.assert(
      fc.property(anyStage, amplifiers, kelvins, kelvins, (conditions, amplifier, source, ambient) => {
        const at = (sourceTemperature: number, ambientTemperature: number) =>
          evaluateStage(
            {
              ...conditions,
              ambientTemperature,
              source: { ...conditions.source, temperature: sourceTemperature },
            },
            amplifier,
          ).inputNoiseRms;
        expect(at(300 + source, 250 + ambient)).toBeGreaterThanOrEqual(at(300, 250) * (1 - 1e-9));
      }),
      seeded(150),
    );
  });
});

describe('a follower', () => {
  it('is a non-inverting stage of gain 1, whatever its gain resistance', () => {
    const followers = conditionsAround(fc.oneof(resistiveSources, reactiveSources)).map((conditions) => ({
      ...conditions,
      stage: { topology: 'non-inverting' as const, gain: 1 },
    }));
    fc.assert(
      fc.property(followers, decades(1, 1e6), amplifiers, (follower, gainResistance, amplifier) => {
        const nonInverting: OperatingConditions = {
          ...follower,
          stage: { ...follower.stage, gainResistance },
        };
        expect(evaluateStage(nonInverting, amplifier)).toEqual(evaluateStage(follower, amplifier));
        const barely: OperatingConditions = {
          ...follower,
          stage: { topology: 'non-inverting', gain: 1 + 1e-9, gainResistance: 1 },
        };
        const limit = evaluateStage(barely, amplifier).inputNoiseRms;
        expect(limit / evaluateStage(follower, amplifier).inputNoiseRms).toBeCloseTo(1, 6);
      }),
      seeded(100),
    );
  });
});

describe('the scaling laws', () => {
  const voltageStage = conditionsAround(fc.oneof(resistiveSources, reactiveSources));

  it('double the contribution of a generator that is doubled, and no other', () => {
    fc.assert(
      fc.property(anyStage, amplifiers, (conditions, amplifier) => {
        const once = evaluateStage(conditions, { ...amplifier, currentNoise: 1e-13 }).contributions;
        const twice = evaluateStage(conditions, {
          ...amplifier,
          voltageNoise: 2 * amplifier.voltageNoise,
          currentNoise: 2e-13,
        }).contributions;
        const doubled = ['amplifierVoltage', 'amplifierCurrentSource', 'amplifierCurrentFeedback'];
        for (const key of CONTRIBUTORS) {
          const times = doubled.includes(key) ? 2 : 1;
          expect(Math.abs(twice[key] - times * once[key]), key).toBeLessThanOrEqual(1e-9 * twice[key]);
        }
      }),
      seeded(100),
    );
  });

  it('scale the source with the root of its temperature', () => {
    fc.assert(
      fc.property(voltageStage, amplifiers, (conditions, amplifier) => {
        const at = (temperature: number) =>
          evaluateStage({ ...conditions, source: { ...conditions.source, temperature } }, amplifier)
            .contributions.source;
        expect(at(400) / at(100)).toBeCloseTo(2, 3);
      }),
      seeded(100),
    );
  });

  it('keep every figure where all impedances grow and all currents fall alike', () => {
    fc.assert(
      fc.property(
        conditionsAround(reactiveSources),
        amplifiers,
        decades(0.1, 10),
        (conditions, amplifier, k) => {
          const cold = { ...conditions, ambientTemperature: 300, amplifierTemperatureModel: 'none' as const };
          const known = { ...amplifier, currentNoise: 1e-12, inputCapacitance: 1e-12 };
          const { source, stage } = cold;
          const scaled: OperatingConditions = {
            ...cold,
            ambientTemperature: 300 / k,
            source: {
              resistance: source.resistance * k,
              inductance: source.inductance * k,
              capacitance: source.capacitance / k,
            },
            stage: {
              ...stage,
              ...(stage.gainResistance && { gainResistance: stage.gainResistance * k }),
              ...(stage.loadResistance && { loadResistance: stage.loadResistance * k }),
              ...(stage.biasResistance && { biasResistance: stage.biasResistance * k }),
              ...(stage.topology === 'instrumentation' && {
                differenceResistance: (stage.differenceResistance ?? USUAL_DIFFERENCE_RESISTANCE) * k,
              }),
            },
          };
          const figures = evaluateStage(cold, known);
          const same = evaluateStage(scaled, {
            ...known,
            currentNoise: 1e-12 / k,
            inputCapacitance: 1e-12 / k,
          });
          expect(same.inputNoiseRms / figures.inputNoiseRms).toBeCloseTo(1, 4);
          expect(same.signalGain / figures.signalGain).toBeCloseTo(1, 6);
        },
      ),
      seeded(100),
    );
  });
});

describe('noise figure and distance to the floor', () => {
  it('are never below 0 dB', () => {
    fc.assert(
      fc.property(anyStage, amplifiers, (conditions, amplifier) => {
        const { noiseFigure, aboveFloor } = evaluateStage(conditions, amplifier);
        expect(noiseFigure).toBeGreaterThan(-1e-9);
        expect(aboveFloor).toBeGreaterThan(-1e-9);
      }),
      seeded(150),
    );
  });

  it('are null exactly where the source makes no noise', () => {
    const silent = conditionsAround(reactiveSources).map((conditions) => ({
      ...conditions,
      source: { resistance: 0, inductance: 0, capacitance: conditions.source.capacitance },
    }));
    fc.assert(
      fc.property(silent, amplifiers, (conditions, amplifier) => {
        expect(sourceFloor(conditions)).toEqual({ inputNoiseDensity: 0, inputNoiseRms: 0 });
        expect(evaluateStage(conditions, amplifier)).toMatchObject({ noiseFigure: null, aboveFloor: null });
      }),
      seeded(50),
    );
    fc.assert(
      fc.property(conditionsAround(detectors), amplifiers, (conditions, amplifier) => {
        const { noiseFigure, aboveFloor } = evaluateStage(conditions, amplifier);
        expect([noiseFigure, aboveFloor]).not.toContain(null);
      }),
      seeded(50),
    );
  });
});
