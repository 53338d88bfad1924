import { readPrice } from '@roothertz/common/prices';
import { quantityOf } from './draft/cells';
import type { CellEdit } from './draft/draft';
import { type ShownRow, shownText } from './draft/shownRows';

/** Why a cell stands in the way of saving. */
export interface CellProblem {
  row: ShownRow;
  column: string;
  message: string;
}

/** Every cell that stands in the way of saving, in the order of the rows. */
export function draftProblems(rows: readonly ShownRow[]): CellProblem[] {
  return rows.flatMap((row) => [
    ...(row.isOverrun ? [{ row, column: 'part', message: overrunWords(row) }] : []),
    ...[...row.errors].map(([column, message]) => ({ row, column, message })),
  ]);
}

function overrunWords({ offer, part }: ShownRow): string {
  const who = offer?.openedBy?.name ?? 'Somebody else';
  return `${who} has changed the offer for ${part.partNumber} meanwhile`;
}

/** Refused prices that are numbers where the comma is the decimal mark, with a point in its place. */
export function commasMended(problems: readonly CellProblem[]): CellEdit[] {
  return problems.flatMap(({ row, column }): CellEdit[] => {
    const quantity = quantityOf(column);
    if (quantity === null) return [];
    const cell = `price:${quantity}` as const;
    const text = shownText(row, cell);
    const reading = readPrice(text, ',');
    return text.includes(',') && reading.ok ? [{ row, cell, text: text.replace(',', '.') }] : [];
  });
}

/** Names of suppliers that the team doesn't have yet. */
export function unknownSuppliers(problems: readonly CellProblem[]): string[] {
  const names = problems
    .filter(({ column }) => column === 'supplier')
    .map(({ row }) => shownText(row, 'supplier'))
    .filter((name) => name !== '');
  return [...new Set(names)];
}
