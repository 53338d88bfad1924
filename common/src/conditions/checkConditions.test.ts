import { describe, expect, it } from 'vitest';
import { requestWith } from '../../test/support/stages.js';
import { describeBounds, type QuantityField } from '../parts/index.js';
import { checkConditions } from './checkConditions.js';
import { CONDITION_FIELDS, type ConditionFieldPath } from './conditionFields.js';
import type { RankingRequest } from './conditions.js';

const FIELDS = Object.keys(CONDITION_FIELDS) as ConditionFieldPath[];

const INVERTING = { topology: 'inverting', gain: 10, gainResistance: 1000 } as const;
const TRANSIMPEDANCE = { topology: 'transimpedance', gain: undefined, feedbackResistance: 1e6 } as const;

/** A request in which the field at a path holds a value that its type may not allow. */
function withValue(path: string, value: unknown): RankingRequest {
  const request = requestWith({}, { filter: {}, target: {} });
  const keys = path.split('.');
  let place = request as unknown as Record<string, unknown>;
  for (const key of keys.slice(0, -1)) {
    place[key] ??= {};
    place = place[key] as Record<string, unknown>;
  }
  place[keys.at(-1)!] = value;
  return request;
}

describe('checkConditions', () => {
  it.each<[string, RankingRequest]>([
    ['a follower', requestWith()],
    [
      'a non-inverting stage',
      requestWith({ stage: { gain: 100, gainResistance: 10, loadResistance: 47e3 } }),
    ],
    ['an inverting stage', requestWith({ stage: { ...INVERTING, biasResistance: 0 } })],
    ['a transimpedance stage', requestWith({ stage: { ...TRANSIMPEDANCE, feedbackCapacitance: 'auto' } })],
    ['a difference stage', requestWith({ stage: { topology: 'difference', gain: 1, gainResistance: 0 } })],
    ['two followers before a difference', requestWith({ stage: { topology: 'instrumentation' } })],
    [
      'an instrumentation stage',
      requestWith({
        stage: {
          topology: 'instrumentation',
          gain: 100,
          gainResistance: 100,
          loadResistance: 1e6,
          differenceResistance: 1000,
        },
      }),
    ],
    ['a source without resistance', requestWith({ source: { resistance: 0 } })],
    [
      'a coil without resistance, with a load',
      requestWith({
        source: { resistance: 0, inductance: 1 },
        stage: { loadResistance: 47e3 },
      }),
    ],
    ['a reference frequency on the edge of the band', requestWith({ referenceFrequency: 20e3 })],
    ['a supply of one voltage', requestWith({}, { filter: { supply: { minimum: 5, maximum: 5 } } })],
    ['a target and a quantity', requestWith({}, { target: { inputNoiseRms: 1e-6 }, quantity: 250 })],
  ])('has nothing against %s', (_name, request) => {
    expect(checkConditions(request)).toEqual([]);
  });

  it.each<[string, RankingRequest, string, string]>([
    [
      'a non-inverting stage without a gain',
      requestWith({ stage: { gain: undefined } }),
      'stage.gain',
      'a non-inverting stage needs this value',
    ],
    [
      'an inverting stage without a gain resistance',
      requestWith({ stage: { topology: 'inverting', gain: 10 } }),
      'stage.gainResistance',
      'an inverting stage needs this value',
    ],
    [
      'a difference stage with a bias resistance',
      requestWith({
        stage: { topology: 'difference', gain: 10, gainResistance: 1000, biasResistance: 1000 },
      }),
      'stage.biasResistance',
      'a difference stage doesn’t have this: leave it out',
    ],
    [
      'a difference stage without any resistance before its inputs',
      requestWith({
        source: { resistance: 0 },
        stage: { topology: 'difference', gain: 10, gainResistance: 0 },
      }),
      'stage.gainResistance',
      'gain resistance and source resistance can’t both be 0 Ω',
    ],
    [
      'an instrumentation stage that loses',
      requestWith({ stage: { topology: 'instrumentation', gain: 0.5 } }),
      'stage.gain',
      'gain: an instrumentation stage has a gain of 1 or more',
    ],
    [
      'an instrumentation stage that amplifies without a gain resistance',
      requestWith({ stage: { topology: 'instrumentation', gain: 2 } }),
      'stage.gainResistance',
      'gain resistance: a value above 0 Ω is needed where the gain is above 1',
    ],
    [
      'a difference resistance in a non-inverting stage',
      requestWith({ stage: { differenceResistance: 1000 } }),
      'stage.differenceResistance',
      'a non-inverting stage doesn’t have this: leave it out',
    ],
    [
      'a transimpedance stage without a feedback resistance',
      requestWith({ stage: { topology: 'transimpedance', gain: undefined } }),
      'stage.feedbackResistance',
      'a transimpedance stage needs this value',
    ],
    [
      'a gain in a transimpedance stage',
      requestWith({ stage: { ...TRANSIMPEDANCE, gain: 10 } }),
      'stage.gain',
      'a transimpedance stage doesn’t have this: leave it out',
    ],
    [
      'a load resistance in an inverting stage',
      requestWith({ stage: { ...INVERTING, loadResistance: 1e4 } }),
      'stage.loadResistance',
      'an inverting stage doesn’t have this: leave it out',
    ],
    [
      'a feedback capacitance in a non-inverting stage',
      requestWith({ stage: { feedbackCapacitance: 1e-12 } }),
      'stage.feedbackCapacitance',
      'a non-inverting stage doesn’t have this: leave it out',
    ],
    [
      'a non-inverting gain below 1',
      requestWith({ stage: { gain: 0.5, gainResistance: 100 } }),
      'stage.gain',
      'gain: a non-inverting stage has a gain of 1 or more',
    ],
    [
      'a non-inverting gain above 1 without a gain resistance',
      requestWith({ stage: { gain: 2 } }),
      'stage.gainResistance',
      'gain resistance: a value above 0 Ω is needed where the gain is above 1',
    ],
    [
      'a non-inverting gain above 1 on 0 Ω',
      requestWith({ stage: { gain: 2, gainResistance: 0 } }),
      'stage.gainResistance',
      'gain resistance: a value above 0 Ω is needed where the gain is above 1',
    ],
    [
      'a coil without any loss',
      requestWith({ source: { resistance: 0, inductance: 1 } }),
      'source.resistance',
      'source resistance: a coil has one above 0 Ω, or give it a load resistance',
    ],
    [
      'an inverting stage on 0 Ω in all',
      requestWith({ source: { resistance: 0 }, stage: { ...INVERTING, gainResistance: 0 } }),
      'stage.gainResistance',
      'gain resistance and source resistance can’t both be 0 Ω',
    ],
    [
      'a current source with 0 Ω across it',
      requestWith({ source: { resistance: 0 }, stage: TRANSIMPEDANCE }),
      'source.resistance',
      'source resistance: a current source needs a resistance above 0 Ω across it',
    ],
    [
      'a current source with an inductance',
      requestWith({ source: { inductance: 1 }, stage: TRANSIMPEDANCE }),
      'source.inductance',
      'source inductance: a current source has none, set it to 0 H',
    ],
    [
      'a detector’s current without a transimpedance stage',
      requestWith({ source: { directCurrent: 1e-9 } }),
      'source.directCurrent',
      'only a transimpedance stage has a detector’s direct current: leave it out',
    ],
    [
      'a band that ends where it begins',
      requestWith({ band: { lower: 100, upper: 100 } }),
      'band.upper',
      'upper band limit: a frequency above the lower limit was expected',
    ],
    [
      'a reference frequency below the band',
      requestWith({ referenceFrequency: 19 }),
      'referenceFrequency',
      'reference frequency: a frequency inside the band was expected',
    ],
    [
      'a reference frequency above the band',
      requestWith({ referenceFrequency: 21e3 }),
      'referenceFrequency',
      'reference frequency: a frequency inside the band was expected',
    ],
  ])('refuses %s at its field', (_name, request, field, message) => {
    expect(checkConditions(request)).toEqual([{ field: `conditions.${field}`, message }]);
  });

  it('refuses a supply that ends below where it begins', () => {
    expect(checkConditions(requestWith({}, { filter: { supply: { minimum: 5, maximum: 3 } } }))).toEqual([
      { field: 'filter.supply.maximum', message: 'supply, highest: not below the lowest supply' },
    ]);
  });

  it('names every field that is wrong at once', () => {
    const request = requestWith({
      source: { resistance: 0, inductance: 1 },
      stage: { ...TRANSIMPEDANCE, gain: 2 },
      band: { lower: 100, upper: 10 },
    });
    expect(checkConditions(request).map(({ field }) => field)).toEqual([
      'conditions.stage.gain',
      'conditions.source.resistance',
      'conditions.source.inductance',
      'conditions.band.upper',
    ]);
  });

  describe.each(FIELDS)('at %s', (field) => {
    const definition: QuantityField = CONDITION_FIELDS[field];
    const { label, bounds } = definition;
    const outOfBounds = { field, message: `${label}: ${describeBounds(definition)} was expected` };

    it.each([1e300, (bounds.from ?? 0) - 1, -1e300])('refuses %d', (value) => {
      expect(checkConditions(withValue(field, value))).toEqual([outOfBounds]);
    });

    it.each([NaN, Infinity, -Infinity, null, '5', {}])('refuses %s as no number', (value) => {
      expect(checkConditions(withValue(field, value))).toEqual([
        { field, message: `${label}: a number was expected` },
      ]);
    });

    it('allows what lies on its bounds', () => {
      for (const value of [bounds.from, bounds.least ?? bounds.from, bounds.to])
        expect(checkConditions(withValue(field, value))).not.toContainEqual(outOfBounds);
    });
  });

  it.each(FIELDS.filter((field) => 'least' in CONDITION_FIELDS[field].bounds))(
    'takes 0 at %s as none, but refuses 1e-300, which nobody can mean',
    (field) => {
      const messages = (value: number) =>
        checkConditions(withValue(field, value)).map(({ message }) => message);
      expect(messages(1e-300)).toEqual([expect.stringMatching(/: 0\s\S+ or a value from .+ was expected$/)]);
      expect(messages(0).filter((message) => message.includes('or a value from'))).toEqual([]);
    },
  );

  it('takes “auto” for the feedback capacitance only', () => {
    expect(checkConditions(withValue('conditions.source.capacitance', 'auto'))).toEqual([
      { field: 'conditions.source.capacitance', message: 'source capacitance: a number was expected' },
    ]);
  });

  it.each(['conditions.band.lowPassOrder', 'filter.channels', 'quantity'])(
    'refuses a fraction at %s',
    (field) => {
      expect(checkConditions(withValue(field, 1.5))).toEqual([
        { field, message: expect.stringMatching(/: a whole number was expected$/) },
      ]);
    },
  );

  it('says what the bounds are', () => {
    expect(checkConditions(withValue('conditions.band.lowPassOrder', 11))).toEqual([
      {
        field: 'conditions.band.lowPassOrder',
        message: 'low-pass order: a value from 0 to 10 was expected',
      },
    ]);
  });
});
