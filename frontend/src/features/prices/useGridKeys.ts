import type { GridApi } from 'ag-grid-community';
import type { ClipboardEvent, KeyboardEvent, RefObject } from 'react';
import { isCell, standingText } from './draft/cells';
import { readClipboard } from './draft/clipboard';
import { type ShownRow, shownText } from './draft/shownRows';
import type { PriceDraft } from './usePriceDraft';

/** Copying a cell, pasting a rectangle at one, undo and redo. */
export function useGridKeys(api: RefObject<GridApi<ShownRow> | null>, draft: PriceDraft, mayEdit: boolean) {
  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    const grid = api.current;
    const isOneValue = !/[\t\r\n]/.test(text.trimEnd());
    if (!grid || !mayEdit || text === '' || (isField(event.target) && isOneValue)) return;
    event.preventDefault();
    grid.stopEditing(true);
    const target = targetOf(grid);
    if (target) draft.paste(target, readClipboard(text));
  };
  const onCopy = (event: ClipboardEvent) => {
    const target = api.current && targetOf(api.current);
    if (!target || isField(event.target) || !window.getSelection()?.isCollapsed) return;
    event.preventDefault();
    event.clipboardData.setData('text/plain', textOf(target.rows[0], target.columns[0]));
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (!(event.ctrlKey || event.metaKey) || isField(event.target)) return;
    const key = event.key.toLowerCase();
    if (key === 'y' || (key === 'z' && event.shiftKey)) draft.redo();
    else if (key === 'z') draft.undo();
    else return;
    event.preventDefault();
  };
  return { onPaste, onCopy, onKeyDown };
}

function isField(target: EventTarget): boolean {
  return target instanceof HTMLInputElement && target.type !== 'checkbox';
}

/** The rows and columns from the focused cell to the end of the grid. */
function targetOf(grid: GridApi<ShownRow>) {
  const focused = grid.getFocusedCell();
  if (!focused) return null;
  const columns = grid.getAllDisplayedColumns().map((column) => column.getColId());
  const rows = Array.from(
    { length: grid.getDisplayedRowCount() - focused.rowIndex },
    (_, index) => grid.getDisplayedRowAtIndex(focused.rowIndex + index)!.data!,
  );
  return rows.length === 0
    ? null
    : { rows, columns: columns.slice(columns.indexOf(focused.column.getColId())) };
}

function textOf(row: ShownRow, column: string): string {
  return isCell(column) ? shownText(row, column) : standingText(row, column);
}
