import type { GridApi } from 'ag-grid-community';
import type { ClipboardEvent, KeyboardEvent, RefObject } from 'react';
import { isCell, standingText } from './draft/cells';
import { readClipboard } from './draft/clipboard';
import { type ShownRow, shownText } from './draft/shownRows';
import type { PriceDraft } from './usePriceDraft';

/** A rectangle and the cell at which it is pasted. */
export interface PastedRectangle {
  /** How many rows stand before it. */
  rowIndex: number;
  /** From that of the cell to the last one that is shown. */
  columns: readonly string[];
  texts: readonly string[][];
}

interface GridActs {
  draft: PriceDraft;
  mayEdit: boolean;
  onPaste: (rectangle: PastedRectangle) => void;
  onSave: () => void;
}

/** Copying a cell, pasting a rectangle at one, undo, redo and saving. */
export function useGridKeys(api: RefObject<GridApi<ShownRow> | null>, { draft, mayEdit, ...acts }: GridActs) {
  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    const grid = api.current;
    const isOneValue = !/[\t\r\n]/.test(text.trimEnd());
    if (!grid || !mayEdit || text === '' || (isField(event.target) && isOneValue)) return;
    event.preventDefault();
    grid.stopEditing(true);
    const target = targetOf(grid);
    if (target) acts.onPaste({ ...target, texts: readClipboard(text) });
  };
  const onCopy = (event: ClipboardEvent) => {
    const target = api.current && targetOf(api.current);
    if (!target || isField(event.target) || !window.getSelection()?.isCollapsed) return;
    event.preventDefault();
    event.clipboardData.setData('text/plain', textOf(draft.rows[target.rowIndex], target.columns[0]));
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (!(event.ctrlKey || event.metaKey)) return;
    const key = event.key.toLowerCase();
    const isEditing = isField(event.target);
    if (key === 's' && mayEdit) {
      if (isEditing) api.current?.stopEditing();
      else acts.onSave();
    } else if (isEditing) return;
    else if (key === 'y' || (key === 'z' && event.shiftKey)) draft.redo();
    else if (key === 'z') draft.undo();
    else return;
    event.preventDefault();
  };
  return { onPaste, onCopy, onKeyDown };
}

function isField(target: EventTarget): boolean {
  return target instanceof HTMLInputElement && target.type !== 'checkbox';
}

/** The focused cell, and the columns from it to the end of the grid. */
function targetOf(grid: GridApi<ShownRow>) {
  const focused = grid.getFocusedCell();
  if (!focused) return null;
  const columns = grid.getAllDisplayedColumns().map((column) => column.getColId());
  return { rowIndex: focused.rowIndex, columns: columns.slice(columns.indexOf(focused.column.getColId())) };
}

function textOf(row: ShownRow, column: string): string {
  return isCell(column) ? shownText(row, column) : standingText(row, column);
}
