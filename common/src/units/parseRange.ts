import type { QuantityKind } from './kinds.js';
import { normaliseText } from './normaliseText.js';
import { parseQuantity } from './parseQuantity.js';
import { loneExponent } from './prefixes.js';
import { readAmount } from './readAmount.js';

export interface Range {
  from: number;
  to: number;
}

const BETWEEN = /^(.*?[\p{L}\d.,°%)])(?:\s*\.{2,}\s*|\s*~\s*|(?<!\de)\s*-\s*|\s+to\s+)([+-]?[.,]?\d.*)$/iu;

/**
 * Reads a range such as `0.1-10 Hz`, `20 Hz to 20 kHz` or `5…15 V`. A unit behind the second number alone is that of
 * both, unless the range would have no extent then (`20-20 kHz`); a prefix alone belongs to its own number (`20-20k`).
 * @param text what was typed or pasted, any string
 * @returns both ends in SI units, the lower first; null where the text is no range of that kind
 */
export function parseRange(text: string, kind: QuantityKind): Range | null {
  const [, first, second] = BETWEEN.exec(normaliseText(text)) ?? [];
  if (first === undefined) return null;
  const to = parseQuantity(second, kind);
  if (!to.ok) return null;
  const readings = [`${first} ${sharedUnit(first, second)}`, first].map((spelt) =>
    parseQuantity(spelt, kind),
  );
  const from = readings.find((reading) => reading.ok && reading.value < to.value);
  return from?.ok ? { from: from.value, to: to.value } : null;
}

function sharedUnit(first: string, second: string): string {
  const unit = readAmount(second)?.unitText ?? '';
  return readAmount(first)?.unitText === '' && loneExponent(unit) === null ? unit : '';
}
