import { plainNumber } from '@roothertz/common/prices';
import { isCell } from './draft/cells';
import type { CellEdit } from './draft/draft';
import { isNumberOf } from './draft/readCell';
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
    ...(row.overrun ? [{ row, column: 'part', message: overrunWords(row) }] : []),
    ...[...row.errors].map(([column, message]) => ({ row, column, message })),
  ]);
}

function overrunWords({ offer, part, overrun }: ShownRow): string {
  const who = (overrun === 'closed' ? offer?.closedBy : offer?.openedBy)?.name ?? 'Somebody else';
  return `${who} has ${overrun} the offer for ${part.partNumber} meanwhile`;
}

/** Refused numbers with digits in groups or a decimal comma, written plainly as they read with a decimal mark. */
export function numbersMended(problems: readonly CellProblem[], mark: '.' | ','): CellEdit[] {
  return problems.flatMap(({ row, column }): CellEdit[] => {
    if (!isCell(column)) return [];
    const text = shownText(row, column);
    const plain = plainNumber(text, mark);
    if (plain === null || plain === text || (mark === ',' && !text.includes(','))) return [];
    return isNumberOf(column, plain) ? [{ row, cell: column, text: plain }] : [];
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
