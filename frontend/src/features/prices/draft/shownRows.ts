import type { Offer } from '../../../api/prices';
import { cellText, type CellKey, type GridRow } from './cells';
import { type Change, type Draft, draftText, type Refusal } from './draft';
import { type ReadContext, readRow, type RowReading, usualCurrency } from './readRow';

/** A row as the grid shows it. */
export interface ShownRow extends GridRow {
  change: Change | undefined;
  /** What of the change can be sent; null where nothing can. */
  body: RowReading['body'];
  /** What is wrong, by column. */
  errors: ReadonlyMap<string, string>;
  /** Somebody else has changed or closed the offer since the change was begun. */
  overrun: 'changed' | 'closed' | null;
  /** What an offer to be opened is in as long as nothing else is said. */
  usualCurrency: string;
}

const NO_ERRORS: ReadonlyMap<string, string> = new Map();

/** A row without changes; the same object as long as the server says the same, so that the grid leaves it alone. */
export function plainRow(row: GridRow): ShownRow {
  return { ...row, change: undefined, body: null, errors: NO_ERRORS, overrun: null, usualCurrency: '' };
}

/** The rows with what is changed of them; changed ones that the list no longer holds stand first. */
export function shownRows(listed: readonly ShownRow[], draft: Draft, context: ReadContext): ShownRow[] {
  const keys = new Set(listed.map(({ key }) => key));
  const unlisted = [...draft.changes.values()].filter(({ base }) => !keys.has(base.key));
  const refusals = new Map<string, Refusal[]>();
  for (const refusal of draft.refusals)
    refusals.set(refusal.key, [...(refusals.get(refusal.key) ?? []), refusal]);
  return [...unlisted.map(({ base }) => plainRow(base)), ...listed].map((row) => {
    const refused = refusals.get(row.key) ?? [];
    const isPlain = refused.length === 0 && !draft.changes.has(row.key);
    return isPlain ? row : shownRow(row, draft, refused, context);
  });
}

function shownRow(
  listed: ShownRow,
  { changes, overruns }: Draft,
  refused: readonly Refusal[],
  context: ReadContext,
): ShownRow {
  const change = changes.get(listed.key);
  const row = [change?.base.offer, overruns.get(listed.key)?.offer].reduce(withLater, listed);
  const reading = change && change.cells.size > 0 ? readRow({ ...change, base: row }, context) : null;
  const errors = new Map(reading?.errors);
  for (const { column, message } of refused) errors.set(column, message);
  const isChanged = change !== undefined && change.base.offer?.id !== row.offer?.id;
  return {
    ...row,
    change,
    body: reading?.body ?? null,
    errors,
    overrun: overruns.get(row.key)?.isClosed ? 'closed' : isChanged ? 'changed' : null,
    usualCurrency: usualCurrency(draftText(row, change, 'supplier'), context),
  };
}

/** The list can be older than what a refused save has told, or newer. */
function withLater(row: ShownRow, offer: Offer | null | undefined): ShownRow {
  if (!offer) return row;
  const version = row.offer?.version ?? 0;
  const isLater = offer.version > version || (offer.version === version && offer.closedAt !== null);
  return isLater ? { ...row, offer } : row;
}

export function shownText(row: ShownRow, cell: CellKey): string {
  const text = draftText(row, row.change, cell);
  const isOpening = row.offer === null && row.change !== undefined;
  return text === '' && cell === 'currency' && isOpening ? row.usualCurrency : text;
}

export function isChanged({ change }: ShownRow, column: string): boolean {
  return change?.cells.has(column as CellKey) ?? false;
}

/** What the cell said before it was changed. */
export function textBefore(row: ShownRow, column: string): string {
  return cellText(row, column as CellKey);
}
