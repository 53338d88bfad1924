import {
  type Doubt,
  type FieldChange,
  ROW_STATES,
  type RowError,
  type RowState,
} from '@roothertz/common/imports';
import type { PartCells } from '../library/bulk-parts.js';
import type { QuotedOffer } from '../prices/quoted-offers.service.js';

/** A row of an uploaded list with its verdict; what doesn't concern it is left out. */
export interface StoredRow {
  /** The line of the file on which it begins. */
  line: number;
  state: RowState;
  manufacturer: string;
  partNumber: string;
  normalisedKey?: string;
  /** The part that the row changes; left out = the row is a new one. */
  partId?: number;
  baseVersion?: number;
  /** The part that is to be written. */
  content?: PartCells;
  /** The part that stood there. */
  before?: PartCells;
  /** Whose prices the row states. */
  supplier?: string;
  /** The offer that is to be written, at the first of its rows that changes something. */
  offer?: QuotedOffer;
  /** The id under which that offer was written. */
  writtenId?: number;
  changes?: FieldChange[];
  doubts?: Doubt[];
  errors?: RowError[];
  /** The cells of a refused row, for the list that is to be mended. */
  cells?: string[];
  /** An undoing left the part as it is, for it was edited since. */
  kept?: boolean;
}

/** The verdicts, and the rows that an undoing left as they are. */
export const ROW_LISTS = [...ROW_STATES, 'kept'] as const;
export type RowList = (typeof ROW_LISTS)[number];

/** Whether a row stands in a list; without a list, every row does. */
export function standsIn(row: StoredRow, list: RowList | undefined): boolean {
  if (list === undefined) return true;
  return list === 'kept' ? row.kept === true : row.state === list;
}
