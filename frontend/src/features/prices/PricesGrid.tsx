import '../../components/gridModules';
import type {
  CellFocusedEvent,
  CellKeyDownEvent,
  ColDef,
  GridApi,
  SelectionChangedEvent,
} from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { type Ref, useImperativeHandle, useMemo, useRef, useState } from 'react';
import type { Supplier } from '../../api/prices';
import { gridTheme } from '../../components/gridTheme';
import { isCell } from './draft/cells';
import type { ShownRow } from './draft/shownRows';
import { type FocusedCell, FocusedCellContext } from './FocusedCell';
import { pricesColumns } from './pricesColumns';
import styles from './PricesGrid.module.css';
import { useGridKeys } from './useGridKeys';
import type { PriceDraft } from './usePriceDraft';

export interface PricesGridHandle {
  /** Puts the focus on a cell, scrolled into sight. */
  focus: (cell: FocusedCell) => void;
}

interface PricesGridProps {
  draft: PriceDraft;
  quantities: readonly number[];
  suppliers: readonly Supplier[];
  mayEdit: boolean;
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
  onConfirm,
  onSelect,
  onFocus,
  ref,
}: PricesGridProps) {
  const api = useRef<GridApi<ShownRow> | null>(null);
  const [focused, setFocused] = useState<FocusedCell | null>(null);
  const isNarrow = window.innerWidth <= 760;
  const columns = useMemo(
    () => pricesColumns({ quantities, suppliers, mayEdit, isNarrow, onConfirm }),
    [quantities, suppliers, mayEdit, isNarrow, onConfirm],
  );
  useImperativeHandle(ref, () => ({ focus: (cell) => focusCell(api.current, cell) }), []);
  const keys = useGridKeys(api, draft, mayEdit);
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
          onGridReady={(event) => (api.current = event.api)}
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

function focusCell(api: GridApi<ShownRow> | null, { key, column }: FocusedCell): void {
  const index = api?.getRowNode(key)?.rowIndex;
  if (!api || index === null || index === undefined) return;
  api.ensureIndexVisible(index);
  api.ensureColumnVisible(column);
  api.setFocusedCell(index, column);
}
