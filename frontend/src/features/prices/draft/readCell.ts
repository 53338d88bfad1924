import { boundsError, type QuantityField, type Reading, readText } from '@roothertz/common/parts';
import { currencyError, OFFER_FIELDS, readPrice, SUPPLIER_NUMBER } from '@roothertz/common/prices';
import { type CellKey, quantityOf } from './cells';

/** A whole number; digits in groups are refused, for `1,000` can be a thousand or one. */
export function readCount(field: QuantityField, input: string): Reading<number> {
  const text = input.trim();
  const refuse = (message: string): Reading<number> => ({ ok: false, message: `${field.label}: ${message}` });
  if (/^\d[\d.,\s’']*$/.test(text) && !/^\d+$/.test(text))
    return refuse('a whole number without groups or decimals was expected, such as 1000');
  if (!/^[-−]?\d+$/.test(text)) return refuse('a whole number such as 1000 was expected');
  const value = Number(text.replace('−', '-'));
  const message = boundsError(field, value);
  return message === null ? { ok: true, value } : { ok: false, message };
}

export function readCurrency(input: string): Reading<string> {
  const code = input.trim().toUpperCase();
  const message = currencyError(code);
  return message === null ? { ok: true, value: code } : { ok: false, message };
}

export function readSupplierNumber(input: string): Reading<string> {
  return readText(SUPPLIER_NUMBER, input);
}

/** Whether a text is a number that a cell can take. */
export function isNumberOf(cell: CellKey, text: string): boolean {
  const isNumeric = quantityOf(cell) !== null || cell in OFFER_FIELDS;
  return isNumeric && readingOf(cell, text)!.ok;
}

type CountCell = keyof typeof OFFER_FIELDS & CellKey;

/** Whether two texts of a cell mean the same. */
export function sameValue(cell: CellKey, one: string, other: string): boolean {
  return meaning(cell, one) === meaning(cell, other);
}

function meaning(cell: CellKey, text: string): string {
  const trimmed = text.trim();
  if (trimmed === '') return '';
  const reading = readingOf(cell, trimmed);
  return reading?.ok ? `= ${reading.value}` : trimmed;
}

function readingOf(cell: CellKey, text: string): Reading<string | number> | null {
  if (quantityOf(cell) !== null) return readPrice(text);
  if (cell === 'currency') return readCurrency(text);
  return cell in OFFER_FIELDS ? readCount(OFFER_FIELDS[cell as CountCell], text) : null;
}
