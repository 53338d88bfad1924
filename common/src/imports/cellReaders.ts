import {
  type ListedFields,
  type ParameterDefinition,
  pathOfColumn,
  type PartColumn,
  readFigure,
  readPartCell,
  type Reading,
} from '../parts/index.js';
import type { ColumnMapping } from './columnMapping.js';
import { originalCell } from './csvCells.js';
import { type DecimalMark, ungrouped } from './decimalMark.js';
import { figureOfCell, isGapCell } from './listCell.js';
import type { PartValue } from './rowVerdict.js';

const KEPT_READINGS = 5000;
const UNSTATED: Reading<PartValue> = { ok: true, value: null };

/** The voltage from peak to peak, which is no parameter but gives one. */
const PEAK_TO_PEAK: ParameterDefinition = {
  key: 'peakToPeak',
  label: 'noise from peak to peak',
  kind: 'voltage',
  bounds: { above: 0, to: 1 },
  fallback: null,
  displayUnit: 'µV',
  synonyms: [],
  help: 'Voltage noise from 0.1 to 10 Hz.',
};

/** A column that is ready to be read, cell after cell. */
export interface CellReader extends ColumnMapping {
  /** Where the part holds what the column states. */
  path: string;
  source: PartColumn;
  /** Null = the cell says that the value is unknown. */
  read(cell: string): Reading<PartValue>;
}

/** Makes the readers of the mapped columns; cells that come again in a column are read once. */
export function cellReaders(
  catalogue: ListedFields,
  mapping: readonly ColumnMapping[],
  mark: DecimalMark,
): CellReader[] {
  return mapping.map((column) => {
    const source = sourceOf(catalogue, column);
    const read = remembered((cell) => readCell(catalogue, column, source, cell, mark));
    return { ...column, path: pathOfColumn(catalogue, source), source, read };
  });
}

function sourceOf({ parameters }: ListedFields, { field, form, unit }: ColumnMapping): PartColumn {
  if (form === 'origin') return { holds: 'origin', key: field };
  const isFigure = parameters.some(({ key }) => key === field);
  return isFigure ? { holds: 'figure', key: field, unit: unit ?? '' } : { holds: 'text', key: field };
}

function readCell(
  catalogue: ListedFields,
  { form }: ColumnMapping,
  source: PartColumn,
  cell: string,
  mark: DecimalMark,
): Reading<PartValue> {
  const original = originalCell(cell);
  if (source.holds !== 'figure') return readPartCell(catalogue, source, onOneLine(original));
  const parameter = form === 'peak-to-peak' ? PEAK_TO_PEAK : parameterOf(catalogue, source.key);
  if (!parameter.required && isGapCell(original)) return UNSTATED;
  return readFigure(parameter, ungrouped(figureOfCell(original, parameter.kind), mark), source.unit);
}

function parameterOf({ parameters }: ListedFields, key: string): ParameterDefinition {
  return parameters.find((parameter) => parameter.key === key)!;
}

/** A text that its list breaks into lines goes on after a space. */
function onOneLine(text: string): string {
  return text.trim().replace(/\s*[\r\n]+\s*/g, ' ');
}

function remembered(read: (cell: string) => Reading<PartValue>): (cell: string) => Reading<PartValue> {
  const readings = new Map<string, Reading<PartValue>>();
  return (cell) => {
    const known = readings.get(cell);
    if (known !== undefined) return known;
    if (readings.size >= KEPT_READINGS) readings.clear();
    const reading = read(cell);
    readings.set(cell, reading);
    return reading;
  };
}
