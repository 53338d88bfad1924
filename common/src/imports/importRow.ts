import { expectedColumns, type ListedFields, pathOfColumn, type Reading } from '../parts/index.js';
import { type CellReader, cellReaders } from './cellReaders.js';
import { type ColumnMapping, NOISE_FORMS } from './columnMapping.js';
import type { DecimalMark } from './decimalMark.js';
import { deriveNoise } from './derivedNoise.js';
import { fieldExpectation } from './fieldExpectation.js';
import type { PartValue, RowError } from './rowVerdict.js';

/** What a row states, by the paths of a part, or everything that is wrong with its cells. */
export type ImportRowReading =
  | { ok: true; stated: ReadonlyMap<string, PartValue>; cells: readonly string[] }
  | { ok: false; errors: RowError[] };

/** Reads the rows of one list. */
export interface ImportRowReader {
  read(cells: readonly string[]): ImportRowReading;
  /** The error of a path, at the column that states it. */
  errorAt(path: string, why: string, cells: readonly string[]): RowError;
  /** Whether the list has a column for the path. */
  has(path: string): boolean;
}

/**
 * Makes a reader of the rows of a list whose columns are mapped. An empty cell, or one that
 * says that its value is unknown, states nothing. Spot noise and
 * peak-to-peak noise become the white density and its corner; a corner that has its own cell stands.
 */
export function importRowReader(
  catalogue: ListedFields,
  mapping: readonly ColumnMapping[],
  mark: DecimalMark,
): ImportRowReader {
  const columns = cellReaders(catalogue, mapping, mark);
  const derived = derivedFigures(catalogue, columns);
  const plain = columns.filter(({ form, field }) => !derived.some((one) => one.holds(form, field)));
  const errorAt = (path: string, why: string, cells: readonly string[]) =>
    errorOf(catalogue, columns, path, why, cells);
  const read = (cells: readonly string[]): ImportRowReading => {
    const stated = new Map<string, PartValue>();
    const errors: RowError[] = [];
    for (const column of plain) readPlain(catalogue, column, cells, stated, errors);
    for (const figure of derived) figure.read(cells, stated, errors);
    return errors.length > 0 ? { ok: false, errors } : { ok: true, stated, cells };
  };
  const paths = new Set(columns.map(({ path }) => path));
  for (const { corner } of derived) paths.add(corner);
  return { read, errorAt, has: (path) => paths.has(path) };
}

function readPlain(
  catalogue: ListedFields,
  column: CellReader,
  cells: readonly string[],
  stated: Map<string, PartValue>,
  errors: RowError[],
): void {
  const cell = cells[column.column] ?? '';
  if (cell.trim() === '') return;
  const reading = column.read(cell);
  if (!reading.ok) {
    errors.push({
      column: column.column,
      value: cell,
      why: reading.message,
      expected: fieldExpectation(catalogue, column),
    });
    return;
  }
  if (reading.value === null) return;
  stated.set(column.path, reading.value);
  if (column.origin !== null && column.form === 'value') stateOrigin(stated, column);
}

function stateOrigin(stated: Map<string, PartValue>, { field, origin }: CellReader): void {
  if (!stated.has(`origins.${field}`)) stated.set(`origins.${field}`, origin);
}

interface DerivedFigure {
  /** The path of the corner. */
  corner: string;
  holds(form: string, field: string): boolean;
  read(cells: readonly string[], stated: Map<string, PartValue>, errors: RowError[]): void;
}

/** The noise densities that columns state in the forms of a data sheet. */
function derivedFigures(catalogue: ListedFields, columns: readonly CellReader[]): DerivedFigure[] {
  return Object.keys(NOISE_FORMS)
    .filter((field) => columns.some((column) => column.field === field && isForm(column.form)))
    .map((field) => derivedFigure(catalogue, columns, field));
}

function isForm(form: string): boolean {
  return form === 'spot' || form === 'peak-to-peak';
}

function derivedFigure(
  catalogue: ListedFields,
  columns: readonly CellReader[],
  field: string,
): DerivedFigure {
  const own = columns.filter((column) => column.field === field && isForm(column.form));
  const density = pathOfColumn(catalogue, { holds: 'figure', key: field, unit: '' });
  const corner = pathOfColumn(catalogue, { holds: 'figure', key: NOISE_FORMS[field].corner, unit: '' });
  return {
    corner,
    holds: (form, key) => key === field && isForm(form),
    read(cells, stated, errors) {
      const figures = new Map<string, PartValue>();
      const before = errors.length;
      for (const column of own)
        readPlain(catalogue, { ...column, path: String(column.column) }, cells, figures, errors);
      if (errors.length > before || figures.size === 0) return;
      const derived = derive(own, figures, stated.get(density) ?? null);
      if (!derived.ok) {
        const [{ column, label }] = own.map((one) => ({
          column: one.column,
          label: fieldExpectation(catalogue, one),
        }));
        errors.push({ column, value: cells[column] ?? '', why: derived.message, expected: label });
        return;
      }
      if (derived.value === null) return;
      stated.set(density, derived.value.white);
      if (derived.value.corner !== null && !stated.has(corner)) stated.set(corner, derived.value.corner);
    },
  };
}

function derive(
  own: readonly CellReader[],
  figures: ReadonlyMap<string, PartValue>,
  white: PartValue,
): Reading<{ white: number; corner: number | null } | null> {
  const valueOf = ({ column }: CellReader) => (figures.get(String(column)) ?? null) as number | null;
  const spots = own
    .filter(({ form }) => form === 'spot')
    .flatMap((column) => {
      const value = valueOf(column);
      return value === null ? [] : [{ frequency: column.frequency!, density: value }];
    });
  const peaks = own.find(({ form }) => form === 'peak-to-peak');
  return deriveNoise({ white: white as number | null, spots, peakToPeak: peaks ? valueOf(peaks) : null });
}

function errorOf(
  catalogue: ListedFields,
  columns: readonly CellReader[],
  path: string,
  why: string,
  cells: readonly string[],
): RowError {
  const column = columns.find((one) => one.path === path);
  const field = path.split('.').at(-1)!;
  const known = expectedColumns(catalogue).some(({ key }) => key === field);
  return {
    column: column?.column ?? null,
    value: column === undefined ? '' : (cells[column.column] ?? ''),
    why,
    expected: known ? fieldExpectation(catalogue, { field, form: 'value' }) : '',
  };
}
