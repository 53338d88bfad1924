import { formatQuantity, QUANTITIES, splitQuantity, type QuantityKind } from '@roothertz/common/units';

/** A tick's label: the number with its prefix, without the unit, such as `10 µ`. */
export function tickText(value: number, kind: QuantityKind): string {
  const { number, unit } = splitQuantity(value, kind, { trim: true });
  const prefix = unit.slice(0, unit.length - QUANTITIES[kind].unit.length);
  return prefix === '' ? number : `${number}\u2009${prefix}`;
}

/** An axis' name with its unit, such as `source resistance, Ω`. */
export function axisName(label: string, kind: QuantityKind): string {
  const { unit } = QUANTITIES[kind];
  return unit === '' ? label : `${label}, ${unit}`;
}

export function valueText(value: number, kind: QuantityKind): string {
  return formatQuantity(value, kind);
}
