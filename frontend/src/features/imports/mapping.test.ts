import { OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { describe, expect, it } from 'vitest';
import type { ImportColumn } from '../../api/imports';
import { columnAs, faultsByColumn, proposedMapping, sameMapping, withColumn } from './mappingDraft';
import { partView } from './partView';
import { doubtOf, notesOf } from './mappingNotes';
import { carriedMapping } from './readAnew';

const VIEW = partView(OP_AMP_CATALOGUE);

function column(
  place: number,
  heading: string,
  proposed: Partial<ImportColumn['proposed']> = null,
): ImportColumn {
  const whole = { column: place, field: '', confidence: 1, unitAssumed: false, ...proposed };
  return { column: place, heading, samples: ['1,2', '1,3'], proposed: proposed && whole };
}

const MAKER = column(0, 'Hersteller', { field: 'manufacturer' });
const SPOTS = [
  column(1, 'en @1kHz', { field: 'voltageNoise', form: 'spot', unit: 'nV/√Hz', frequency: 1000 }),
  column(2, 'en @10Hz', { field: 'voltageNoise', form: 'spot', unit: 'nV/√Hz', frequency: 10 }),
];

describe('a column that becomes something else', () => {
  it('takes unit and frequency from its heading', () => {
    expect(columnAs(VIEW, column(4, 'Rauschen bei 10 Hz (µV/√Hz)'), 'spot:voltageNoise')).toMatchObject({
      column: 4,
      form: 'spot',
      unit: 'µV/√Hz',
      frequency: 10,
    });
  });

  it('takes the usual unit where the heading names none, and none for words', () => {
    const heading = column(4, 'Spalte 5');
    expect(columnAs(VIEW, heading, 'value:gainBandwidth')?.unit).toBe('MHz');
    expect(columnAs(VIEW, heading, 'peak-to-peak:voltageNoise')?.unit).toBe('µV');
    expect(columnAs(VIEW, heading, 'value:package')?.unit).toBeNull();
    expect(columnAs(VIEW, heading, 'origin:voltageNoise')?.unit).toBeNull();
    expect(columnAs(VIEW, heading, '')).toBeNull();
  });

  it('replaces what was said of the column', () => {
    const mapping = proposedMapping([MAKER, ...SPOTS]);
    expect(withColumn(mapping, 1, null).map(({ column: place }) => place)).toEqual([0, 2]);
    expect(sameMapping([...mapping].reverse(), mapping as never)).toBe(true);
    expect(sameMapping(withColumn(mapping, 1, null), mapping as never)).toBe(false);
  });
});

describe('what is said of a column', () => {
  it('names how sure a similar heading is for as long as the proposal stands', () => {
    const similar = column(3, 'Eingangsruhestrom', {
      field: 'inputBiasCurrent',
      unit: 'nA',
      confidence: 0.82,
    });
    const [proposed] = proposedMapping([similar]);
    expect(doubtOf(similar, proposed)).toContain('82 %');
    expect(doubtOf(similar, { ...proposed, field: 'supplyCurrent' })).toBeNull();
  });

  it('names an assumed unit unless every cell brings its own', () => {
    const assumed = column(3, 'in typ', { field: 'currentNoise', unit: 'pA/√Hz', unitAssumed: true });
    const [mapped] = proposedMapping([assumed]);
    expect(notesOf(assumed, mapped, [mapped])).toEqual(['no unit in the file: pA/√Hz assumed']);
    expect(notesOf({ ...assumed, samples: ['1,2 pA/√Hz'] }, mapped, [mapped])).toEqual([]);
  });

  it('tells the formula of two frequencies once, and the assumption of one alone', () => {
    const both = proposedMapping(SPOTS);
    expect(notesOf(SPOTS[0], both[0], both)[0]).not.toContain('f_c');
    expect(notesOf(SPOTS[1], both[1], both)[0]).toContain('e(f)² = e²·(1 + f_c/f)');
    expect(notesOf(SPOTS[0], both[0], [both[0]])[0]).toContain('taken for white');
  });

  it('puts a fault at its column, and the others at the list', () => {
    const faults = faultsByColumn(proposedMapping([...SPOTS]), [
      { field: 'columns.1.unit', message: 'a unit was expected' },
      { field: 'columns', message: 'a column for the part number is needed' },
    ]);
    expect(faults.get(2)).toBe('a unit was expected');
    expect(faults.get(null)).toBe('a column for the part number is needed');
  });
});

describe('a file that is read anew', () => {
  it('keeps what was said of the headings that stay', () => {
    const before = [MAKER, column(1, 'GehÃ¤use')];
    const after = [MAKER, column(1, 'Gehäuse', { field: 'package' })];
    const said = [{ ...proposedMapping([MAKER])[0], field: 'partNumber' }];
    expect(carriedMapping(before, said, after).map(({ field }) => field)).toEqual(['partNumber', 'package']);
  });
});
