import { formatEditable, type QuantityKind } from '../units/index.js';
import { quantityKindOf } from './quantityKindOf.js';

/** One line of a change; null = nothing stood or stands there. */
export interface FieldChange {
  /** In words: `lead time days`. */
  field: string;
  from: string | null;
  to: string | null;
}

/**
 * What a recorded change changed, field by field, in words; physical values with their units. Fields that stayed as
 * they were are left out, and so are ids, which say nothing to a reader.
 *
 * @param from what stood before; null = nothing
 * @param to what stands since; null = nothing
 * @example describeChange({ stock: 10, currency: 'EUR' }, { stock: 5, currency: 'EUR' }) // [{ field: 'stock', from: '10', to: '5' }]
 */
export function describeChange(from: object | null, to: object | null): FieldChange[] {
  const [before, after] = [flattened(from), flattened(to)];
  const fields = [...new Set([...before.keys(), ...after.keys()])];
  return fields
    .map((field) => ({ field, from: before.get(field) ?? null, to: after.get(field) ?? null }))
    .filter((change) => change.from !== change.to);
}

/** A moment as JSON writes it: its day, and the time to the minute. */
const MOMENT = /^(\d{4}-\d{2}-\d{2})T(\d{2}:\d{2}):[\d.]+Z$/;

/** Each value in words by the words of its path; what is empty is left out. */
function flattened(values: object | null, path: readonly string[] = []): Map<string, string> {
  const entries = Object.entries(values ?? {}).filter(([field]) => !/^id$|Ids?$/.test(field));
  return new Map(
    entries.flatMap(([field, value]: [string, unknown]): [string, string][] => {
      const place = [...path, field];
      if (isValues(value)) return [...flattened(value, place)];
      const words = valueWords(value, quantityKindOf(place));
      return words === null ? [] : [[place.map(fieldWords).join(' '), words]];
    }),
  );
}

/** `leadTimeDays` → `lead time days`. */
function fieldWords(field: string): string {
  return field.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}

function valueWords(value: unknown, kind?: QuantityKind): string | null {
  if (value === null || value === undefined || value === '') return null;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value)) return value.length === 0 ? null : value.map(itemWords).join(', ');
  if (typeof value === 'number' && kind) return formatEditable(value, kind);
  return String(value as string | number).replace(MOMENT, '$1 $2 UTC');
}

function itemWords(item: unknown): string {
  if (!isValues(item)) return valueWords(item) ?? '–';
  return [...flattened(item)].map(([field, words]) => `${field} ${words}`).join(' ');
}

function isValues(value: unknown): value is object {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
