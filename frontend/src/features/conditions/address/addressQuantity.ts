import type { QuantityField } from '@roothertz/common/parts';
import { boundsError } from '@roothertz/common/parts';
import { formatEditable, parseQuantity, QUANTITIES, type QuantityKind } from '@roothertz/common/units';

/** A value as the address writes it: engineering notation without unit, `4.7k`, `2.2n`, `12C`, `77K`. */
export function writeAddressQuantity(value: number, kind: QuantityKind): string {
  const plain = formatEditable(value, kind).replace('−', '-').replace('µ', 'u').replace(/[ °]/g, '');
  const { unit, style } = QUANTITIES[kind];
  if (style === 'temperature') return givesBack(plain, value) ? plain : `${value}K`;
  if (style !== 'prefixed' || !plain.endsWith(unit)) return plain;
  const bare = plain.slice(0, plain.length - unit.length);
  return STANDS_ALONE.test(bare) ? bare : plain;
}

/** A temperature of many digits may lose the last of them on its way to °C and back. */
function givesBack(text: string, kelvin: number): boolean {
  const parsed = parseQuantity(text, 'temperature');
  return parsed.ok && parsed.value === kelvin;
}

/** Rarer prefixes than these are only read with their unit. */
const STANDS_ALONE = /[\dfpnumkMGT]$/;

export type AddressReading = { ok: true; value: number | 'auto' } | { ok: false; message: string };

/** What a text of the address means in a field; anything that the field itself takes is taken here. */
export function readAddressQuantity(text: string, field: QuantityField, takesAuto: boolean): AddressReading {
  if (takesAuto && text === 'auto') return { ok: true, value: 'auto' };
  const parsed = parseQuantity(text, field.kind);
  const message = parsed.ok ? boundsError(field, parsed.value) : parsed.message;
  if (parsed.ok && message === null) return parsed;
  return { ok: false, message: `the address said “${shortened(text)}”: ${message}` };
}

function shortened(text: string): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}
