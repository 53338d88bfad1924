import { decimalToNumber, isAbsurd } from './decimal.js';
import type { QuantityKind } from './kinds.js';
import { normaliseText } from './normaliseText.js';
import { parseUnit } from './parseUnit.js';
import { loneExponent } from './prefixes.js';
import { QUANTITIES } from './quantities.js';
import { readAmount, type Amount } from './readAmount.js';
import { readValueCode } from './readValueCode.js';
import {
  ambiguousHertzMessage,
  emptyMessage,
  notANumberMessage,
  outOfRangeMessage,
  wrongKindMessage,
} from './refusals.js';
import { CELSIUS, linearUnit, toSi, type Unit } from './unit.js';
import { isAmbiguousHertz } from './unitSymbol.js';

export type ParsedQuantity = { ok: true; value: number } | { ok: false; message: string };

const LONGEST = 200;

/**
 * Reads engineering input in SI units: `4k7` (IEC 60062), `4.7 kΩ`, `0,1 µF`, `3.3 nV/rtHz`, `−40 °C`, `1 %`.
 *
 * A number alone is in the SI unit, but a temperature alone is in °C. A prefix may stand without its unit, except for
 * temperature, fraction and decibel. `m` is milli, `M` and `meg` mega; `mhz` is refused. A lone comma is a
 * decimal mark, also before three digits, but groups the thousands of a count; with both marks the last one is the
 * decimal mark. Spaces of all kinds and apostrophes group thousands. The value is put together in decimal, so that
 * `0,1 µF` is exactly 1e-7. A gain may be in decibels, 20·log10 of it, and have its `×` in front.
 * @param text what was typed or pasted, any string
 * @param kind the quantity that the field holds
 * @returns the finite SI value, or a message that says what was expected; bounds aren't checked. Never throws.
 */
export function parseQuantity(text: string, kind: QuantityKind): ParsedQuantity {
  const normalised = normaliseText(text);
  if (normalised === '') return refuse(emptyMessage(kind));
  if (normalised.length > LONGEST) return refuse(notANumberMessage(text, '', kind));
  const spelt = SPELLINGS[kind]?.(normalised) ?? normalised;
  const amount = readValueCode(spelt, kind) ?? readAmount(spelt);
  if (!amount) return refuse(notANumberMessage(text, normalised, kind));
  const unit = unitOf(amount.unitText, kind);
  if (unit?.kind === kind) return valueIn(text, amount, unit, kind);
  if (unit?.kind === 'decibel' && kind === 'gain') return gainOf(text, amount);
  return refuse(unitMessage(text, normalised, amount.unitText, unit, kind));
}

/** What only one kind is written with, in the spelling of all. */
const SPELLINGS: Partial<Record<QuantityKind, (text: string) => string>> = {
  gain: (text) => text.replace(/^[×x] ?(?=[\d.,])/i, ''),
  count: (text) => text.replace(/^\d{1,3}(?:,\d{3})+(?![\d.,])/, (grouped) => grouped.replaceAll(',', '')),
};

function unitOf(unitText: string, kind: QuantityKind): Unit | null {
  if (unitText === '') return kind === 'temperature' ? CELSIUS : linearUnit(kind);
  const exponent = takesLonePrefix(kind) ? loneExponent(unitText) : null;
  return exponent === null ? parseUnit(unitText, kind) : linearUnit(kind, exponent);
}

function takesLonePrefix(kind: QuantityKind): boolean {
  return QUANTITIES[kind].style === 'prefixed' || kind === 'gain' || kind === 'count';
}

function valueIn(text: string, { number }: Amount, unit: Unit, kind: QuantityKind): ParsedQuantity {
  if (isAbsurd(number)) return refuse(outOfRangeMessage(text, kind));
  const exact = toSi(number, unit);
  const value = decimalToNumber(exact);
  const vanished = value === 0 && exact.coefficient !== 0n;
  return Number.isFinite(value) && !vanished ? { ok: true, value } : refuse(outOfRangeMessage(text, kind));
}

function gainOf(text: string, { number }: Amount): ParsedQuantity {
  const value = isAbsurd(number) ? Infinity : 10 ** (decimalToNumber(number) / 20);
  return Number.isFinite(value) && value > 0 ? { ok: true, value } : refuse(outOfRangeMessage(text, 'gain'));
}

function unitMessage(
  text: string,
  normalised: string,
  unitText: string,
  unit: Unit | null,
  kind: QuantityKind,
): string {
  if (unit?.kind) return wrongKindMessage(text, unit.kind, kind);
  if (kind === 'frequency' && isAmbiguousHertz(unitText)) return ambiguousHertzMessage(text);
  return notANumberMessage(text, normalised, kind);
}

function refuse(message: string): ParsedQuantity {
  return { ok: false, message };
}
