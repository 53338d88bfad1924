import { describe, expect, it } from 'vitest';
import { completenessOf, gapFields, gapsOf } from './completeness.js';
import { OP_AMP_CATALOGUE } from './opAmpCatalogue.js';
import { canBeUnknown } from './parameter.js';
import type { ListedFields } from './partCatalogue.js';
import { RESISTOR_CATALOGUE } from './resistorCatalogue.js';

const known = ({ choice, parameters }: ListedFields) =>
  Object.fromEntries([choice, ...parameters].map(({ key }) => [key, 1]));

describe.each([OP_AMP_CATALOGUE, RESISTOR_CATALOGUE])('the completeness of $kind parts', (fields) => {
  it('counts just what can be unknown, in falling order of weight', () => {
    const { choice, parameters } = fields as ListedFields;
    const unknowable = [choice.key, ...parameters.filter(canBeUnknown).map(({ key }) => key)];
    const gaps = gapFields(fields);
    expect(gaps.map(({ key }) => key).sort()).toEqual(unknowable.sort());
    const weights = gaps.map(({ weight }) => weight);
    expect(weights).toEqual([...weights].sort((one, other) => other - one));
    expect(Math.min(...weights)).toBeGreaterThan(0);
  });

  it('is whole where all is known and nothing where nothing is', () => {
    expect(completenessOf(fields, known(fields))).toBe(1);
    const nothing = Object.fromEntries(Object.keys(known(fields)).map((key) => [key, null]));
    expect(completenessOf(fields, nothing)).toBe(0);
  });
});

describe('the gaps of a part', () => {
  it('are those that the ranking misses most first, and a figure of 0 is none', () => {
    const figures = {
      ...known(OP_AMP_CATALOGUE),
      supplyCurrent: null,
      currentNoise: null,
      inputCapacitance: 0,
    };
    expect(gapsOf(OP_AMP_CATALOGUE, figures).map(({ key }) => key)).toEqual([
      'currentNoise',
      'supplyCurrent',
    ]);
    expect(completenessOf(OP_AMP_CATALOGUE, figures)).toBeCloseTo(1 - 9 / 37, 12);
  });
});
