import type { FieldError } from './fieldError.js';
import type { LibraryPart } from './part.js';
import type { PartCatalogue } from './partCatalogue.js';
import { readMissingColumn, readPartCell } from './partCell.js';
import { type PartColumn, type PartColumns, readPartHeadings } from './partColumns.js';
import { expectedColumns, partOfValues, pathOfColumn } from './partValues.js';
import type { Reading } from './reading.js';

/** A row of a parts list, heading → cell. */
export type PartRow = Readonly<Record<string, string | undefined>>;

/** A part that was read from a row of a list, or everything that is wrong with the row. */
export type PartRowReading<Part> = { ok: true; part: Part } | { ok: false; errors: FieldError[] };

/**
 * Reads a row of a parts list into a part in SI units. Columns that mean nothing of the kind of part are
 * passed over. An empty cell is an unknown figure (`null`); only where the whole column is missing does a
 * figure fall back to its default. A required value that is missing, a cell that can't be read, a figure
 * out of bounds, limits that contradict each other and a value with two columns are errors, by the
 * field's path such as `amplifier.voltageNoise`.
 *
 * `columns` spares reading the headings anew in each row of a long list.
 */
export function readPartRow<Part extends LibraryPart>(
  catalogue: PartCatalogue<Part>,
  row: PartRow,
  columns: PartColumns = readPartHeadings(catalogue, Object.keys(row)),
): PartRowReading<Part> {
  const values = new Map<string, unknown>();
  const errors: FieldError[] = [];
  const keep = (field: string, reading: Reading<unknown>) => {
    if (!reading.ok) errors.push({ field, message: reading.message });
    else if (values.has(field)) errors.push({ field, message: 'two columns hold this value: keep one' });
    else values.set(field, reading.value);
  };
  const path = (column: PartColumn) => pathOfColumn(catalogue, column);
  for (const [heading, column] of columns)
    keep(path(column), readPartCell(catalogue, column, row[heading] ?? ''));
  const present = new Set([...columns.values()].map(path));
  for (const column of expectedColumns(catalogue))
    if (!present.has(path(column))) keep(path(column), readMissingColumn(catalogue, column));
  return errors.length > 0 ? { ok: false, errors } : checked(catalogue, partOfValues(catalogue, values));
}

function checked<Part extends LibraryPart>({ check }: PartCatalogue<Part>, part: Part): PartRowReading<Part> {
  const errors = check(part);
  return errors.length > 0 ? { ok: false, errors } : { ok: true, part };
}
