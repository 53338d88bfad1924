import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import { TOPOLOGIES, type BandConditions, type OperatingConditions } from '../../src/conditions/index.js';
import {
  CONTRIBUTORS,
  densitySpectrum,
  evaluateStage,
  shotPowerDensity,
  STANDARD_NOISE_TEMPERATURE,
  thermalPowerDensity,
  type Contributor,
} from '../../src/noise/index.js';
import { stageModel } from '../../src/noise/stage/stageModel.js';
import {
  amplifiers,
  conditionsAround,
  detectors,
  reactiveSources,
  resistiveSources,
} from '../support/arbitraries.js';
import type { KnownAmplifier } from '../support/nodalAnalysis.js';
import { simulatedStage } from './circuits.js';
import { simulateNoise, type Sweep, type Vectors } from './ngspice.js';

const STAGES_EACH = 10;
const PER_DECADE = 100;
const TOLERANCE = 1e-3;
const DECIBELS = 0.005;
/** The simulator's sweep resolves resonances up to here. */
const SHARPEST = 5;

interface Stage {
  conditions: OperatingConditions;
  amplifier: KnownAmplifier;
}

const known = amplifiers.map((amplifier): KnownAmplifier => ({
  voltageNoise: amplifier.voltageNoise,
  voltageNoiseCorner: amplifier.voltageNoiseCorner ?? 0,
  currentNoise: amplifier.currentNoise ?? 0,
  currentNoiseCorner: amplifier.currentNoiseCorner ?? 0,
  gainBandwidth: amplifier.gainBandwidth,
  inputCapacitance: amplifier.inputCapacitance ?? 0,
}));

/** A band whose ends and reference are frequencies of the sweep, and a source at a temperature of its own. */
const stages: fc.Arbitrary<Stage> = fc
  .record({
    conditions: conditionsAround(fc.oneof(resistiveSources, reactiveSources, detectors)),
    amplifier: known,
    steps: fc.integer({ min: 30, max: 2 * PER_DECADE }),
    place: fc.double({ min: 0, max: 1, noNaN: true }),
    temperature: fc.option(fc.double({ min: 4, max: 400, noNaN: true }), { nil: undefined }),
  })
  .map(({ conditions, amplifier, steps, place, temperature }) => ({
    amplifier,
    conditions: {
      ...conditions,
      source: { ...conditions.source, temperature },
      band: { ...conditions.band, upper: step(conditions.band.lower, 2 * steps) },
      referenceFrequency: step(conditions.band.lower, Math.round(2 * steps * place)),
      amplifierTemperatureModel: 'none' as const,
    },
  }))
  .filter(({ conditions, amplifier }) => {
    const { gainBandwidth, inputCapacitance } = amplifier;
    const model = stageModel(conditions);
    // The noise that rises beyond a first-order low-pass goes on further than the sweep.
    const mayRise = !model.resistive || inputCapacitance > 0;
    return (
      model.quality(gainBandwidth ?? Infinity, inputCapacitance) < SHARPEST &&
      !(conditions.band.lowPassOrder === 1 && mayRise)
    );
  });

function step(from: number, steps: number): number {
  return from * 10 ** (steps / PER_DECADE);
}

const all = TOPOLOGIES.flatMap((topology) =>
  fc.sample(
    stages.filter(({ conditions }) => conditions.stage.topology === topology),
    { seed: 1928, numRuns: STAGES_EACH },
  ),
);

/** Over a low-pass's tail, until what lies beyond counts for less than 0.01 %. */
function sweepOf({ lower, upper, lowPassOrder }: BandConditions): Sweep {
  const tail = [0, 5, 4, 3][Math.min(lowPassOrder, 3)];
  return { from: lower, to: upper * 10 ** tail, perDecade: PER_DECADE };
}

/** What the simulator says of a stage. */
class Simulation {
  private readonly frequency: Float64Array;
  private readonly gain2: Float64Array;
  private readonly powers: Record<Contributor, Float64Array>;

  constructor(
    private readonly stage: Stage,
    vectors: Vectors,
  ) {
    this.frequency = vectors.get('frequency')!;
    const whole = vectors.get('onoise_spectrum')!;
    this.gain2 = whole.map((power, k) => power / vectors.get('inoise_spectrum')![k]);
    const { generators } = simulatedStage(stage.conditions, stage.amplifier).netlist;
    const empty = () => new Float64Array(this.frequency.length);
    this.powers = Object.fromEntries(CONTRIBUTORS.map((key) => [key, empty()])) as typeof this.powers;
    for (const { vector, contributor, scale } of generators)
      vectors.get(vector)!.forEach((power, k) => (this.powers[contributor][k] += scale * power));
  }

  /** Each contributor's density squared, referred to the source, at a frequency of the sweep. */
  at(k: number) {
    return {
      frequency: this.frequency[k],
      powers: CONTRIBUTORS.map((key) => this.powers[key][k] / this.gain2[k]),
    };
  }

  /** Places of the sweep inside the band, every tenth. */
  places(): number[] {
    const { upper } = this.stage.conditions.band;
    return [...this.frequency.keys()].filter((k) => k % 10 === 0 && this.frequency[k] <= upper * 1.0001);
  }

  figures() {
    const { referenceFrequency, source, stage } = this.stage.conditions;
    const reference = this.frequency.findIndex((f) => Math.abs(f / referenceFrequency - 1) < 1e-6);
    const gain2 = this.gain2[reference];
    const spot = sum(this.at(reference).powers);
    const integrals = CONTRIBUTORS.map((key) => this.integrate(this.powers[key]));
    const output2 = sum(integrals);
    const thermal = thermalPowerDensity(STANDARD_NOISE_TEMPERATURE);
    const standard =
      stage.topology === 'transimpedance'
        ? thermal / source.resistance + shotPowerDensity(source.directCurrent ?? 0)
        : thermal * source.resistance;
    return {
      signalGain: Math.sqrt(gain2),
      inputNoiseDensity: Math.sqrt(spot),
      outputNoiseRms: Math.sqrt(output2),
      inputNoiseRms: Math.sqrt(output2 / gain2),
      contributions: integrals.map((power) => Math.sqrt(power / gain2)),
      noiseFigure: 10 * Math.log10(1 + (spot - this.powers.source[reference] / gain2) / standard),
      aboveFloor: 10 * Math.log10(output2 / integrals[CONTRIBUTORS.indexOf('source')]),
    };
  }

  /** Simpson's rule in ln f, through the low-pass; the sweep has an even number of steps. */
  private integrate(density: Float64Array): number {
    const { upper, lowPassOrder } = this.stage.conditions.band;
    const end = this.frequency.length - 1;
    const length = Math.LN10 / PER_DECADE;
    return density.reduce((total, power, k) => {
      const f = this.frequency[k];
      const filter = lowPassOrder === 0 ? 1 : 1 / (1 + (f / upper) ** (2 * lowPassOrder));
      const weight = k === 0 || k === end ? 1 : k % 2 === 1 ? 4 : 2;
      return total + (weight / 3) * length * f * filter * power;
    }, 0);
  }
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

describe(`${all.length} random stages in the circuit simulator ngspice`, () => {
  let simulations: Simulation[];

  beforeAll(async () => {
    const jobs = all.map(({ conditions, amplifier }, n) => {
      const { netlist, signal } = simulatedStage(conditions, amplifier);
      return { circuit: netlist.text(`stage ${n}`), signal, sweep: sweepOf(conditions.band) };
    });
    simulations = (await simulateNoise(jobs)).map((vectors, n) => new Simulation(all[n], vectors));
  });

  const cases = all.map((stage, n) => [stage.conditions.stage.topology, n] as const);

  it.each(cases)('have the same density by contributor at many frequencies: %s, stage %i', (_, n) => {
    const { conditions, amplifier } = all[n];
    const expected = simulations[n].places().map((k) => simulations[n].at(k));
    expect(expected.length).toBeGreaterThan(5);
    const own = densitySpectrum(
      conditions,
      amplifier,
      expected.map(({ frequency }) => frequency),
    );
    own.forEach(({ contributions, inputNoiseDensity }, k) => {
      const { powers, frequency } = expected[k];
      const total = Math.sqrt(sum(powers));
      expect(Math.abs(inputNoiseDensity / total - 1), `${frequency} Hz`).toBeLessThan(TOLERANCE);
      CONTRIBUTORS.forEach((contributor, c) => {
        const difference = contributions[contributor] - Math.sqrt(powers[c]);
        const allowed = TOLERANCE * Math.sqrt(powers[c]) + 1e-9 * total;
        expect(Math.abs(difference), `${contributor} at ${frequency} Hz`).toBeLessThanOrEqual(allowed);
      });
    });
  });

  it.each(cases)('have the same figures over the band: %s, stage %i', (_, n) => {
    const own = evaluateStage(all[n].conditions, all[n].amplifier);
    const expected = simulations[n].figures();
    for (const key of ['signalGain', 'inputNoiseDensity', 'outputNoiseRms', 'inputNoiseRms'] as const)
      expect(Math.abs(own[key] / expected[key] - 1), key).toBeLessThan(TOLERANCE);
    CONTRIBUTORS.forEach((contributor, c) => {
      const difference = own.contributions[contributor] - expected.contributions[c];
      const allowed = TOLERANCE * expected.contributions[c] + 1e-9 * expected.inputNoiseRms;
      expect(Math.abs(difference), contributor).toBeLessThanOrEqual(allowed);
    });
    expect(Math.abs(own.noiseFigure! - expected.noiseFigure)).toBeLessThan(DECIBELS);
    expect(Math.abs(own.aboveFloor! - expected.aboveFloor)).toBeLessThan(DECIBELS);
  });
});
