import '../../components/gridModules';
import type {
  CellFocusedEvent,
  CellKeyDownEvent,
  ColDef,
  GridApi,
  SelectionChangedEvent,
  SortChangedEvent,
  ViewportChangedEvent,
} from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { type Ref, useCallback, useImperativeHandle, useMemo, useRef, useState } from 'react';
import type { Supplier } from '../../api/prices';
import { gridTheme } from '../../components/gridTheme';
import { isCell } from './draft/cells';
import type { ShownRow } from './draft/shownRows';
import { type FocusedCell, FocusedCellContext } from './FocusedCell';
import { pricesColumns } from './pricesColumns';
import styles from './PricesGrid.module.css';
import { sortKeyOf } from './pricesView';
import { type PastedRectangle, useGridKeys } from './useGridKeys';
import type { PriceDraft } from './usePriceDraft';

export interface PricesGridHandle {
  /** Puts the focus on a cell, scrolled into sight. */
  focus: (cell: FocusedCell) => void;
  /** Begins to edit a cell, of a row that may only come with the next rendering. */
  edit: (cell: FocusedCell) => void;
}

interface PricesGridProps {
  draft: PriceDraft;
  quantities: readonly number[];
  suppliers: readonly Supplier[];
  mayEdit: boolean;
  sort: string | undefined;
  onSort: (sort: string | undefined) => void;
  /** Told when the last rows come into sight. */
  onEnd: () => void;
  onPaste: (rectangle: PastedRectangle) => void;
  onSave: () => void;
  onConfirm: (rows: readonly ShownRow[]) => void;
  onSelect: (rows: readonly ShownRow[]) => void;
  onFocus: (key: string) => void;
  ref?: Ref<PricesGridHandle>;
}

const DEFAULTS: ColDef<ShownRow> = {
  sortable: true,
  resizable: true,
  suppressMovable: true,
  suppressHeaderMenuButton: true,
  cellDataType: false,
  /** A cell that says the same can have become refused or saved. */
  equals: () => false,
};
const SELECTION = { mode: 'multiRow', checkboxes: true, headerCheckbox: true } as const;
const SELECTION_COLUMN = { pinned: 'left', width: 40, resizable: false } as const;
const denseTheme = gridTheme.withParams({ fontSize: 14, cellHorizontalPadding: 8 });

/** The offers as rows whose cells are edited in place, by keyboard, and pasted into from a spreadsheet. */
export function PricesGrid({
  draft,
  quantities,
  suppliers,
  mayEdit,
  sort,
  onSort,
  onEnd,
  onPaste,
  onSave,
  onConfirm,
  onSelect,
  onFocus,
  ref,
}: PricesGridProps) {
  const api = useRef<GridApi<ShownRow> | null>(null);
  const [focused, setFocused] = useState<FocusedCell | null>(null);
  const isNarrow = window.innerWidth <= 760;
  const columns = useMemo(
    () => pricesColumns({ quantities, suppliers, mayEdit, isNarrow, sort, onConfirm }),
    [quantities, suppliers, mayEdit, isNarrow, sort, onConfirm],
  );
  const wanted = useRef<FocusedCell | null>(null);
  const editWanted = useCallback(() => {
    if (wanted.current && startEditing(api.current, wanted.current)) wanted.current = null;
  }, []);
  useImperativeHandle(
    ref,
    () => ({
      focus: (cell) => void focusCell(api.current, cell),
      edit: (cell) => {
        wanted.current = cell;
        editWanted();
      },
    }),
    [editWanted],
  );
  const keys = useGridKeys(api, { draft, mayEdit, onPaste, onSave });
  const sortBy = (event: SortChangedEvent<ShownRow>) => {
    if (event.source !== 'uiColumnSorted') return;
    event.api.ensureIndexVisible(0, 'top');
    onSort(sortIn(event));
  };
  const noteFocus = (event: CellFocusedEvent<ShownRow>) => {
    const cell = cellAt(event);
    setFocused(cell);
    if (cell) onFocus(cell.key);
  };
  const onCellKeyDown = ({
    data,
    column,
    event,
  }: Pick<CellKeyDownEvent<ShownRow>, 'data' | 'column' | 'event'>) => {
    if (!data || !(event instanceof KeyboardEvent) || event.target instanceof HTMLInputElement) return;
    const cell = column.getColId();
    if (event.key === 'Enter' && cell === 'confirm') onConfirm([data]);
  };
  return (
    <FocusedCellContext value={focused}>
      <section aria-label="Offers" className={styles.grid} {...keys}>
        <AgGridReact<ShownRow>
          theme={denseTheme}
          rowData={draft.rows}
          columnDefs={columns}
          defaultColDef={DEFAULTS}
          getRowId={({ data }) => data.key}
          readOnlyEdit
          enterNavigatesVerticallyAfterEdit
          stopEditingWhenCellsLoseFocus
          singleClickEdit={isNarrow}
          rowSelection={mayEdit ? SELECTION : undefined}
          selectionColumnDef={SELECTION_COLUMN}
          tabToNextCell={({ editing, nextCellPosition }) => editing && (nextCellPosition ?? false)}
          focusGridInnerElement={({ api: entered }) => focusEntered(entered)}
          onGridReady={(event) => (api.current = event.api)}
          onRowDataUpdated={editWanted}
          onSortChanged={sortBy}
          onViewportChanged={(event) => isNearEnd(event) && onEnd()}
          onCellFocused={noteFocus}
          onCellKeyDown={onCellKeyDown as (event: object) => void}
          onCellEditRequest={({ data, column, newValue }) => {
            const cell = column.getColId();
            if (isCell(cell)) draft.edit([{ row: data, cell, text: String(newValue ?? '') }]);
          }}
          onSelectionChanged={({ selectedNodes }: SelectionChangedEvent<ShownRow>) =>
            onSelect((selectedNodes ?? []).flatMap(({ data }) => data ?? []))
          }
        />
      </section>
    </FocusedCellContext>
  );
}

function cellAt({ api, rowIndex, column }: CellFocusedEvent<ShownRow>): FocusedCell | null {
  const row = rowIndex === null ? undefined : api.getDisplayedRowAtIndex(rowIndex)?.data;
  if (row === undefined || column === null) return null;
  return { key: row.key, column: typeof column === 'string' ? column : column.getColId() };
}

/** Answers the index of the row; null where the grid doesn't hold it. */
function focusCell(api: GridApi<ShownRow> | null, { key, column }: FocusedCell): number | null {
  const index = api?.getRowNode(key)?.rowIndex;
  if (!api || index === null || index === undefined) return null;
  api.ensureIndexVisible(index);
  api.ensureColumnVisible(column);
  api.setFocusedCell(index, column);
  return index;
}

function startEditing(api: GridApi<ShownRow> | null, cell: FocusedCell): boolean {
  const rowIndex = focusCell(api, cell);
  if (rowIndex === null) return false;
  api!.startEditingCell({ rowIndex, colKey: cell.column });
  return true;
}

function sortIn({ api }: SortChangedEvent<ShownRow>): string | undefined {
  const sorted = api.getColumnState().find(({ sort }) => sort);
  return sorted && `${sorted.sort === 'desc' ? '-' : ''}${sortKeyOf(sorted.colId)}`;
}

/** Whoever comes back by Tab stands where they left; the headers are reached by the arrows. */
function focusEntered(api: GridApi<ShownRow>): boolean {
  const { rowIndex, column } = api.getFocusedCell() ?? { rowIndex: 0, column: 'part' };
  if (api.getDisplayedRowAtIndex(rowIndex) === undefined) return false;
  api.ensureIndexVisible(rowIndex);
  api.setFocusedCell(rowIndex, column);
  return true;
}

/** How many rows before the last the next ones are loaded. */
const ROWS_AHEAD = 100;

function isNearEnd({ api, lastRow }: ViewportChangedEvent<ShownRow>): boolean {
  return lastRow >= api.getDisplayedRowCount() - ROWS_AHEAD;
}
