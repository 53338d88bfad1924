import { describe, expect, it } from 'vitest';
import { OP_AMP_CATALOGUE, type OpAmpPart, RESISTOR_CATALOGUE, type ResistorPart } from '../parts/index.js';
import type { ColumnMapping } from './columnMapping.js';
import { checkMapping } from './checkMapping.js';
import { exportColumns } from './exportColumns.js';
import { importRowReader } from './importRow.js';
import { rowJudge } from './judgeRow.js';
import { columnProposer } from './proposeColumn.js';

const HEADINGS = [
  'maker',
  'mpn',
  'en @1kHz [nV/√Hz]',
  'en @10Hz [nV/√Hz]',
  'in [pA/√Hz]',
  'ib [µA]',
  'GBW [MHz]',
];

function mappingOf(headings: readonly string[], propose = columnProposer(OP_AMP_CATALOGUE)): ColumnMapping[] {
  return headings.flatMap((heading, column) => {
    const proposed = propose(heading);
    if (proposed === null) return [];
    const { field, form, unit, frequency, quantity, origin } = proposed;
    return [{ column, field, form, unit, frequency, quantity, origin }];
  });
}

function judge(
  cells: string[],
  existing: OpAmpPart | null = null,
  curated: OpAmpPart | null = null,
  headings = HEADINGS,
) {
  const reader = importRowReader(OP_AMP_CATALOGUE, mappingOf(headings), 'comma');
  const reading = reader.read(cells);
  if (!reading.ok) return { state: 'refused' as const, errors: reading.errors };
  return rowJudge(OP_AMP_CATALOGUE, reader)(reading, { existing, curated });
}

function accepted(cells: string[], headings = HEADINGS): OpAmpPart {
  const verdict = judge(cells, null, null, headings);
  if (verdict.state === 'refused') throw new Error(JSON.stringify(verdict.errors));
  return verdict.part;
}

const ROW = ['Vireo', 'VR-1', '1,1', '1,31', '1,2', '', '60'];

describe('rowJudge', () => {
  it('takes two spots for white noise and corner and leaves gaps unknown', () => {
    const verdict = judge(ROW);
    expect(verdict).toMatchObject({
      state: 'new',
      part: {
        manufacturer: 'Vireo',
        amplifier: { currentNoise: 1.2e-12, inputBiasCurrent: null, gainBandwidth: 6e7 },
      },
    });
    const { voltageNoise, voltageNoiseCorner } = accepted(ROW).amplifier;
    expect(voltageNoise * Math.sqrt(1 + voltageNoiseCorner! / 1000)).toBeCloseTo(1.1e-9, 20);
    expect(voltageNoise * Math.sqrt(1 + voltageNoiseCorner! / 10)).toBeCloseTo(1.31e-9, 20);
  });

  it('leaves a part that it read before unchanged', () => {
    expect(judge(ROW, accepted(ROW))).toMatchObject({ state: 'unchanged', doubts: [] });
  });

  it('names every changed field, and takes nothing away for a gap or a missing column', () => {
    const existing = { ...accepted(ROW), description: 'Kept', lifecycle: 'obsolete' as const };
    const verdict = judge(['VIREO', 'VR-1', '', '', '1.4', '', ''], existing);
    expect(verdict).toMatchObject({
      state: 'changed',
      part: { description: 'Kept', lifecycle: 'obsolete', amplifier: { gainBandwidth: 6e7 } },
      changes: [{ field: 'amplifier.currentNoise', old: 1.2e-12, new: 1.4e-12 }],
    });
  });

  it('takes another spelling of its names for no change', () => {
    expect(judge(['VIREO Inc.', 'vr 1', '', '', '', '', ''], accepted(ROW))).toMatchObject({
      state: 'unchanged',
      part: { manufacturer: 'Vireo', partNumber: 'VR-1' },
    });
  });

  it('refuses with column, cell, reason and what was expected', () => {
    const verdict = judge(['Vireo', 'VR-2', 'n.a.', '', '', '', '8..12']);
    expect(verdict.state).toBe('refused');
    if (verdict.state !== 'refused') return;
    expect(verdict.errors).toMatchObject([
      {
        column: 6,
        value: '8..12',
        why: expect.stringContaining('this is a range'),
        expected: expect.stringContaining('Hz'),
      },
      { column: 2, value: 'n.a.', expected: expect.stringContaining('above 0') },
    ]);
  });

  it('refuses a new part without its noise at the column that should state it', () => {
    expect(judge(['Vireo', 'VR-2', '', '', '', '', ''])).toMatchObject({
      state: 'refused',
      errors: [{ column: 2, value: '', why: expect.stringContaining('a value is needed') }],
    });
    expect(judge(['Vireo', 'VR-2'], null, null, ['maker', 'mpn'])).toMatchObject({
      state: 'refused',
      errors: [{ column: null, why: expect.stringContaining('needs this column') }],
    });
  });

  it('doubts a supply minimum above the maximum', () => {
    const headings = ['maker', 'mpn', 'en', 'vs min', 'vs max'];
    expect(judge(['Vireo', 'VR-3', '1', '5', '3'], null, null, headings)).toMatchObject({
      state: 'doubtful',
      doubts: [{ code: 'contradiction', field: 'amplifier.supplyMaximum' }],
    });
  });

  it('takes a dash or “n/a” for a gap, but not where the figure is needed', () => {
    const part = { state: 'new', part: { amplifier: { voltageNoise: 1e-9, currentNoise: null } } };
    expect(judge(['Vireo', 'VR-6', '1', 'n/a'], null, null, ['maker', 'mpn', 'en', 'in'])).toMatchObject(
      part,
    );
    expect(judge(['Vireo', 'VR-6', 'n/a', '1'], null, null, ['maker', 'mpn', 'en', 'in'])).toMatchObject({
      state: 'refused',
      errors: [{ column: 2, value: 'n/a' }],
    });
  });

  it('understands the words of German and French lists', () => {
    const headings = ['Hersteller', 'Typ', 'en', 'Status', 'Freigabe'];
    expect(judge(['Vireo', 'VR-7', '1', 'abgekündigt', 'gesperrt'], null, null, headings)).toMatchObject({
      part: { lifecycle: 'last-time-buy', approval: 'not-approved' },
    });
    expect(judge(['Vireo', 'VR-7', '1', 'obsolète', 'oui'], null, null, headings)).toMatchObject({
      part: { lifecycle: 'obsolete', approval: 'approved' },
    });
  });

  it('refuses spots that no white and 1/f noise could make', () => {
    expect(judge(['Vireo', 'VR-4', '2', '1', '', '', ''])).toMatchObject({ state: 'refused' });
  });

  it('doubts current noise under the shot noise of the bias current', () => {
    expect(judge(['Vireo', 'VR-5', '1', '1,2', '0,001', '3', ''])).toMatchObject({
      state: 'doubtful',
      doubts: [{ code: 'below-shot-noise', field: 'amplifier.currentNoise' }],
    });
  });

  it('doubts noise that no op-amp reaches and a slip of a prefix against the curated part', () => {
    const curated = accepted(ROW);
    expect(judge(['Vireo', 'VR-1', '0,0011', '0,00131', '1,2', '', '60'], null, curated)).toMatchObject({
      state: 'doubtful',
      doubts: [
        { code: 'implausibly-quiet', field: 'amplifier.voltageNoise' },
        { code: 'factor-of-1000', field: 'amplifier.voltageNoise' },
      ],
    });
  });

  it('notes the maximum of a whole column as the figures’ origin', () => {
    expect(accepted(['Vireo', 'VR-6', '1'], ['maker', 'mpn', 'en max']).origins).toEqual({
      voltageNoise: 'maximum',
    });
  });

  it('takes the corner from peak-to-peak noise', () => {
    const { voltageNoise, voltageNoiseCorner } = accepted(
      ['Vireo', 'VR-7', '3', '0,08'],
      ['maker', 'mpn', 'en', '0.1-10 Hz noise [µVpp]'],
    ).amplifier;
    const peaks = 6.6 * voltageNoise * Math.sqrt(9.9 + voltageNoiseCorner! * Math.log(100));
    expect(peaks).toBeCloseTo(8e-8, 15);
  });
});

describe('checkMapping', () => {
  const [maker, number, noise] = mappingOf(['maker', 'mpn', 'en [nV/√Hz]']);

  it('accepts what the headings propose', () => {
    expect(checkMapping(OP_AMP_CATALOGUE, mappingOf(HEADINGS), 7)).toEqual([]);
  });

  it.each([
    ['columns', [maker]],
    ['columns.2.column', [maker, number, { ...noise, column: 7 }]],
    ['columns.2.column', [maker, number, { ...noise, column: 1 }]],
    ['columns.2.field', [maker, number, { ...noise, field: 'colour' }]],
    ['columns.3.field', [maker, number, noise, { ...noise, column: 3 }]],
    ['columns.2.unit', [maker, number, { ...noise, unit: 'MHz' }]],
    ['columns.2.frequency', [maker, number, { ...noise, form: 'spot' as const }]],
    [
      'columns.2.form',
      [maker, number, { ...noise, field: 'gainBandwidth', unit: 'Hz', form: 'spot' as const }],
    ],
  ])('refuses a mapping at %s', (field, mapping) => {
    expect(checkMapping(OP_AMP_CATALOGUE, mapping, 7).map((error) => error.field)).toContain(field);
  });
});

describe('exportColumns', () => {
  it.each(['point', 'comma'] as const)('are read back to the very same part with decimal %s', (mark) => {
    const part: ResistorPart = {
      manufacturer: '=Vireo',
      partNumber: '-1',
      description: '@home',
      package: '',
      lifecycle: 'last-time-buy',
      approval: 'restricted',
      resistor: {
        technology: 'thin-film',
        resistance: 4702.000000000001,
        tolerance: 0.001,
        temperatureCoefficient: -2.5e-5,
        powerRating: 0.1 + 0.2,
        noiseIndex: -41.5,
        temperatureRise: null,
      },
      origins: { noiseIndex: 'measured' },
    };
    const columns = exportColumns<ResistorPart>(RESISTOR_CATALOGUE, mark);
    const mapping = mappingOf(
      columns.map(({ heading }) => heading),
      columnProposer(RESISTOR_CATALOGUE),
    );
    expect(mapping.length).toBe(columns.length);
    const reader = importRowReader(RESISTOR_CATALOGUE, mapping, mark);
    const reading = reader.read(columns.map((column) => column.cell(part)));
    expect(reading.ok).toBe(true);
    if (!reading.ok) return;
    const verdict = rowJudge(RESISTOR_CATALOGUE, reader)(reading, { existing: null, curated: null });
    expect(verdict).toMatchObject({ state: 'new', part });
  });
});
