import { cellText, type GridRow, isCell, isEditable, standingText } from './cells';
import { type CellEdit, type Draft, type Refusal, withEdits, withRefusals } from './draft';

/** The cells as they are shown, from the one that the rectangle is pasted at. */
export interface PasteTarget {
  rows: readonly GridRow[];
  columns: readonly string[];
}

/**
 * Pastes a rectangle: what falls on cells that can be edited is taken, wrong or not, to be mended there; what falls on
 * others or beyond the grid is refused at the cell where that begins.
 */
export function pasteRectangle(draft: Draft, target: PasteTarget, texts: readonly string[][]): Draft {
  const { rows, columns } = target;
  const edits: CellEdit[] = [];
  const refusals: Refusal[] = [];
  texts.slice(0, rows.length).forEach((line, index) => {
    const row = rows[index];
    line.slice(0, columns.length).forEach((text, at) => {
      const column = columns[at];
      if (isCell(column) && isEditable(row, column)) edits.push({ row, cell: column, text });
      else if (text.trim() !== fixedText(row, column))
        refusals.push(refusalAt(row, column, `“${text.trim()}” can’t be pasted here: this can’t be edited`));
    });
  });
  return withRefusals(withEdits(draft, edits), [...refusals, ...beyond(target, texts)]);
}

function fixedText(row: GridRow, column: string): string {
  return isCell(column) ? cellText(row, column) : standingText(row, column);
}

function beyond({ rows, columns }: PasteTarget, texts: readonly string[][]): Refusal[] {
  const width = Math.max(...texts.map((line) => line.length));
  const refusals: Refusal[] = [];
  if (width > columns.length) {
    const message = `the pasted rectangle is ${plural(width - columns.length, 'column')} wider than the grid: these have no place`;
    refusals.push(refusalAt(rows[0], columns.at(-1)!, message));
  }
  if (texts.length > rows.length) {
    const message = `the pasted rectangle is ${plural(texts.length - rows.length, 'row')} longer than the grid: these have no place`;
    refusals.push(refusalAt(rows.at(-1)!, columns[0], message));
  }
  return refusals;
}

function refusalAt({ key }: GridRow, column: string, message: string): Refusal {
  return { key, column, message, from: 'paste' };
}

function plural(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}
