import { formatQuantity } from '../units/index.js';
import type { QuantityField } from './parameter.js';

/**
 * What is wrong with a value of a field, in words, or null where it is within the field's bounds.
 * Anything but a finite number is refused, and a fraction where only whole numbers are allowed.
 */
export function boundsError(field: QuantityField, value: unknown): string | null {
  if (typeof value !== 'number' || !Number.isFinite(value)) return `${field.label}: a number was expected`;
  const { above, from, least, to } = field.bounds;
  const inside =
    (above === undefined || value > above) &&
    (from === undefined || value >= from) &&
    (least === undefined || value === 0 || value >= least) &&
    value <= to;
  if (!inside) return `${field.label}: ${describeBounds(field)} was expected`;
  if (field.integer && !Number.isInteger(value)) return `${field.label}: a whole number was expected`;
  return null;
}

/** The bounds of a field in words: "a value from 1 to 16", "a value above 0 V and up to 10 kV", "0 F or a value from 1 aF to 1 F". */
export function describeBounds(field: QuantityField): string {
  const { above, from, least, to } = field.bounds;
  const show = (value: number) => formatQuantity(value, field.kind, { trim: true });
  if (above !== undefined) return `a value above ${show(above)} and up to ${show(to)}`;
  if (least !== undefined) return `${show(0)} or a value from ${show(least)} to ${show(to)}`;
  return from === undefined ? `a value up to ${show(to)}` : `a value from ${show(from)} to ${show(to)}`;
}
