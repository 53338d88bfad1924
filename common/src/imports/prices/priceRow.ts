import type { OfferTerms, PriceBreak } from '../../prices/index.js';
import type { Reading } from '../../parts/index.js';
import type { ColumnMapping } from '../columnMapping.js';
import type { DecimalMark } from '../decimalMark.js';
import type { RowError } from '../rowVerdict.js';
import { NOT_STATED, type WholeList } from '../wholeList.js';
import { isBlankCell, priceCellReader } from './priceCells.js';
import { priceField } from './priceFields.js';

/** A price that a row states, and in which of the list's columns. */
export interface QuotedBreak extends PriceBreak {
  column: number;
}

/** Of whose part and supplier a row speaks. */
export interface QuotedNames {
  manufacturer: string;
  partNumber: string;
  supplier: string;
}

/** What a row of a price list states; what it leaves open isn't there. */
export interface QuotedRow {
  /** Null where a name is missing or can't be read. */
  names: QuotedNames | null;
  stated: Partial<Omit<OfferTerms, 'breaks'>>;
  breaks: QuotedBreak[];
  /** Everything that is wrong with its cells. */
  errors: RowError[];
}

/** Reads the rows of one price list. */
export interface PriceRowReader {
  /** The list has a column of quantities: several rows make one offer. */
  isLong: boolean;
  read(cells: readonly string[]): QuotedRow;
  /** The error of a field, at the column that states it. */
  errorAt(field: string, why: string, cells: readonly string[]): RowError;
}

interface Column extends ColumnMapping {
  expected: string;
  read(cell: string): Reading<string | number>;
}

type Values = Map<string, string | number>;

/**
 * Makes a reader of the rows of a price list whose columns are mapped: of the wide form, with a column of prices for
 * each quantity, and of the long one, with a row for each quantity. An empty cell states nothing.
 */
export function priceRowReader(
  mapping: readonly ColumnMapping[],
  mark: DecimalMark,
  wholeList: WholeList = NOT_STATED,
): PriceRowReader {
  const columns = mapping.map((column): Column => {
    const { expected } = priceField(column.field);
    return { ...column, expected, read: priceCellReader(column, mark) };
  });
  const isLong = columns.some(({ field }) => field === 'quantity');
  const errorAt = (field: string, why: string, cells: readonly string[]): RowError => {
    const column = columns.find((one) => one.field === field);
    const expected = column?.expected ?? priceField(field).expected;
    const value = column === undefined ? '' : (cells[column.column] ?? '');
    return { column: column?.column ?? null, value, why, expected };
  };
  const unit = columns.find(({ field }) => field === 'unitPrice')?.unit || null;
  const read = (cells: readonly string[]): QuotedRow => {
    const { values, breaks, errors } = readCells(columns, cells);
    const refuse = (field: string, why: string) => errors.push(errorAt(field, why, cells));
    const supplier = values.get('supplier') ?? wholeList.supplier;
    const names = namesOf(values, supplier);
    if (names === null && errors.length === 0) refuse(missingName(values), 'a text was expected');
    const currency = values.get('currency') ?? unit ?? wholeList.currency;
    if (unit !== null && currency !== unit) refuse('currency', `the column of prices is in ${unit}`);
    const price = singlePrice(columns, values, isLong);
    if (typeof price === 'string') refuse('quantity', price);
    if (typeof price === 'object') breaks.push(price);
    return { names, stated: statedTerms(values, currency), breaks, errors };
  };
  return { isLong, read, errorAt };
}

function namesOf(values: Values, supplier: string | number | null): QuotedNames | null {
  const [manufacturer, partNumber] = [values.get('manufacturer'), values.get('partNumber')];
  if (manufacturer === undefined || partNumber === undefined || supplier === null) return null;
  return { manufacturer: String(manufacturer), partNumber: String(partNumber), supplier: String(supplier) };
}

function missingName(values: Values): string {
  return ['manufacturer', 'partNumber'].find((field) => !values.has(field)) ?? 'supplier';
}

function readCells(columns: readonly Column[], cells: readonly string[]) {
  const values: Values = new Map();
  const breaks: QuotedBreak[] = [];
  const errors: RowError[] = [];
  for (const { column, field, form, quantity, expected, read } of columns) {
    const cell = cells[column] ?? '';
    if (isBlankCell(cell)) continue;
    const reading = read(cell);
    if (!reading.ok) errors.push({ column, value: cell, why: reading.message, expected });
    else if (form !== 'break') values.set(field, reading.value);
    else breaks.push({ minimumQuantity: quantity!, unitPrice: String(reading.value), column });
  }
  return { values, breaks, errors };
}

/** The price of a list with one column of prices, from one piece on where it has none of quantities. */
function singlePrice(
  columns: readonly Column[],
  values: Values,
  isLong: boolean,
): QuotedBreak | string | undefined {
  const column = columns.find(({ field, form }) => field === 'unitPrice' && form === 'value')?.column;
  const [unitPrice, quantity] = [values.get('unitPrice'), isLong ? values.get('quantity') : 1];
  if (column === undefined || unitPrice === undefined) return undefined;
  if (quantity === undefined) return 'minimum quantity: a whole number was expected beside the price';
  return { minimumQuantity: Number(quantity), unitPrice: String(unitPrice), column };
}

const TERMS = [
  'supplierNumber',
  'minimumOrderQuantity',
  'orderMultiple',
  'leadTimeDays',
  'stock',
  'validFrom',
  'validUntil',
] as const;

function statedTerms(values: Values, currency: string | number | null): QuotedRow['stated'] {
  const terms = Object.fromEntries(
    TERMS.filter((key) => values.has(key)).map((key) => [key, values.get(key)]),
  );
  return currency === null ? terms : { ...terms, currency: String(currency) };
}
