import { cellText, type CellKey, type GridRow } from './cells';
import { type Change, type Draft, draftText } from './draft';
import { type ReadContext, readRow, type RowReading } from './readRow';

/** A row as the grid shows it. */
export interface ShownRow extends GridRow {
  change: Change | undefined;
  /** What of the change can be sent; null where nothing can. */
  body: RowReading['body'];
  /** What is wrong, by column. */
  errors: ReadonlyMap<string, string>;
  /** Somebody else has changed the offer since the change was begun. */
  isOverrun: boolean;
}

const NO_ERRORS: ReadonlyMap<string, string> = new Map();

/** A row without changes; the same object as long as the server says the same, so that the grid leaves it alone. */
export function plainRow(row: GridRow): ShownRow {
  return { ...row, change: undefined, body: null, errors: NO_ERRORS, isOverrun: false };
}

/** The rows with what is changed of them; changed ones that the list no longer holds stand first. */
export function shownRows(listed: readonly ShownRow[], draft: Draft, context: ReadContext): ShownRow[] {
  const keys = new Set(listed.map(({ key }) => key));
  const unlisted = [...draft.changes.values()].filter(({ base }) => !keys.has(base.key));
  return [...unlisted.map(({ base }) => plainRow(base)), ...listed].map((row) =>
    shownRow(row, draft, context),
  );
}

function shownRow(row: ShownRow, { changes, refusals }: Draft, context: ReadContext): ShownRow {
  const change = changes.get(row.key);
  const refused = refusals.filter(({ key }) => key === row.key);
  if (change === undefined && refused.length === 0) return row;
  const reading = change && change.cells.size > 0 ? readRow({ ...change, base: row }, context) : null;
  const errors = new Map(reading?.errors);
  for (const { column, message } of refused) errors.set(column, message);
  return {
    ...row,
    change,
    body: reading?.body ?? null,
    errors,
    isOverrun: change !== undefined && change.base.offer?.id !== row.offer?.id,
  };
}

export function shownText(row: ShownRow, cell: CellKey): string {
  return draftText(row, row.change, cell);
}

export function isChanged({ change }: ShownRow, column: string): boolean {
  return change?.cells.has(column as CellKey) ?? false;
}

/** What the cell said before it was changed. */
export function textBefore(row: ShownRow, column: string): string {
  return cellText(row, column as CellKey);
}
