import { boundsError, type QuantityField } from '@roothertz/common/parts';
import { parseQuantity, parseRange, type Range } from '@roothertz/common/units';

export type FieldReading = { ok: true; value: number | null } | { ok: false; message: string };

/** What a text means in a field: a value within its bounds, or nothing where the field may be empty. */
export function readField(field: QuantityField, text: string, emptyText?: string): FieldReading {
  const typed = text.trim();
  if (emptyText !== undefined && (typed === '' || typed.toLowerCase() === emptyText.toLowerCase()))
    return { ok: true, value: null };
  const parsed = parseQuantity(typed, field.kind);
  if (!parsed.ok) return parsed;
  const message = boundsError(field, parsed.value);
  return message === null ? parsed : { ok: false, message };
}

/** The range that a text states, both ends within the field's bounds; null = it states none. */
export function readRange({ kind, ...field }: QuantityField, text: string): Range | null {
  const range = parseRange(text, kind);
  const isWithin = (end: number) => boundsError({ kind, ...field }, end) === null;
  return range !== null && isWithin(range.from) && isWithin(range.to) ? range : null;
}
