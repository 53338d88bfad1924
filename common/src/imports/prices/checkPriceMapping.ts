import { boundsError, type FieldError } from '../../parts/index.js';
import { currencyError, MOST_BREAKS, OFFER_FIELDS } from '../../prices/index.js';
import type { ColumnMapping } from '../columnMapping.js';
import { NOT_STATED, type WholeList } from '../wholeList.js';
import { TIME_UNITS } from './leadTime.js';
import { PRICE_FIELDS, priceField } from './priceFields.js';

/**
 * What is wrong with the mapping of a price list that has so many columns, by paths such as `columns.3.unit`;
 * empty = its rows can be read. Supplier and currency may be stated of the whole list where it has no column.
 */
export function checkPriceMapping(
  mapping: readonly ColumnMapping[],
  columnCount: number,
  wholeList: WholeList = NOT_STATED,
): FieldError[] {
  const each = mapping.flatMap((column, index) => {
    const fault = columnFault(column, columnCount) ?? repeatFault(mapping, index);
    return fault === null ? [] : [{ field: `columns.${index}.${fault[0]}`, message: fault[1] }];
  });
  return [...each, ...priceFaults(mapping), ...missing(mapping, wholeList)];
}

type Fault = [string, string];

function columnFault({ column, field, form, unit, quantity }: ColumnMapping, count: number): Fault | null {
  if (column >= count) return ['column', `a column from 0 to ${count - 1} was expected`];
  if (!PRICE_FIELDS.some(({ key }) => key === field))
    return ['field', 'a field of a price list was expected'];
  if (form === 'break' ? field !== 'unitPrice' : form !== 'value')
    return ['form', `${priceField(field).label} isn’t stated in this form`];
  const outOfBounds = form === 'break' ? boundsError(OFFER_FIELDS.minimumQuantity, quantity) : null;
  return outOfBounds === null ? unitFault(field, unit) : ['quantity', outOfBounds];
}

function unitFault(field: string, unit: string | null): Fault | null {
  if (unit === null || unit === '') return null;
  const { kind, label } = priceField(field);
  if (kind === 'price') {
    const message = currencyError(unit);
    return message === null ? null : ['unit', message];
  }
  const isTime = kind === 'lead-time' && TIME_UNITS.some((one) => one === unit);
  return isTime ? null : ['unit', `a unit of ${label} was expected`];
}

function repeatFault(mapping: readonly ColumnMapping[], index: number): Fault | null {
  const { column, field, form, quantity } = mapping[index];
  const before = mapping.slice(0, index);
  if (before.some((one) => one.column === column)) return ['column', 'this column is mapped already'];
  const same = before.some(
    (one) => one.field === field && one.form === form && (one.quantity ?? null) === (quantity ?? null),
  );
  return same ? ['field', 'two columns hold this value: keep one'] : null;
}

/** Prices stand either in a column for each quantity, or in one, with the quantity beside it or without. */
function priceFaults(mapping: readonly ColumnMapping[]): FieldError[] {
  const fault = (message: string) => [{ field: 'columns', message }];
  const prices = mapping.filter(({ field }) => field === 'unitPrice');
  const breaks = prices.filter(({ form }) => form === 'break');
  const hasQuantity = mapping.some(({ field }) => field === 'quantity');
  if (breaks.length > MOST_BREAKS) return fault(`at most ${MOST_BREAKS} columns of prices were expected`);
  if (breaks.length > 0 && (breaks.length < prices.length || hasQuantity))
    return fault('prices stand either in a column for each quantity or in one column: leave one of them out');
  if (hasQuantity && prices.length === 0)
    return fault('a column of the unit price is needed beside the quantity');
  const currencies = new Set(prices.flatMap(({ unit }) => unit || []));
  return currencies.size > 1 ? fault('an offer has one currency for all its prices') : [];
}

function missing(mapping: readonly ColumnMapping[], wholeList: WholeList): FieldError[] {
  const has = (field: string) => mapping.some((one) => one.field === field);
  const names = (['manufacturer', 'partNumber'] as const)
    .filter((field) => !has(field))
    .map((field) => ({ field: 'columns', message: `a column for the ${priceField(field).label} is needed` }));
  const isPriced = mapping.some(({ field }) => field === 'unitPrice');
  const inHeading = mapping.some(({ field, unit }) => field === 'unitPrice' && unit);
  const stated = {
    supplier: has('supplier') || wholeList.supplier !== null,
    currency: !isPriced || has('currency') || inHeading || wholeList.currency !== null,
  };
  const message = 'a column is needed, or one value for the whole list';
  return [
    ...names,
    ...(['supplier', 'currency'] as const)
      .filter((field) => !stated[field])
      .map((field) => ({ field: `wholeList.${field}`, message: `${field}: ${message}` })),
  ];
}
