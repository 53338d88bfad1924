import { describe, expect, it } from 'vitest';
import { normaliseWord } from './normalise.js';
import { OP_AMP_CATALOGUE } from './opAmpCatalogue.js';
import type { ListedFields } from './partCatalogue.js';
import { type PartColumn, readPartHeadings } from './partColumns.js';
import { PART_FIELDS } from './partFields.js';
import { RESISTOR_CATALOGUE } from './resistorCatalogue.js';

const read = (catalogue: ListedFields, heading: string): PartColumn | undefined =>
  readPartHeadings(catalogue, [heading]).get(heading);

describe.each<[string, ListedFields]>([
  ['op-amps', OP_AMP_CATALOGUE],
  ['resistors', RESISTOR_CATALOGUE],
])('the headings of a list of %s', (_kind, catalogue) => {
  const { choice, parameters } = catalogue;

  it.each(parameters)('name $label by label with unit, by key and by synonyms', (parameter) => {
    const { key, label, displayUnit, synonyms } = parameter;
    const unit = displayUnit;
    expect(read(catalogue, `${label} [${unit}]`)).toEqual({ holds: 'figure', key, unit });
    for (const name of [label, key, ...synonyms])
      expect(read(catalogue, name)).toEqual({ holds: 'figure', key, unit: '' });
    expect(read(catalogue, `${label} origin`)).toEqual({ holds: 'origin', key });
  });

  it.each([...PART_FIELDS, choice])('name $label', ({ key, label, synonyms }) => {
    for (const name of [label, key, ...synonyms])
      expect(read(catalogue, name)).toEqual({ holds: 'text', key });
  });

  it('have no word that means two things', () => {
    const words = [...parameters, ...PART_FIELDS, choice].flatMap(({ key, label, synonyms }) => [
      ...new Set([key, label, ...synonyms].map(normaliseWord)),
    ]);
    expect(words).toHaveLength(new Set(words).size);
    expect(words).not.toContain('');
  });

  it.each(['', 'stock', 'note', '???', 'part number, part number'])('pass over %j', (heading) => {
    expect(read(catalogue, heading)).toBeUndefined();
  });
});

describe('a heading', () => {
  it.each([
    ['Voltage-Noise (nV/sqrt(Hz))', 'nV/sqrt(Hz)'],
    ['VOLTAGE NOISE[nV/√Hz] ', 'nV/√Hz'],
    ['Rauschspannung [ nV/√Hz ]', 'nV/√Hz'],
  ])('has the unit of %j in its brackets', (heading, unit) => {
    expect(read(OP_AMP_CATALOGUE, heading)).toEqual({ holds: 'figure', key: 'voltageNoise', unit });
  });

  it('means what it does in lists of its kind of part alone', () => {
    const headings = ['Technologie', 'Stromrauschen', 'part'];
    expect([...readPartHeadings(OP_AMP_CATALOGUE, headings).values()].map(({ key }) => key)).toEqual([
      'inputType',
      'currentNoise',
      'partNumber',
    ]);
    expect([...readPartHeadings(RESISTOR_CATALOGUE, headings).values()].map(({ key }) => key)).toEqual([
      'technology',
      'noiseIndex',
      'partNumber',
    ]);
  });
});
