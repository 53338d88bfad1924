import type { QuantityKind } from './kinds.js';
import { plainNumber } from './plainNumber.js';
import { PREFIXES, prefixFor } from './prefixes.js';
import { PER_MILLION, QUANTITIES } from './quantities.js';
import { scientific, trimZeros, writeExponent, writeFixed, writePlain } from './scientific.js';
import { inCelsius, isCold } from './temperature.js';

export interface FormatOptions {
  /** Significant digits, 1 to 17, default 3; a level in decibels gets one decimal less than that. */
  digits?: number;
  /** Drop zeros at the end of the fraction. */
  trim?: boolean;
}

/** A value as text in two pieces; the unit includes its prefix and may be empty. */
export interface QuantityText {
  number: string;
  unit: string;
}

/**
 * A value as number and unit apart, so that a column can line its numbers up; otherwise as `formatQuantity`.
 * @param value in SI units
 * @returns number `–` without unit where the value isn't finite
 */
export function splitQuantity(value: number, kind: QuantityKind, options: FormatOptions = {}): QuantityText {
  if (!Number.isFinite(value)) return { number: '–', unit: '' };
  const text = written(value, kind, Math.min(17, Math.max(1, Math.round(options.digits ?? 3))));
  return options.trim ? { ...text, number: trimZeros(text.number) } : text;
}

function written(value: number, kind: QuantityKind, digits: number): QuantityText {
  const { style, unit } = QUANTITIES[kind];
  switch (style) {
    case 'prefixed':
      return prefixed(value, unit, digits);
    case 'plain':
      return { number: trimZeros(plainNumber(value, digits)), unit };
    case 'percent':
      return { number: plainNumber(value, digits, -2), unit: '%' };
    case 'perMillion':
      return { number: plainNumber(value, digits, -6), unit: PER_MILLION };
    case 'decibel':
      return { number: writeFixed(value, digits - 1), unit };
    case 'temperature':
      return temperature(value, digits);
  }
}

function prefixed(value: number, unit: string, digits: number): QuantityText {
  if (value === 0) return { number: '0', unit };
  const rounded = scientific(value, digits);
  const prefix = prefixFor(rounded.exponent);
  if (prefix === null) return { number: writeExponent(rounded), unit };
  return { number: writePlain(rounded, PREFIXES[prefix]), unit: prefix + unit };
}

function temperature(value: number, digits: number): QuantityText {
  const text = isCold(value)
    ? prefixed(value, 'K', digits)
    : { number: plainNumber(inCelsius(value), digits), unit: '°C' };
  return { ...text, number: trimZeros(text.number) };
}
