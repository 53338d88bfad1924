import { describe, expect, it } from 'vitest';
import { checkResistorConditions } from './checkResistorConditions.js';
import type { ResistorConditions } from './resistorConditions.js';

const conditions: ResistorConditions = {
  resistance: 1000,
  resistanceTolerance: 0.02,
  dcVoltage: 2.5,
  ambientTemperature: 298.15,
  band: { lower: 0.1, upper: 1000, lowPassOrder: 0 },
};

describe('checkResistorConditions', () => {
  it.each<Partial<ResistorConditions>>([
    {},
    { dcVoltage: -48 },
    { resistanceTolerance: 0 },
    { band: { lower: 1, upper: 1.5, lowPassOrder: 10 } },
  ])('has nothing against %j', (change) => {
    expect(checkResistorConditions({ conditions: { ...conditions, ...change }, quantity: 1 })).toEqual([]);
  });

  it.each<[string, Partial<ResistorConditions>, RegExp]>([
    ['resistance', { resistance: 0 }, /^resistance: a value from 1\snΩ to 10\sTΩ was expected$/],
    ['resistance', { resistance: NaN }, /^resistance: a number was expected$/],
    ['resistanceTolerance', { resistanceTolerance: 0.6 }, /^value window: a value from 0\s% to 50\s% /],
    ['dcVoltage', { dcVoltage: 1e7 }, /^direct voltage: /],
    ['ambientTemperature', { ambientTemperature: 0 }, /^ambient temperature: /],
    [
      'band.lowPassOrder',
      { band: { lower: 1, upper: 2, lowPassOrder: 0.5 } },
      /a whole number was expected$/,
    ],
    ['band.upper', { band: { lower: 5, upper: 5, lowPassOrder: 0 } }, /above the lower limit was expected$/],
  ])('refuses a wrong %s at its field: %j', (field, change, message) => {
    expect(checkResistorConditions({ conditions: { ...conditions, ...change } })).toEqual([
      { field: `conditions.${field}`, message: expect.stringMatching(message) },
    ]);
  });
});
