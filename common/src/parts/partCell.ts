import { readFigure } from './figureCell.js';
import { FIELD_OPTION_WORDS, ORIGIN_WORDS } from './optionWords.js';
import type { ListedFields } from './partCatalogue.js';
import type { PartColumn } from './partColumns.js';
import { PART_FIELDS, type TextField } from './partFields.js';
import { readOption, readText } from './partText.js';
import type { Reading } from './reading.js';
import { TECHNOLOGY_LABELS } from './technology.js';
import { APPROVAL_LABELS, INPUT_TYPE_LABELS, LIFECYCLE_LABELS, ORIGIN_LABELS } from './vocabulary.js';

const OPTION_LABELS: Readonly<Record<string, Record<string, string>>> = {
  lifecycle: LIFECYCLE_LABELS,
  approval: APPROVAL_LABELS,
  inputType: INPUT_TYPE_LABELS,
  technology: TECHNOLOGY_LABELS,
};

/** Reads a cell of a column; an empty cell gives an unknown figure, a default option or an empty text. */
export function readPartCell(
  catalogue: ListedFields,
  column: PartColumn,
  cell: string,
): Reading<string | number | null> {
  if (column.holds === 'text') return readTextCell(textField(catalogue, column.key), cell);
  const parameter = parameterOf(catalogue, column.key);
  if (column.holds === 'figure') return readFigure(parameter, cell, column.unit);
  if (cell.trim() === '') return { ok: true, value: null };
  return readOption(`${parameter.label} origin`, ORIGIN_LABELS, cell, ORIGIN_WORDS);
}

/** What stands where a list has no such column: the field's default, if it isn't required. */
export function readMissingColumn(
  catalogue: ListedFields,
  { holds, key }: PartColumn,
): Reading<string | number | null> {
  const field = holds === 'text' ? textField(catalogue, key) : parameterOf(catalogue, key);
  if (field.required) return { ok: false, message: `${field.label}: the list needs this column` };
  return { ok: true, value: field.fallback };
}

function textField({ choice }: ListedFields, key: string): TextField {
  return [...PART_FIELDS, choice].find((field) => field.key === key)!;
}

function parameterOf({ parameters }: ListedFields, key: string) {
  return parameters.find((parameter) => parameter.key === key)!;
}

function readTextCell(field: TextField, cell: string): Reading<string | null> {
  if (field.options === undefined) return readText(field, cell);
  if (cell.trim() === '') return { ok: true, value: field.fallback };
  return readOption(field.label, OPTION_LABELS[field.key], cell, FIELD_OPTION_WORDS[field.key]);
}
