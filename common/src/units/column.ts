import type { QuantityKind } from './kinds.js';
import { plainNumber } from './plainNumber.js';
import { PREFIXES, prefixFor, type Prefix } from './prefixes.js';
import { PER_MILLION, QUANTITIES } from './quantities.js';
import { scientific } from './scientific.js';
import { splitQuantity } from './splitQuantity.js';
import { inCelsius } from './temperature.js';

/**
 * The prefix that fits a column of values: that of their median, zeros and values that aren't finite left out.
 * Empty where there is none to choose, and for kinds that are written without prefix.
 * @param values in SI units
 */
export function commonPrefix(values: readonly number[], kind: QuantityKind): Prefix {
  if (QUANTITIES[kind].style !== 'prefixed') return '';
  const sizes = values.map(Math.abs).filter((size) => size > 0 && Number.isFinite(size));
  if (sizes.length === 0) return '';
  const median = sizes.sort((left, right) => left - right)[Math.floor((sizes.length - 1) / 2)];
  return prefixFor(scientific(median, 3).exponent) ?? '';
}

/**
 * The number alone of a value in a column whose heading is `unitInPrefix(kind, prefix)`. Temperatures are in °C
 * throughout, fractions in percent,
 * temperature coefficients in ppm/K, decibels with two decimals.
 * @param value in SI units
 * @param digits significant digits; digits before the mark are never rounded away
 * @returns `–` where the value isn't finite
 */
export function formatInPrefix(value: number, kind: QuantityKind, prefix: Prefix, digits = 3): string {
  if (!Number.isFinite(value)) return '–';
  const { style } = QUANTITIES[kind];
  if (style === 'prefixed') return plainNumber(value, digits, PREFIXES[prefix]);
  if (style === 'temperature') return plainNumber(inCelsius(value), digits);
  return splitQuantity(value, kind, { digits }).number;
}

/** The unit that heads a column of a kind in a prefix: `nV/√Hz`, `°C`, `%`, or empty. */
export function unitInPrefix(kind: QuantityKind, prefix: Prefix): string {
  const { style, unit } = QUANTITIES[kind];
  if (style === 'temperature') return '°C';
  if (style === 'perMillion') return PER_MILLION;
  return style === 'percent' ? '%' : prefix + unit;
}
