import { type ColumnForm, type ColumnMapping, proposeField } from '@roothertz/common/imports';
import type { FieldError, ListedFields } from '@roothertz/common/parts';
import type { Import, ImportColumn } from '../../api/imports';

export type Mapping = readonly ColumnMapping[];
type SentMapping = NonNullable<Import['mapping']>[number];

/** What a column can become, as `form:field`; empty = it is left out. */
export type Becomes = '' | `${ColumnForm}:${string}`;

const USUAL_SPOT = 1000;

/** What the page begins with: what was said, else what the team said of such a list before, else the proposals. */
export function startingMapping({ mapping, rememberedMapping, columns }: MappingSources): Mapping {
  const said = mapping ?? rememberedMapping;
  return said === null ? proposedMapping(columns) : said.map(toMapping);
}

export type MappingSources = Pick<Import, 'mapping' | 'rememberedMapping' | 'columns'>;

export function proposedMapping(columns: readonly ImportColumn[]): Mapping {
  return columns.flatMap(({ proposed }) => (proposed === null ? [] : [toMapping(proposed)]));
}

function toMapping({ column, field, form, unit, frequency, origin }: SentMapping): ColumnMapping {
  return {
    column,
    field,
    form: form ?? 'value',
    unit: unit || null,
    frequency: frequency ?? null,
    origin: origin ?? null,
  };
}

export function sameMapping(one: Mapping, sent: Import['mapping']): boolean {
  return sent !== null && textOf(one) === textOf(sent.map(toMapping));
}

function textOf(mapping: Mapping): string {
  return JSON.stringify([...mapping].sort((one, other) => one.column - other.column));
}

export function becomesOf(mapping: ColumnMapping | undefined): Becomes {
  return mapping === undefined ? '' : `${mapping.form}:${mapping.field}`;
}

/** The mapping with one column's part of it replaced, or left out. */
export function withColumn(mapping: Mapping, column: number, next: ColumnMapping | null): Mapping {
  const others = mapping.filter((one) => one.column !== column);
  return next === null ? others : [...others, next].sort((one, other) => one.column - other.column);
}

/** The mapping of a column that becomes something else; unit and frequency are read from its heading. */
export function columnAs(
  catalogue: ListedFields,
  { column, heading }: ImportColumn,
  becomes: Becomes,
): ColumnMapping | null {
  if (becomes === '') return null;
  const [form, field] = becomes.split(':') as [ColumnForm, string];
  const read = proposeField(catalogue, field, heading);
  const hasUnit = form !== 'origin' && (form === 'peak-to-peak') === (read.form === 'peak-to-peak');
  const usual = form === 'peak-to-peak' ? 'µV' : null;
  return {
    column,
    field,
    form,
    unit: (hasUnit && read.unit) || usual || unitOf(catalogue, form, field),
    frequency: form === 'spot' ? (read.frequency ?? USUAL_SPOT) : null,
    origin: form === 'origin' ? null : read.origin,
  };
}

function unitOf({ parameters }: ListedFields, form: ColumnForm, field: string): string | null {
  if (form === 'origin') return null;
  return parameters.find(({ key }) => key === field)?.displayUnit || null;
}

/** What is wrong with a mapping, at the column that it concerns; null = at the list as a whole. */
export function faultsByColumn(mapping: Mapping, errors: readonly FieldError[]): Map<number | null, string> {
  return new Map(
    errors.map(({ field, message }) => {
      const place = /^columns\.(\d+)\./.exec(field)?.[1];
      return [place === undefined ? null : mapping[Number(place)].column, message];
    }),
  );
}
