import { decimalOf } from './decimal.js';
import type { QuantityKind } from './kinds.js';
import { TYPED_PREFIXES } from './prefixes.js';
import { QUANTITIES } from './quantities.js';
import type { Amount } from './readAmount.js';

const CODE = /^([+-]?)(\d*)([a-zµ])(\d+)\s*(Ω|ohms?|hz|[rfhvaw])?$/i;

/**
 * Reads a value code in which a letter stands for the decimal mark and the multiplier: `4k7`, `R47`, `2M2`, `4n7`
 * (IEC 60062). Null where the text is no such code or the letter isn't used for that kind.
 */
export function readValueCode(text: string, kind: QuantityKind): Amount | null {
  const match = CODE.exec(text);
  if (!match) return null;
  const [, sign, whole, letter, part, unitText = ''] = match;
  if (!QUANTITIES[kind].codeLetters.includes(letter)) return null;
  const exponent = TYPED_PREFIXES[letter] ?? 0;
  return { number: decimalOf(`${sign}${whole || '0'}.${part}`, exponent), unitText: unitText.toUpperCase() };
}
