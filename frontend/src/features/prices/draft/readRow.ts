import type { FieldError, Reading } from '@roothertz/common/parts';
import { checkOffer, OFFER_FIELDS, type PriceBreak, readPrice } from '@roothertz/common/prices';
import type { SavedPriceRow, Supplier } from '../../../api/prices';
import { type CellKey, type GridRow, PLAIN_CELLS, priceCell, quantityOf } from './cells';
import { type Change, draftText } from './draft';
import { readCount, readCurrency, readSupplierNumber } from './readCell';

/** What a changed row says: what is wrong with it, by column, or else what is to be saved. */
export interface RowReading {
  errors: ReadonlyMap<string, string>;
  body: SavedPriceRow | null;
}

export interface ReadContext {
  suppliers: readonly Supplier[];
  /** The team's own. */
  currency: string;
  today: string;
}

type Terms = Required<Omit<SavedPriceRow, 'id' | 'version' | 'partId'>>;

/** Reads a changed row by the same rules as the server: each cell by itself, then the offer as a whole. */
export function readRow({ base, cells }: Change, context: ReadContext): RowReading {
  const { suppliers, today } = context;
  const errors = new Map<string, string>();
  const text = (cell: CellKey) => draftText(base, { base, cells }, cell);
  const take = <Value>(cell: CellKey, reading: Reading<Value>, instead: Value): Value => {
    if (reading.ok) return reading.value;
    errors.set(cell, reading.message);
    return instead;
  };
  const count = (cell: keyof typeof OFFER_FIELDS & CellKey, empty: number) =>
    text(cell) === '' ? empty : take(cell, readCount(OFFER_FIELDS[cell], text(cell)), 1);
  const optional = (cell: 'leadTimeDays' | 'stock') => (text(cell) === '' ? null : count(cell, 0));
  const breaks = pricedCells(base, cells).flatMap((quantity): PriceBreak[] => {
    const cell = priceCell(quantity);
    const unitPrice = take(cell, readPrice(text(cell)), '');
    return unitPrice === '' ? [] : [{ minimumQuantity: quantity, unitPrice }];
  });
  const hasWrongPrice = [...errors.keys()].some((cell) => quantityOf(cell) !== null);
  const terms: Terms = {
    supplierId: take('supplier', readSupplier(base, text('supplier'), suppliers), ''),
    supplierNumber: take('supplierNumber', readSupplierNumber(text('supplierNumber')), ''),
    currency: take(
      'currency',
      readCurrency(text('currency') || usualCurrency(text('supplier'), context)),
      'EUR',
    ),
    breaks,
    minimumOrderQuantity: count('minimumOrderQuantity', 1),
    orderMultiple: count('orderMultiple', 1),
    leadTimeDays: optional('leadTimeDays'),
    stock: optional('stock'),
    validFrom: text('validFrom') || (base.offer === null ? today : ''),
    validUntil: text('validUntil') || null,
  };
  for (const error of checkOffer(terms, today)) {
    const cell = cellOf(error, breaks);
    if (!errors.has(cell) && !(error.field === 'breaks' && hasWrongPrice)) errors.set(cell, error.message);
  }
  return { errors, body: errors.size > 0 ? null : bodyOf(base, cells, terms) };
}

function pricedCells(base: GridRow, cells: Change['cells']): number[] {
  const offered = base.offer?.breaks.map(({ minimumQuantity }) => minimumQuantity) ?? [];
  const drafted = [...cells.keys()].flatMap((cell) => quantityOf(cell) ?? []);
  return [...new Set([...offered, ...drafted])]
    .filter((quantity) => draftText(base, { base, cells }, priceCell(quantity)) !== '')
    .sort((a, b) => a - b);
}

function readSupplier({ offer }: GridRow, name: string, suppliers: readonly Supplier[]): Reading<string> {
  if (offer !== null) return { ok: true, value: offer.supplier.id };
  if (name === '') return { ok: false, message: 'supplier: a name was expected' };
  const found = supplierNamed(name, suppliers);
  return found
    ? { ok: true, value: found.id }
    : { ok: false, message: `supplier: the team has none called “${name}” yet` };
}

function supplierNamed(name: string, suppliers: readonly Supplier[]): Supplier | undefined {
  return suppliers.find((supplier) => supplier.name.toLowerCase() === name.toLowerCase());
}

/** What a new offer is in where nothing else is said: the currency of the supplier's latest one, or the team's. */
export function usualCurrency(supplier: string, { suppliers, currency }: ReadContext): string {
  return supplierNamed(supplier, suppliers)?.currency ?? currency;
}

/** The cell that an error of the offer as a whole belongs to; one about all prices belongs to the first. */
export function cellOf({ field }: FieldError, breaks: readonly { minimumQuantity: number }[]): string {
  const index = /^breaks\[(\d+)\]/.exec(field)?.[1];
  if (index !== undefined) return priceCell(breaks[Number(index)]?.minimumQuantity ?? 1);
  if (field === 'breaks') return priceCell(1);
  if (field === 'supplierId') return 'supplier';
  return (PLAIN_CELLS as readonly string[]).includes(field) ? field : 'part';
}

/** Only what is changed of an offer that stands; all of a new one. */
function bodyOf({ part, offer }: GridRow, cells: Change['cells'], terms: Terms): SavedPriceRow {
  if (offer === null) return { partId: part.id, ...terms };
  const keys = new Set(
    [...cells.keys()].map((cell) => (quantityOf(cell) === null ? cell : 'breaks') as keyof Terms),
  );
  const changed = Object.entries(terms).filter(([key]) => keys.has(key as keyof Terms));
  return { id: offer.id, version: offer.version, ...Object.fromEntries(changed) };
}
