import { describe, expect, it } from 'vitest';
import { normaliseWord } from './normalise.js';
import { readOpAmpHeading } from './opAmpColumns.js';
import { OP_AMP_PARAMETERS } from './opAmpParameters.js';
import { INPUT_TYPE_FIELD, PART_FIELDS } from './partFields.js';

describe('readOpAmpHeading', () => {
  it.each(OP_AMP_PARAMETERS)('knows $label by label with unit, by key and by synonyms', (parameter) => {
    const { key, label, displayUnit, synonyms } = parameter;
    expect(readOpAmpHeading(`${label} [${displayUnit}]`)).toEqual({
      holds: 'figure',
      key,
      unit: displayUnit,
    });
    for (const name of [label, key, ...synonyms])
      expect(readOpAmpHeading(name)).toEqual({ holds: 'figure', key, unit: '' });
    expect(readOpAmpHeading(`${label} origin`)).toEqual({ holds: 'origin', key });
  });

  it.each([...PART_FIELDS, INPUT_TYPE_FIELD])('knows $label', ({ key, label, synonyms }) => {
    for (const name of [label, key, ...synonyms])
      expect(readOpAmpHeading(name)).toEqual({ holds: 'text', key });
  });

  it.each([
    ['Voltage-Noise (nV/sqrt(Hz))', 'nV/sqrt(Hz)'],
    ['VOLTAGE NOISE[nV/√Hz] ', 'nV/√Hz'],
    ['Rauschspannung [ nV/√Hz ]', 'nV/√Hz'],
  ])('reads the unit of %j', (heading, unit) => {
    expect(readOpAmpHeading(heading)).toEqual({ holds: 'figure', key: 'voltageNoise', unit });
  });

  it.each(['', 'stock', 'note', '???', 'voltage noise, voltage noise'])('passes over %j', (heading) => {
    expect(readOpAmpHeading(heading)).toBeNull();
  });

  it('has no word that means two things', () => {
    const words = [...OP_AMP_PARAMETERS, ...PART_FIELDS, INPUT_TYPE_FIELD].flatMap(
      ({ key, label, synonyms }) => [...new Set([key, label, ...synonyms].map(normaliseWord))],
    );
    expect(words).toHaveLength(new Set(words).size);
    expect(words).not.toContain('');
  });
});
