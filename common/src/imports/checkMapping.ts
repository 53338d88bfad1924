import { type FieldError, type ListedFields, PART_FIELDS } from '../parts/index.js';
import { parseUnit, type QuantityKind } from '../units/index.js';
import { type ColumnMapping, NOISE_FORMS } from './columnMapping.js';

/** What every list must state, for it names the part. */
const NAMES = ['manufacturer', 'partNumber'] as const;
const MOST_SPOTS = 2;

/**
 * What is wrong with a mapping of a list that has so many columns, by paths such as `columns.3.unit`; empty =
 * its rows can be read.
 */
export function checkMapping(
  catalogue: ListedFields,
  mapping: readonly ColumnMapping[],
  columnCount: number,
): FieldError[] {
  const each = mapping.flatMap((column, index) => {
    const fault = columnFault(catalogue, column, columnCount);
    return fault === null ? [] : [{ field: `columns.${index}.${fault[0]}`, message: fault[1] }];
  });
  return [...each, ...doubled(mapping), ...missingNames(mapping)];
}

function columnFault(
  catalogue: ListedFields,
  mapping: ColumnMapping,
  count: number,
): [string, string] | null {
  const { column, field, form, unit, frequency } = mapping;
  if (column >= count) return ['column', `a column from 0 to ${count - 1} was expected`];
  const parameter = catalogue.parameters.find(({ key }) => key === field);
  const isText = [...PART_FIELDS, catalogue.choice].some(({ key }) => key === field);
  if (parameter === undefined && !isText) return ['field', 'a field of this kind of part was expected'];
  if (parameter === undefined) return form === 'value' ? null : ['form', 'words have a value only'];
  if (form === 'origin') return null;
  if (form !== 'value' && !allowsForm(field, form))
    return ['form', `${parameter.label} isn’t stated in this form`];
  if (form === 'spot' && frequency === null) return ['frequency', 'the frequency of the noise was expected'];
  const kind = form === 'peak-to-peak' ? 'voltage' : parameter.kind;
  return fits(unit, kind) ? null : ['unit', `a unit of ${parameter.label} was expected`];
}

function allowsForm(field: string, form: string): boolean {
  const forms = NOISE_FORMS[field];
  return forms !== undefined && (form === 'spot' || forms.peakToPeak);
}

function fits(unit: string | null, kind: QuantityKind): boolean {
  if (unit === null || unit === '') return true;
  return parseUnit(unit, kind)?.kind === kind;
}

function doubled(mapping: readonly ColumnMapping[]): FieldError[] {
  return mapping.flatMap((one, index) => {
    const before = mapping.slice(0, index);
    const same = before.filter(({ field, form }) => field === one.field && form === one.form);
    const allowed = one.form === 'spot' ? MOST_SPOTS : 1;
    const repeats = same.some(({ frequency }) => one.form === 'spot' && frequency === one.frequency);
    const taken = before.some(({ column }) => column === one.column);
    if (taken) return [{ field: `columns.${index}.column`, message: 'this column is mapped already' }];
    if (same.length < allowed && !repeats) return [];
    return [{ field: `columns.${index}.field`, message: 'two columns hold this value: keep one' }];
  });
}

function missingNames(mapping: readonly ColumnMapping[]): FieldError[] {
  return NAMES.filter((name) => !mapping.some(({ field, form }) => field === name && form === 'value')).map(
    (name) => ({
      field: 'columns',
      message: `a column for the ${name === 'partNumber' ? 'part number' : name} is needed`,
    }),
  );
}
