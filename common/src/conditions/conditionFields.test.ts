import { describe, expect, it } from 'vitest';
import { QUANTITIES } from '../units/index.js';
import { CONDITION_FIELDS } from './conditionFields.js';
import { RESISTOR_CONDITION_FIELDS } from './resistorConditionFields.js';

describe.each([
  ['CONDITION_FIELDS', CONDITION_FIELDS],
  ['RESISTOR_CONDITION_FIELDS', RESISTOR_CONDITION_FIELDS],
])('%s', (_name, fields) => {
  it.each(Object.entries(fields))('says of %s what forms and documentation need', (_path, field) => {
    expect(Object.keys(QUANTITIES)).toContain(field.kind);
    expect(field.bounds.from).toBeLessThan(field.bounds.to);
    expect(field.help).toMatch(/^[A-Z0].*\.$/);
    expect(field.label).not.toBe('');
  });
});
