import { readFigure } from './figureCell.js';
import type { OpAmpColumn } from './opAmpColumns.js';
import { OP_AMP_PARAMETERS } from './opAmpParameters.js';
import type { ParameterDefinition } from './parameter.js';
import { INPUT_TYPE_FIELD, PART_FIELDS, type TextField } from './partFields.js';
import { readOption, readText } from './partText.js';
import type { Reading } from './reading.js';
import { APPROVAL_LABELS, INPUT_TYPE_LABELS, LIFECYCLE_LABELS, ORIGIN_LABELS } from './vocabulary.js';

const OPTION_LABELS: Readonly<Record<string, Record<string, string>>> = {
  lifecycle: LIFECYCLE_LABELS,
  approval: APPROVAL_LABELS,
  inputType: INPUT_TYPE_LABELS,
};
const TEXT_FIELDS = new Map<string, TextField>(
  [...PART_FIELDS, INPUT_TYPE_FIELD].map((field) => [field.key, field]),
);
const PARAMETERS = new Map<string, ParameterDefinition>(OP_AMP_PARAMETERS.map((p) => [p.key, p]));

/** Reads a cell of a column; an empty cell gives an unknown figure, a default option or an empty text. */
export function readOpAmpCell(column: OpAmpColumn, cell: string): Reading<string | number | null> {
  if (column.holds === 'text') return readTextCell(TEXT_FIELDS.get(column.key)!, cell);
  const parameter = PARAMETERS.get(column.key)!;
  if (column.holds === 'figure') return readFigure(parameter, cell, column.unit);
  if (cell.trim() === '') return { ok: true, value: null };
  return readOption(`${parameter.label} origin`, ORIGIN_LABELS, cell);
}

/** What stands where a list has no such column: the field's default, if it isn't required. */
export function readMissingColumn({ holds, key }: OpAmpColumn): Reading<string | number | null> {
  const field = holds === 'text' ? TEXT_FIELDS.get(key)! : PARAMETERS.get(key)!;
  if (field.required) return { ok: false, message: `${field.label}: the list needs this column` };
  return { ok: true, value: field.fallback };
}

function readTextCell(field: TextField, cell: string): Reading<string | null> {
  if (field.options === undefined) return readText(field, cell);
  if (cell.trim() === '') return { ok: true, value: field.fallback };
  return readOption(field.label, OPTION_LABELS[field.key], cell);
}
