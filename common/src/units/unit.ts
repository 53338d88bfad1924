import {
  addDecimals,
  decimalOf,
  negateDecimal,
  scaleDecimal,
  shiftDecimal,
  type Decimal,
} from './decimal.js';
import type { QuantityKind } from './kinds.js';

/** A unit: SI value = value · factor + offset. */
export interface Unit {
  /** The kind it measures; null for the empty unit of a pure number, which fits any kind. */
  kind: QuantityKind | null;
  scale: 'linear' | 'celsius' | 'fahrenheit';
  /** The power of ten of a linear unit, from its prefix; 0 otherwise. */
  exponent: number;
  factor: number;
  offset: number;
}

const ZERO_CELSIUS = decimalOf('273.15');
const ZERO_FAHRENHEIT = decimalOf('459.67');

export const CELSIUS: Unit = {
  kind: 'temperature',
  scale: 'celsius',
  exponent: 0,
  factor: 1,
  offset: 273.15,
};
export const FAHRENHEIT: Unit = {
  kind: 'temperature',
  scale: 'fahrenheit',
  exponent: 0,
  factor: 5 / 9,
  offset: (459.67 * 5) / 9,
};

/** The unit of a kind, or of a pure number, with the prefix that stands for 10^exponent. */
export function linearUnit(kind: QuantityKind | null, exponent = 0): Unit {
  return { kind, scale: 'linear', exponent, factor: Number(`1e${exponent}`), offset: 0 };
}

/** The SI value of a value in a unit, exact: 0 °C = 273.15 K (SI Brochure, 9th ed.), K = (°F + 459.67)·5/9. */
export function toSi(value: Decimal, unit: Unit): Decimal {
  if (unit.scale === 'celsius') return addDecimals(value, ZERO_CELSIUS);
  if (unit.scale === 'fahrenheit') return scaleDecimal(addDecimals(value, ZERO_FAHRENHEIT), 5n, 9n);
  return shiftDecimal(value, unit.exponent);
}

/** The value in a unit of an SI value; the inverse of `toSi`. */
export function fromSi(value: Decimal, unit: Unit): Decimal {
  if (unit.scale === 'celsius') return addDecimals(value, negateDecimal(ZERO_CELSIUS));
  if (unit.scale === 'fahrenheit') {
    return addDecimals(scaleDecimal(value, 9n, 5n), negateDecimal(ZERO_FAHRENHEIT));
  }
  return shiftDecimal(value, -unit.exponent);
}
