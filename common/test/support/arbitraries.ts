import fc from 'fast-check';
import type { BandConditions, OperatingConditions, StageConditions } from '../../src/conditions/index.js';
import { INPUT_TYPES, ORIGINS, type Amplifier } from '../../src/parts/index.js';
import type { LibraryPart } from './stages.js';

/** The same examples in every run. */
export const seeded = (numRuns: number) => ({ seed: 1918, numRuns });

/** A number spread evenly over its decades. */
export function decades(from: number, to: number): fc.Arbitrary<number> {
  return fc
    .double({ min: Math.log(from), max: Math.log(to), noNaN: true })
    .map((x) => Math.min(to, Math.max(from, Math.exp(x))));
}

const orZero = (value: fc.Arbitrary<number>) => fc.oneof(fc.constant(0), value);
const orNone = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined });
const orUnknown = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: null });

export const bands: fc.Arbitrary<BandConditions> = fc
  .tuple(decades(1e-2, 1e4), decades(2, 1e5), fc.integer({ min: 0, max: 6 }))
  .map(([lower, ratio, lowPassOrder]) => ({ lower, upper: lower * ratio, lowPassOrder }));

/** Gain and resistors of a stage on a voltage source. */
const voltageStages: fc.Arbitrary<StageConditions> = fc.oneof(
  fc.constant<StageConditions>({ topology: 'non-inverting', gain: 1 }),
  fc.record({
    topology: fc.constant('non-inverting' as const),
    gain: decades(1, 1e3),
    gainResistance: decades(1, 1e4),
    loadResistance: orNone(decades(1e3, 1e7)),
  }),
  fc.record({
    topology: fc.constant('inverting' as const),
    gain: decades(0.1, 1e3),
    gainResistance: decades(1, 1e5),
    biasResistance: orZero(decades(1, 1e5)),
  }),
  fc.record({
    topology: fc.constant('difference' as const),
    gain: decades(0.1, 1e3),
    gainResistance: decades(1, 1e5),
  }),
  fc.record({
    topology: fc.constant('instrumentation' as const),
    gain: decades(1, 1e3),
    gainResistance: decades(1, 1e4),
    loadResistance: orNone(decades(1e3, 1e7)),
    differenceResistance: orNone(decades(1e3, 1e5)),
  }),
);

const transimpedanceStages: fc.Arbitrary<StageConditions> = fc.record({
  topology: fc.constant('transimpedance' as const),
  feedbackResistance: decades(1e3, 1e9),
  feedbackCapacitance: fc.oneof(fc.constantFrom(0, 'auto' as const), decades(1e-14, 1e-10)),
});

interface Everything {
  source: OperatingConditions['source'];
  stage: StageConditions;
}

export const resistiveSources: fc.Arbitrary<Everything> = fc.record({
  source: fc.record({
    resistance: decades(1, 1e9),
    inductance: fc.constant(0),
    capacitance: fc.constant(0),
  }),
  stage: voltageStages,
});

export const reactiveSources: fc.Arbitrary<Everything> = fc.record({
  source: fc.record({
    resistance: decades(1, 1e6),
    inductance: orZero(decades(1e-7, 10)),
    capacitance: orZero(decades(1e-12, 1e-6)),
  }),
  stage: voltageStages,
});

export const detectors: fc.Arbitrary<Everything> = fc.record({
  source: fc.record({
    resistance: decades(1e3, 1e10),
    inductance: fc.constant(0),
    capacitance: orZero(decades(1e-12, 1e-7)),
    directCurrent: orZero(decades(1e-12, 1e-3)),
  }),
  stage: transimpedanceStages,
});

/** Usual conditions around a source and its stage. */
export function conditionsAround(everything: fc.Arbitrary<Everything>): fc.Arbitrary<OperatingConditions> {
  return fc
    .record({
      everything,
      band: bands,
      place: fc.double({ min: 0, max: 1, noNaN: true }),
      ambientTemperature: fc.double({ min: 77, max: 420, noNaN: true }),
      amplifierTemperatureModel: fc.constantFrom('none' as const, 'estimated' as const),
    })
    .map(({ everything, band, place, ...rest }) => ({
      ...everything,
      ...rest,
      band,
      referenceFrequency: Math.min(band.upper, band.lower * (band.upper / band.lower) ** place),
      bandwidthMargin: 0,
    }));
}

export const anyStage = conditionsAround(fc.oneof(resistiveSources, reactiveSources, detectors));

/** Op-amps as they are made, with the gaps that lists have. */
export const amplifiers: fc.Arbitrary<Amplifier> = fc.record({
  inputType: orUnknown(fc.constantFrom(...INPUT_TYPES)),
  channels: fc.integer({ min: 1, max: 4 }),
  voltageNoise: decades(8e-10, 1e-7),
  voltageNoiseCorner: orUnknown(orZero(decades(0.1, 1e4))),
  currentNoise: orUnknown(decades(1e-16, 1e-11)),
  currentNoiseCorner: orUnknown(orZero(decades(0.1, 1e4))),
  gainBandwidth: orUnknown(decades(1e5, 1e10)),
  inputCapacitance: orUnknown(orZero(decades(1e-13, 3e-11))),
  inputBiasCurrent: orUnknown(decades(1e-14, 1e-6)),
  minimumStableGain: orUnknown(fc.constantFrom(1, 5, 10)),
  supplyMinimum: orUnknown(fc.constantFrom(1.8, 2.7, 5)),
  supplyMaximum: orUnknown(fc.constantFrom(5.5, 12, 36)),
  supplyCurrent: orUnknown(decades(1e-6, 1e-1)),
});

export const libraryParts: fc.Arbitrary<LibraryPart> = fc.record({
  amplifier: amplifiers,
  origins: fc.record({
    voltageNoise: fc.constantFrom(...ORIGINS),
    voltageNoiseCorner: fc.constantFrom(...ORIGINS),
    currentNoise: fc.constantFrom(...ORIGINS),
    currentNoiseCorner: fc.constantFrom(...ORIGINS),
  }),
  lifecycle: fc.constantFrom('active' as const, 'obsolete' as const),
  name: fc.constantFrom('alder low noise', 'birch precision', 'cedar fast'),
});
