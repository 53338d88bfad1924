import { decimalOfNumber, decimalToNumber } from './decimal.js';
import { CELSIUS, fromSi } from './unit.js';

/** Whether a temperature is low enough, below −100 °C, to be shown in kelvin. */
export function isCold(kelvin: number): boolean {
  return kelvin < 173.15;
}

/** A finite temperature in K as °C, without binary dust: 298.15 is 25. */
export function inCelsius(kelvin: number): number {
  return decimalToNumber(fromSi(decimalOfNumber(kelvin), CELSIUS));
}
