import type { ColumnForm, ColumnMapping } from '@roothertz/common/imports';
import type { FieldError } from '@roothertz/common/parts';
import type { Import, ImportColumn } from '../../api/imports';
import type { ListView } from './listView';

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

function toMapping({ column, field, form, unit, frequency, quantity, origin }: SentMapping): ColumnMapping {
  return {
    column,
    field,
    form: form ?? 'value',
    unit: unit || null,
    frequency: frequency ?? null,
    quantity: quantity ?? null,
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

/** The mapping of a column that becomes something else; unit, frequency and quantity are read from its heading. */
export function columnAs(
  view: ListView,
  { column, heading }: ImportColumn,
  becomes: Becomes,
): ColumnMapping | null {
  if (becomes === '') return null;
  const [form, field] = becomes.split(':') as [ColumnForm, string];
  const read = view.columns.proposeField(field, heading);
  const hasUnit = form !== 'origin' && (form === 'peak-to-peak') === (read.form === 'peak-to-peak');
  return {
    column,
    field,
    form,
    unit: (hasUnit && read.unit) || view.usualUnit(form, field),
    frequency: form === 'spot' ? (read.frequency ?? USUAL_SPOT) : null,
    quantity: form === 'break' ? (view.columns.proposer()(heading)?.quantity ?? 1) : null,
    origin: form === 'origin' ? null : read.origin,
  };
}

/** Whether a column, or the heading of prices, says in each row what could be said of the whole list. */
export function isStatedByColumn(mapping: Mapping, field: string): boolean {
  return mapping.some(
    (one) => one.field === field || (field === 'currency' && one.field === 'unitPrice' && one.unit),
  );
}

/** What is wrong with a mapping, at the column that it concerns; null = at the list as a whole. */
export function faultsByColumn(mapping: Mapping, errors: readonly FieldError[]): Map<number | null, string> {
  return new Map(
    errors
      .filter(({ field }) => field.startsWith('columns'))
      .map(({ field, message }) => {
        const place = /^columns\.(\d+)\./.exec(field)?.[1];
        return [place === undefined ? null : mapping[Number(place)].column, message];
      }),
  );
}
