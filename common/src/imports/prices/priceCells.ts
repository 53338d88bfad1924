import { boundsError, type QuantityField, readText, type Reading } from '../../parts/index.js';
import { currencyError, OFFER_FIELDS, readPrice } from '../../prices/index.js';
import type { ColumnMapping } from '../columnMapping.js';
import { originalCell } from '../csvCells.js';
import { type DecimalMark, ungrouped } from '../decimalMark.js';
import { readLeadTime, type TimeUnit } from './leadTime.js';
import { PRICE_TEXTS, priceField } from './priceFields.js';
import { readDay } from './readDay.js';

const COUNTS: Readonly<Record<string, QuantityField>> = {
  ...OFFER_FIELDS,
  quantity: OFFER_FIELDS.minimumQuantity,
};
const PIECES = /\s*(?:pcs|pc|pce|pieces?|st|stk|stück|pièces?|units?|u)\.?$/iu;
const SPACED = /^\d{1,3}(?:[\s'’]\d{3})+$/;
const DASH = /^[-–—]+$/;

/** Reads the cells of a mapped column of a price list. */
export function priceCellReader(
  { field, unit }: Pick<ColumnMapping, 'field' | 'unit'>,
  mark: DecimalMark,
): (cell: string) => Reading<string | number> {
  const { kind, label } = priceField(field);
  const readers: Record<typeof kind, (cell: string) => Reading<string | number>> = {
    text: (cell) => readText(PRICE_TEXTS[field], cell),
    currency: readCurrency,
    count: (cell) => readCount(COUNTS[field], cell, mark),
    'lead-time': (cell) => readLeadTime(cell, (unit ?? 'days') as TimeUnit),
    price: (cell) => readPrice(cell, mark === 'comma' ? ',' : '.'),
    day: (cell) => readDay(label, cell),
  };
  return (cell) => readers[kind](originalCell(cell));
}

/** Whether a cell states nothing: in lists of prices a dash stands for that. */
export function isBlankCell(cell: string): boolean {
  return DASH.test(cell.trim()) || cell.trim() === '';
}

function readCurrency(cell: string): Reading<string> {
  const code = cell.trim() === '€' ? 'EUR' : cell.trim().toUpperCase();
  const message = currencyError(code);
  return message === null ? { ok: true, value: code } : { ok: false, message };
}

/** A number of pieces: “1.000 Stück” with a decimal comma and “100,000” of an ERP are whole numbers. */
function readCount(field: QuantityField, cell: string, mark: DecimalMark): Reading<number> {
  const text = ungrouped(cell.trim().replace(PIECES, ''), mark).replace(
    mark === 'comma' ? /,0+$/ : /\.0+$/,
    '',
  );
  const whole = SPACED.test(text) ? text.replace(/\D/g, '') : text;
  if (!/^\d{1,12}$/.test(whole)) return { ok: false, message: `${field.label}: a whole number was expected` };
  const message = boundsError(field, Number(whole));
  return message === null ? { ok: true, value: Number(whole) } : { ok: false, message };
}
