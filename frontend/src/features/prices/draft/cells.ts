import { shortPrice } from '@roothertz/common/prices';
import type { Offer, OfferedPart, PriceListRow } from '../../../api/prices';

/** A cell that can be edited; those of unit prices are named by their quantity. */
export type CellKey =
  | 'supplier'
  | 'supplierNumber'
  | 'currency'
  | `price:${number}`
  | 'minimumOrderQuantity'
  | 'orderMultiple'
  | 'leadTimeDays'
  | 'stock'
  | 'validFrom'
  | 'validUntil';

/** A row of the grid: an offer for a part, or a part without one. */
export interface GridRow {
  key: string;
  part: OfferedPart;
  offer: Offer | null;
  /** Names of the saved conditions in which the part is chosen. */
  usedIn: readonly string[];
}

export const PLAIN_CELLS = [
  'supplier',
  'supplierNumber',
  'currency',
  'minimumOrderQuantity',
  'orderMultiple',
  'leadTimeDays',
  'stock',
  'validFrom',
  'validUntil',
] as const satisfies readonly CellKey[];

const LABELS: Record<(typeof PLAIN_CELLS)[number], string> = {
  supplier: 'supplier',
  supplierNumber: 'supplier’s number',
  currency: 'currency',
  minimumOrderQuantity: 'MOQ',
  orderMultiple: 'multiple',
  leadTimeDays: 'lead time in days',
  stock: 'stock',
  validFrom: 'valid from',
  validUntil: 'valid until',
};

/** What a cell is called in a sentence. */
export function cellLabel(cell: CellKey): string {
  const quantity = quantityOf(cell);
  return quantity === null ? LABELS[cell as keyof typeof LABELS] : `at ${quantity}`;
}

/** The cells in which rows can differ: prices in ascending order of quantity, then the others. */
export function comparedCells(rows: readonly GridRow[], more: Iterable<CellKey> = []): CellKey[] {
  const offered = rows.flatMap(
    ({ offer }) => offer?.breaks.map(({ minimumQuantity }) => minimumQuantity) ?? [],
  );
  const quantities = new Set([...offered, ...[...more].flatMap((cell) => quantityOf(cell) ?? [])]);
  return [...[...quantities].sort((a, b) => a - b).map(priceCell), ...PLAIN_CELLS];
}

export function priceCell(quantity: number): CellKey {
  return `price:${quantity}`;
}

/** The quantity of a cell with a unit price; null where the cell is another. */
export function quantityOf(cell: string): number | null {
  return cell.startsWith('price:') ? Number(cell.slice('price:'.length)) : null;
}

export function isCell(column: string): column is CellKey {
  return quantityOf(column) !== null || (PLAIN_CELLS as readonly string[]).includes(column);
}

/** Who sells the part is settled when an offer is opened; everything else of it can change. */
export function isEditable({ offer }: GridRow, cell: CellKey): boolean {
  return cell !== 'supplier' || offer === null;
}

/**
 * The row keeps its key through changes of its terms, which give the offer another id: a supplier has one offer for a
 * part under each number, whatever its case.
 */
export function toGridRow({ part, offer, usedIn }: PriceListRow): GridRow {
  const key = offer
    ? `offer ${part.id} ${offer.supplier.id} ${offer.supplierNumber.toLowerCase()}`
    : `part ${part.id}`;
  return { key, part, offer, usedIn };
}

/** What a cell says before it is edited. */
export function cellText({ offer }: GridRow, cell: CellKey): string {
  if (offer === null) return '';
  const quantity = quantityOf(cell);
  if (quantity !== null) {
    const found = offer.breaks.find(({ minimumQuantity }) => minimumQuantity === quantity);
    return found ? shortPrice(found.unitPrice) : '';
  }
  if (cell === 'supplier') return offer.supplier.name;
  return String(offer[cell as keyof Offer] ?? '');
}

/** What a column that can't be edited says of a row. */
export function standingText({ part, offer, usedIn }: GridRow, column: string): string {
  if (column === 'part') return part.partNumber;
  if (column === 'state') return offer ? offer.states.join(', ') : 'missing';
  if (column === 'confirmed') return offer?.confirmedAt ?? '';
  return column === 'usedIn' ? usedIn.join(', ') : '';
}
