import type { Action } from '@roothertz/common/access';
import { type ListColumns, partColumns, PRICE_COLUMNS } from '@roothertz/common/imports';
import type { LibraryPart } from '@roothertz/common/parts';
import { OP_AMPS, type PartTable, RESISTORS } from '../library/part-tables.js';
import type { ImportKind, PartListKind } from './import-states.js';

/** Of what kind of list an import is. */
interface ListKind {
  columns: ListColumns;
  /** What a member must be allowed who brings such lists in. */
  action: Action;
  mostRows: number;
}

const OF_PARTS = { action: 'parts.edit', mostRows: 500_000 } as const;

export const LIST_KINDS: Readonly<Record<ImportKind, ListKind>> = {
  'op-amps': { ...OF_PARTS, columns: partColumns(OP_AMPS.catalogue) },
  resistors: { ...OF_PARTS, columns: partColumns(RESISTORS.catalogue) },
  /** All rows of a price list are in memory at once, for the rows of an offer may stand anywhere in it. */
  prices: { action: 'prices.edit', mostRows: 50_000, columns: PRICE_COLUMNS },
};

const TABLES = { 'op-amps': OP_AMPS, resistors: RESISTORS };

/** Where the parts of a list of parts are kept. */
export function tableOf(kind: ImportKind): PartTable<LibraryPart> {
  return TABLES[kind as PartListKind] as unknown as PartTable<LibraryPart>;
}
