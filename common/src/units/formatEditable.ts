import type { QuantityKind } from './kinds.js';
import { shortestNumber } from './plainNumber.js';
import { PREFIXES, prefixFor } from './prefixes.js';
import { PER_MILLION, QUANTITIES } from './quantities.js';
import { scientific, trimZeros, writeExponent } from './scientific.js';
import { inCelsius, isCold } from './temperature.js';

/**
 * The text that stands in a field while its value is edited: all digits, as few as give the value back, with prefix
 * and unit: `4.7 kΩ`, `25 °C`, `1 %`. `parseQuantity` reads it back to the same value (within 1e-12).
 * @param value in SI units
 * @returns empty where the value isn't finite
 */
export function formatEditable(value: number, kind: QuantityKind): string {
  if (!Number.isFinite(value)) return '';
  const { style, unit } = QUANTITIES[kind];
  switch (style) {
    case 'prefixed':
      return prefixed(value, unit);
    case 'plain':
      return `${shortestNumber(value)} ${unit}`.trim();
    case 'percent':
      return `${shortestNumber(value, -2)} %`;
    case 'perMillion':
      return `${shortestNumber(value, -6)} ${PER_MILLION}`;
    case 'decibel':
      return `${shortestNumber(value)} dB`;
    case 'temperature':
      return isCold(value) ? prefixed(value, 'K') : `${shortestNumber(inCelsius(value))} °C`;
  }
}

function prefixed(value: number, unit: string): string {
  if (value === 0) return `0 ${unit}`;
  const exact = scientific(value);
  const prefix = prefixFor(exact.exponent);
  if (prefix === null) return `${trimZeros(writeExponent(exact))} ${unit}`;
  return `${shortestNumber(value, PREFIXES[prefix])} ${prefix}${unit}`;
}
