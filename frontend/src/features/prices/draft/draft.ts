import type { Offer } from '../../../api/prices';
import {
  cellText,
  type CellKey,
  type GridRow,
  isEditable,
  PLAIN_CELLS,
  priceCell,
  quantityOf,
} from './cells';
import { sameValue } from './readCell';

/** What is changed of a row, as it was typed or pasted. */
export interface Change {
  /** The row as it stood when its first cell was changed. */
  base: GridRow;
  cells: ReadonlyMap<CellKey, string>;
}

/** Something that was pasted or sent to the server and could not be taken, at the cell that it is about. */
export interface Refusal {
  key: string;
  column: string;
  message: string;
  from: 'paste' | 'server';
}

/** What somebody else has made of an offer since its change was begun. */
export interface Overrun {
  /** As it stands now, or stood at last. */
  offer: Offer;
  isClosed: boolean;
}

/** Everything that isn't saved yet. */
export interface Draft {
  changes: ReadonlyMap<string, Change>;
  refusals: readonly Refusal[];
  /** What a refused save has told, by row. */
  overruns: ReadonlyMap<string, Overrun>;
}

export const EMPTY_DRAFT: Draft = { changes: new Map(), refusals: [], overruns: new Map() };

const NO_CELLS: Change['cells'] = new Map();

export interface CellEdit {
  row: GridRow;
  cell: CellKey;
  text: string;
}

/** The text that a cell shows now. */
export function draftText(row: GridRow, change: Change | undefined, cell: CellKey): string {
  return change?.cells.get(cell) ?? cellText(row, cell);
}

/** Takes edits of cells; what says the same as before is no change, and a row without changes is left as it was. */
export function withEdits(draft: Draft, edits: readonly CellEdit[]): Draft {
  const changes = new Map(draft.changes);
  const touched = new Set<string>();
  for (const { row, cell, text } of edits) {
    if (!isEditable(row, cell)) continue;
    const { base, cells } = changes.get(row.key) ?? { base: row, cells: NO_CELLS };
    const next = new Map(cells).set(cell, text.trim());
    if (sameValue(cell, text, cellText(base, cell))) next.delete(cell);
    changes.set(row.key, { base, cells: next });
    if (next.size === 0 && !isAdded(row.key)) changes.delete(row.key);
    touched.add(`${row.key} ${cell}`);
  }
  const refusals = draft.refusals.filter(({ key, column }) => !touched.has(`${key} ${column}`));
  return { ...draft, changes, refusals };
}

/** Adds a row for another offer for a part. */
export function withAddedRow(
  draft: Draft,
  { part, usedIn }: GridRow,
  cells: Change['cells'] = NO_CELLS,
): Draft {
  const base: GridRow = { key: nextAddedKey(draft), part, usedIn, offer: null };
  return { ...draft, changes: new Map([[base.key, { base, cells }], ...draft.changes]) };
}

/** The key of the row that is added next. */
export function nextAddedKey({ changes }: Draft): string {
  return `${ADDED}${Math.max(0, ...[...changes.keys()].map((key) => Number(addedNumber(key)))) + 1}`;
}

const ADDED = 'added ';

export function isAdded(key: string): boolean {
  return key.startsWith(ADDED);
}

function addedNumber(key: string): string {
  return isAdded(key) ? key.slice(ADDED.length) : '0';
}

/** Gives up the changes of a row. */
export function withoutRow(draft: Draft, key: string): Draft {
  const changes = new Map(draft.changes);
  changes.delete(key);
  const overruns = new Map(draft.overruns);
  overruns.delete(key);
  return { changes, overruns, refusals: draft.refusals.filter((refusal) => refusal.key !== key) };
}

/**
 * Keeps the changes of a row on top of what somebody else has made of it; an offer that was closed is to be opened
 * again with them.
 */
export function rebased(draft: Draft, current: GridRow): Draft {
  const change = draft.changes.get(current.key);
  if (change === undefined) return draft;
  if (draft.overruns.get(current.key)?.isClosed)
    return withAddedRow(withoutRow(draft, current.key), current, allCells(current, change));
  const edits = [...change.cells].map(([cell, text]) => ({ row: current, cell, text }));
  return withEdits(withoutRow(draft, current.key), edits);
}

/** Every cell of an offer as its change shows it. */
function allCells(row: GridRow, change: Change): Change['cells'] {
  const offered = row.offer?.breaks.map(({ minimumQuantity }) => priceCell(minimumQuantity)) ?? [];
  const keys = new Set([...PLAIN_CELLS, ...offered, ...change.cells.keys()]);
  return new Map([...keys].map((cell) => [cell, draftText(row, change, cell)]));
}

export function withRefusals(draft: Draft, refusals: readonly Refusal[]): Draft {
  return { ...draft, refusals: [...draft.refusals, ...refusals] };
}

export function withoutRefusals(draft: Draft, from: Refusal['from']): Draft {
  return { ...draft, refusals: draft.refusals.filter((refusal) => refusal.from !== from) };
}

/** Rows that hold something to save; one that was added and is still empty doesn't. */
export function changedRows({ changes }: Draft): [string, Change][] {
  return [...changes].filter(([, { cells }]) => cells.size > 0);
}

/** The quantities at which the offers and the changes have prices. */
export function pricedQuantities(rows: readonly GridRow[], { changes }: Draft): number[] {
  const offered = rows.flatMap(
    ({ offer }) => offer?.breaks.map(({ minimumQuantity }) => minimumQuantity) ?? [],
  );
  const drafted = [...changes.values()].flatMap(({ cells }) => [...cells.keys()].map(quantityOf));
  return [...offered, ...drafted.filter((quantity) => quantity !== null)];
}
