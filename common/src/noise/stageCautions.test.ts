import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith } from '../../test/support/stages.js';
import type { OperatingConditions } from '../conditions/index.js';
import type { Amplifier } from '../parts/index.js';
import { CAUTION_DETAILS, CAUTION_LABELS, CAUTIONS, type Caution } from './cautions.js';
import { evaluateStage } from './evaluateStage.js';

const AT_25 = { ambientTemperature: 298.15, amplifierTemperatureModel: 'estimated' } as const;
const SUPPLY = { supply: { minimum: 5, maximum: 12 } };

const cautionsOf = (
  amplifier: Partial<Amplifier> = {},
  conditions: OperatingConditions = conditionsWith(AT_25),
) => evaluateStage(conditions, amplifierWith(amplifier), SUPPLY).cautions;

describe('the cautions of a stage', () => {
  it('are none where everything is known at 25 °C', () => expect(cautionsOf()).toEqual([]));

  it.each<[Caution, Partial<Amplifier>]>([
    ['current-noise-unknown', { currentNoise: null }],
    ['corner-unknown', { voltageNoiseCorner: null }],
    ['corner-unknown', { currentNoiseCorner: null }],
    ['bandwidth-unknown', { gainBandwidth: null }],
    ['capacitance-unknown', { inputCapacitance: null }],
    ['stability-unknown', { minimumStableGain: null }],
    ['supply-unknown', { supplyMinimum: null }],
    ['supply-unknown', { supplyMaximum: null }],
  ])('are %s for a part with %o', (caution, amplifier) => {
    expect(cautionsOf(amplifier)).toEqual([caution]);
  });

  it('name the estimate at any temperature but 25 °C, unless parameters count as given', () => {
    expect(cautionsOf({}, conditionsWith({ ...AT_25, ambientTemperature: 300 }))).toEqual([
      'estimated-at-temperature',
    ]);
    expect(cautionsOf({}, conditionsWith({ ambientTemperature: 300 }))).toEqual([]);
  });

  it('name a feedback network that is less than the output is to drive', () => {
    const stage = (gainResistance: number, minimumTotal?: number) =>
      conditionsWith({
        ...AT_25,
        stage: { gain: 10, gainResistance, ...(minimumTotal && { network: { minimumTotal } }) },
      });
    expect(cautionsOf({}, stage(40))).toEqual(['feedback-network-loads-output']);
    expect(cautionsOf({}, stage(51))).toEqual([]);
    expect(cautionsOf({}, stage(51, 1000))).toEqual(['feedback-network-loads-output']);
    expect(cautionsOf({}, stage(40, 300))).toEqual([]);
  });

  it('don’t name an unknown stability where the noise gain is high enough for nearly any op-amp', () => {
    const highGain = conditionsWith({ ...AT_25, stage: { gain: 100, gainResistance: 100 } });
    expect(cautionsOf({ minimumStableGain: null }, highGain)).toEqual([]);
  });

  it('don’t name an unknown supply where no supply is asked for', () => {
    const { cautions } = evaluateStage(conditionsWith(AT_25), amplifierWith({ supplyMinimum: null }));
    expect(cautions).toEqual([]);
  });

  it('name the packages of an instrumentation stage where one doesn’t hold three channels', () => {
    const stage = { topology: 'instrumentation' as const, gain: 20, gainResistance: 1000 };
    const conditions = conditionsWith({ ...AT_25, stage });
    expect(cautionsOf({ channels: 2 }, conditions)).toEqual(['several-packages']);
    expect(cautionsOf({ channels: 4 }, conditions)).toEqual([]);
    expect(cautionsOf({ channels: 4, minimumStableGain: null }, conditions)).toEqual(['stability-unknown']);
  });

  it('name a network of an instrumentation stage that loads an output, before or behind the pair', () => {
    const stage = (gainResistance: number, differenceResistance: number) =>
      conditionsWith({
        ...AT_25,
        stage: { topology: 'instrumentation', gain: 20, gainResistance, differenceResistance },
      });
    expect(cautionsOf({ channels: 4 }, stage(51, 500))).toEqual([]);
    expect(cautionsOf({ channels: 4 }, stage(49, 500))).toEqual(['feedback-network-loads-output']);
    expect(cautionsOf({ channels: 4 }, stage(51, 499))).toEqual(['feedback-network-loads-output']);
  });

  it.each(CAUTIONS)('have words for %s', (caution) => {
    expect(CAUTION_LABELS[caution].length).toBeLessThan(30);
    expect(CAUTION_DETAILS[caution]).toMatch(/^[A-Z].+\.$/);
  });
});
