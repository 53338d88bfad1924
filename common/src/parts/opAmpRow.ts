import { checkOpAmp } from './checkOpAmp.js';
import type { FieldError } from './fieldError.js';
import { readMissingColumn, readOpAmpCell } from './opAmpCell.js';
import { type OpAmpColumn, type OpAmpColumns, readOpAmpHeadings } from './opAmpColumns.js';
import { OP_AMP_PARAMETERS } from './opAmpParameters.js';
import { type OpAmpPart, originsOfKnown } from './opAmpPart.js';
import { INPUT_TYPE_FIELD, PART_FIELDS } from './partFields.js';
import type { Reading } from './reading.js';

/** An op-amp that was read from a row of a list, or everything that is wrong with the row. */
export type OpAmpRowReading = { ok: true; part: OpAmpPart } | { ok: false; errors: FieldError[] };

/** What an op-amp must have or falls back to, whether the list has a column for it or not. */
const EXPECTED: readonly OpAmpColumn[] = [
  ...[...PART_FIELDS, INPUT_TYPE_FIELD].map(({ key }) => ({ holds: 'text', key }) as const),
  ...OP_AMP_PARAMETERS.map(({ key }) => ({ holds: 'figure', key, unit: '' }) as const),
];

/**
 * Reads a row of a parts list, heading → cell, into an op-amp in SI units. Columns that mean nothing
 * of an op-amp are passed over. An empty cell is an unknown figure (`null`); only where the whole
 * column is missing does a figure fall back to its default. A required value that is missing, a cell
 * that can't be read, a figure out of bounds, limits that contradict each other and a value with two
 * columns are errors, by the field's path such as `amplifier.voltageNoise`.
 *
 * `columns` spares reading the headings anew in each row of a long list.
 */
export function readOpAmpRow(
  row: Readonly<Record<string, string | undefined>>,
  columns: OpAmpColumns = readOpAmpHeadings(Object.keys(row)),
): OpAmpRowReading {
  const values = new Map<string, unknown>();
  const errors: FieldError[] = [];
  const keep = (field: string, reading: Reading<unknown>) => {
    if (!reading.ok) errors.push({ field, message: reading.message });
    else if (values.has(field)) errors.push({ field, message: 'two columns hold this value: keep one' });
    else values.set(field, reading.value);
  };
  for (const [heading, column] of columns) keep(pathOf(column), readOpAmpCell(column, row[heading] ?? ''));
  const present = new Set([...columns.values()].map(pathOf));
  for (const column of EXPECTED)
    if (!present.has(pathOf(column))) keep(pathOf(column), readMissingColumn(column));
  return errors.length > 0 ? { ok: false, errors } : checked(toPart(values));
}

function pathOf({ holds, key }: OpAmpColumn): string {
  if (holds === 'origin') return `origins.${key}`;
  return holds === 'figure' || key === 'inputType' ? `amplifier.${key}` : key;
}

function toPart(values: ReadonlyMap<string, unknown>): OpAmpPart {
  const part: Record<string, unknown> = {};
  const amplifier: Record<string, unknown> = {};
  const origins: Record<string, unknown> = {};
  for (const [path, value] of values) {
    const [group, key] = path.split('.');
    if (group === 'amplifier') amplifier[key] = value;
    else if (group === 'origins') origins[key] = value ?? undefined;
    else part[group] = value;
  }
  const read = { ...part, amplifier, origins } as unknown as OpAmpPart;
  return { ...read, origins: originsOfKnown(read.amplifier, read.origins) };
}

function checked(part: OpAmpPart): OpAmpRowReading {
  const errors = checkOpAmp(part);
  return errors.length > 0 ? { ok: false, errors } : { ok: true, part };
}
