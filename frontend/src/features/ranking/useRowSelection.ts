import type { CellFocusedEvent, GridApi, GridReadyEvent, RowClickedEvent } from 'ag-grid-community';
import { useEffect, useRef, type FocusEvent } from 'react';
import { FLOOR_ID } from './gridRows';

const SELECTION = { mode: 'singleRow', checkboxes: false, enableClickSelection: false } as const;

export interface SelectableRow {
  id: string;
}

/** Selects the part whose row is clicked or reached by a key; what is selected stays so when the rows change. */
export function useRowSelection<Row extends SelectableRow>(
  rows: readonly Row[],
  selectedId: string | null,
  onSelect: (id: string) => void,
) {
  const grid = useRef<GridApi<Row> | null>(null);
  const byKey = useRef(false);
  useEffect(() => {
    if (grid.current) selectRow(grid.current, selectedId);
  }, [selectedId, rows]);
  const select = (row: Row | undefined) => {
    if (row && row.id !== FLOOR_ID) onSelect(row.id);
  };
  return {
    section: {
      tabIndex: -1,
      onKeyDownCapture: () => {
        byKey.current = true;
      },
      onPointerDownCapture: () => {
        byKey.current = false;
      },
      onBlur: ({ relatedTarget, currentTarget }: FocusEvent) => {
        if (!currentTarget.contains(relatedTarget)) byKey.current = false;
      },
      onFocus: ({ target, currentTarget }: FocusEvent) => {
        if (target === currentTarget && grid.current) focusRow(grid.current, selectedId);
      },
    },
    grid: {
      rowSelection: SELECTION,
      onGridReady: ({ api }: GridReadyEvent<Row>) => {
        grid.current = api;
        selectRow(api, selectedId);
      },
      onRowClicked: ({ data }: RowClickedEvent<Row>) => select(data),
      onCellFocused: (event: CellFocusedEvent<Row>) => {
        if (byKey.current) select(rowAt(event));
      },
    },
  };
}

function selectRow(api: GridApi, id: string | null): void {
  const node = id === null ? undefined : api.getRowNode(id);
  if (node) node.setSelected(true);
  else api.deselectAll();
}

/** Puts the focus on the selected part's row, which may be scrolled out of sight. */
function focusRow(api: GridApi, id: string | null): void {
  const index = (id !== null && api.getRowNode(id)?.rowIndex) || 0;
  api.ensureIndexVisible(index);
  api.setFocusedCell(index, 'part');
}

function rowAt<Row>({ api, rowIndex, rowPinned }: CellFocusedEvent<Row>): Row | undefined {
  return rowPinned || rowIndex === null ? undefined : api.getDisplayedRowAtIndex(rowIndex)?.data;
}
