import type { QuantityKind } from './kinds.js';
import { splitQuantity, type FormatOptions } from './splitQuantity.js';

/**
 * A value as text: engineering notation with SI prefix, three significant digits, the unit after a thin space
 * (U+2009), the true minus (U+2212): `4.70 kΩ`, `67.8 nV`, `3.30 nV/√Hz`.
 *
 * Rounding carries to the next prefix (999.96 Ω is `1.00 kΩ`); beyond y…Y the exponent is written (`1.00e30 Ω`).
 * Temperatures in °C, below −100 °C in K; fractions in percent; temperature
 * coefficients in ppm/K; decibels with two decimals; gain and count without
 * prefix, thousands grouped from five digits on. Temperature, gain and count never end in decimal zeros.
 * @param value in SI units
 * @returns `–` where the value isn't finite
 */
export function formatQuantity(value: number, kind: QuantityKind, options: FormatOptions = {}): string {
  const { number, unit } = splitQuantity(value, kind, options);
  return unit === '' ? number : `${number}\u2009${unit}`;
}
