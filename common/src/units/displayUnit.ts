import { decimalOfNumber, decimalToNumber, type Decimal } from './decimal.js';
import { parseUnit } from './parseUnit.js';
import { fromSi, toSi, type Unit } from './unit.js';

/**
 * An SI value in a display unit: `toDisplayUnit(1.1e-9, 'nV/√Hz')` is 1.1, without binary dust.
 * @param unit any unit that `parseUnit` reads; the empty one leaves the value as it is
 * @returns the value in that unit; a value that isn't finite comes back as it is
 * @throws RangeError for a unit that `parseUnit` doesn't read
 */
export function toDisplayUnit(value: number, unit: string): number {
  return convert(value, unit, fromSi);
}

/**
 * The SI value of a value in a display unit: `fromDisplayUnit(40, 'MHz')` is 40e6. The inverse of `toDisplayUnit`.
 * @throws RangeError for a unit that `parseUnit` doesn't read
 */
export function fromDisplayUnit(value: number, unit: string): number {
  return convert(value, unit, toSi);
}

function convert(value: number, text: string, change: (value: Decimal, unit: Unit) => Decimal): number {
  const unit = parseUnit(text);
  if (!unit) throw new RangeError(`unknown unit “${text}”`);
  return Number.isFinite(value) ? decimalToNumber(change(decimalOfNumber(value), unit)) : value;
}
