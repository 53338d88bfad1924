import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  checkConditions,
  CONDITION_FIELDS,
  type ConditionFieldPath,
  type OperatingConditions,
  type StageConditions,
} from '../../src/conditions/index.js';
import { evaluateStage, rankAmplifiers, sourceFloor } from '../../src/noise/index.js';
import { INPUT_TYPES, OP_AMP_PARAMETERS, type Amplifier, type QuantityField } from '../../src/parts/index.js';
import { decades, seeded } from '../support/arbitraries.js';
import { amplifierWith, conditionsWith, libraryOf } from '../support/stages.js';

/** A value anywhere in a field's bounds, its ends often. */
function within({ bounds, integer }: QuantityField): fc.Arbitrary<number> {
  const from = bounds.from ?? 0;
  if (integer) return fc.integer({ min: from, max: bounds.to });
  const least = bounds.least ?? (from > 0 ? from : bounds.to * 1e-12);
  const ends = bounds.above === undefined ? [from, least, bounds.to] : [least, bounds.to];
  return fc.oneof(fc.constantFrom(...ends), decades(least, bounds.to));
}

const at = (path: string) => within(CONDITION_FIELDS[`conditions.${path}` as ConditionFieldPath]);
const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined });

const stages: fc.Arbitrary<StageConditions> = fc.oneof(
  fc.record({
    topology: fc.constant('non-inverting' as const),
    gain: at('stage.gain').map((gain) => Math.max(1, gain)),
    gainResistance: at('stage.gainResistance'),
    loadResistance: maybe(at('stage.loadResistance')),
  }),
  fc.record({
    topology: fc.constant('inverting' as const),
    gain: at('stage.gain'),
    gainResistance: at('stage.gainResistance'),
    biasResistance: maybe(at('stage.biasResistance')),
  }),
  fc.record({
    topology: fc.constant('difference' as const),
    gain: at('stage.gain'),
    gainResistance: at('stage.gainResistance'),
  }),
  fc.record({
    topology: fc.constant('instrumentation' as const),
    gain: at('stage.gain').map((gain) => Math.max(1, gain)),
    gainResistance: at('stage.gainResistance'),
    loadResistance: maybe(at('stage.loadResistance')),
    differenceResistance: maybe(at('stage.differenceResistance')),
  }),
  fc.record({
    topology: fc.constant('transimpedance' as const),
    feedbackResistance: at('stage.feedbackResistance'),
    feedbackCapacitance: maybe(fc.oneof(fc.constant('auto' as const), at('stage.feedbackCapacitance'))),
  }),
);

/** Any conditions that `checkConditions` lets pass. */
const allowedConditions: fc.Arbitrary<OperatingConditions> = fc
  .record({
    source: fc.record({
      resistance: at('source.resistance'),
      inductance: at('source.inductance'),
      capacitance: at('source.capacitance'),
      temperature: maybe(at('source.temperature')),
      directCurrent: maybe(at('source.directCurrent')),
    }),
    ambientTemperature: at('ambientTemperature'),
    ends: fc.tuple(at('band.lower'), at('band.upper')).filter(([a, b]) => a !== b),
    lowPassOrder: at('band.lowPassOrder'),
    stage: stages,
    atUpperEnd: fc.boolean(),
    amplifierTemperatureModel: fc.constantFrom('estimated' as const, 'none' as const),
  })
  .map(({ source, ends, lowPassOrder, atUpperEnd, ...rest }) => {
    const [lower, upper] = ends[0] < ends[1] ? ends : [ends[1], ends[0]];
    const detector = rest.stage.topology === 'transimpedance';
    return {
      ...rest,
      source: detector ? { ...source, inductance: 0 } : { ...source, directCurrent: undefined },
      band: { lower, upper, lowPassOrder },
      referenceFrequency: atUpperEnd ? upper : lower,
      bandwidthMargin: 0,
    };
  })
  .filter((conditions) => checkConditions({ conditions }).length === 0);

/** Any op-amp that can be saved, unknown parameters included. */
const allowedAmplifiers: fc.Arbitrary<Amplifier> = fc
  .record(
    Object.fromEntries(
      OP_AMP_PARAMETERS.map((parameter) => [
        parameter.key,
        'required' in parameter || parameter.key === 'channels'
          ? within(parameter)
          : fc.option(within(parameter), { nil: null }),
      ]),
    ),
  )
  .chain((parameters) =>
    fc
      .constantFrom(null, ...INPUT_TYPES)
      .map((inputType) => ({ ...parameters, inputType }) as unknown as Amplifier),
  );

const figuresThatAreNumbers = (figures: object) =>
  Object.entries(figures).filter((entry): entry is [string, number] => typeof entry[1] === 'number');

describe('over everything that conditions and parts may be', () => {
  it('every figure is finite and none is below zero', () => {
    fc.assert(
      fc.property(allowedConditions, allowedAmplifiers, (conditions, amplifier) => {
        const figures = evaluateStage(conditions, amplifier);
        const all = { ...figures, ...figures.contributions, floor: sourceFloor(conditions).inputNoiseRms };
        for (const [name, value] of figuresThatAreNumbers(all)) {
          expect(Number.isFinite(value), name).toBe(true);
          expect(value, name).toBeGreaterThanOrEqual(-1e-9);
        }
        expect(figures.inputNoiseRms).toBeGreaterThan(0);
        expect(figures.signalGain).toBeGreaterThan(0);
      }),
      seeded(800),
    );
  });

  it('noise figure and distance to the floor are null exactly where the source makes no noise', () => {
    fc.assert(
      fc.property(allowedConditions, allowedAmplifiers, (conditions, amplifier) => {
        const { noiseFigure, aboveFloor, contributions } = evaluateStage(conditions, amplifier);
        const makesNone = conditions.source.resistance === 0;
        expect(noiseFigure === null).toBe(makesNone);
        expect(aboveFloor === null).toBe(contributions.source === 0);
        if (makesNone) expect(contributions.source).toBe(0);
      }),
      seeded(500),
    );
  });

  it('the distance to the floor is finite where a cold source makes hardly any noise at 144 GHz', () => {
    const conditions = conditionsWith({
      source: { resistance: 1, temperature: 0.01 },
      band: { lower: 1.43e11, upper: 1.44e11 },
      referenceFrequency: 1.43e11,
    });
    const amplifier = amplifierWith({ voltageNoise: 1e-3, gainBandwidth: null, inputCapacitance: 0 });
    const { aboveFloor, contributions } = evaluateStage(conditions, amplifier);
    expect(contributions.source).toBeGreaterThan(0);
    expect(aboveFloor).toBeGreaterThan(3083);
    expect(aboveFloor).toBeLessThan(4000);
  });

  it('a part is ranked with finite figures or excluded', () => {
    fc.assert(
      fc.property(
        allowedConditions,
        fc.array(allowedAmplifiers, { maxLength: 4 }),
        (conditions, amplifiers) => {
          const { items, excluded, total } = rankAmplifiers(
            {
              conditions,
              filter: {},
              target: {},
              sort: 'inputNoiseRms',
              descending: false,
              limit: 10,
              offset: 0,
            },
            [libraryOf(amplifiers.map((amplifier) => ({ amplifier })))],
          );
          expect(items.length + excluded.total).toBe(amplifiers.length);
          expect(total).toBe(items.length);
          for (const { figures } of items)
            for (const [name, value] of figuresThatAreNumbers(figures))
              expect(Number.isFinite(value), name).toBe(true);
        },
      ),
      seeded(300),
    );
  });
});
