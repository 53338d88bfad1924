import '../../components/gridModules';
import type {
  BodyScrollEndEvent,
  CellFocusedEvent,
  ColDef,
  GridApi,
  RowClickedEvent,
} from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useEffect, useMemo, useRef } from 'react';
import { gridTheme } from '../../components/gridTheme';
import { BudgetLegend } from './BudgetBar';
import { gridColumns } from './gridColumns';
import { FLOOR_ID, gridRows, type GridRow } from './gridRows';
import styles from './RankingGrid.module.css';
import type { ShownRanking } from './useRanking';

interface RankingGridProps {
  ranking: ShownRanking;
  isStale: boolean;
  selectedId: string | null;
  onSelect: (id: string) => void;
  onNearEnd: () => void;
}

const DEFAULTS: ColDef<GridRow> = {
  sortable: false,
  resizable: false,
  suppressMovable: true,
  cellDataType: false,
};
const FLOOR_STYLE = { fontWeight: 400, color: 'var(--muted)' };
const denseTheme = gridTheme.withParams({ fontSize: 14, cellHorizontalPadding: 7 });
const ROW_HEIGHT = 31;
const HEADER_HEIGHT = 34;
/** How many rows before the last loaded one the next page is asked for. */
const AHEAD = 20;

/** The ranking as rows under the source floor; arrow keys and clicks select a part. */
export function RankingGrid({ ranking, isStale, selectedId, onSelect, onNearEnd }: RankingGridProps) {
  const grid = useRef<AgGridReact<GridRow>>(null);
  const { unit, floor, rows } = useMemo(
    () => gridRows(ranking.first, ranking.items, ranking.request),
    [ranking],
  );
  const columns = useMemo(() => gridColumns(unit), [unit]);
  const floorRows = useMemo(() => [floor], [floor]);
  useEffect(() => selectRow(grid.current?.api, selectedId), [selectedId, rows]);
  const select = (id: string | undefined) => id !== undefined && id !== FLOOR_ID && onSelect(id);
  const height = HEADER_HEIGHT + (rows.length + 1) * ROW_HEIGHT + 4;
  return (
    <>
      <section
        id="ranking"
        aria-label="Ranking"
        aria-busy={isStale}
        className={styles.grid}
        style={{ flexBasis: height, opacity: isStale ? 0.5 : 1 }}
      >
        <AgGridReact<GridRow>
          ref={grid}
          theme={denseTheme}
          rowData={rows}
          pinnedTopRowData={floorRows}
          columnDefs={columns}
          defaultColDef={DEFAULTS}
          getRowId={({ data }) => data.id}
          getRowStyle={({ node }) => (node.rowPinned ? FLOOR_STYLE : undefined)}
          rowSelection={SELECTION}
          rowHeight={ROW_HEIGHT}
          headerHeight={HEADER_HEIGHT}
          onGridReady={({ api }) => selectRow(api, selectedId)}
          onRowClicked={({ data }: RowClickedEvent<GridRow>) => select(data?.id)}
          onCellFocused={(event: CellFocusedEvent<GridRow>) => select(rowReachedByKey(event)?.id)}
          onBodyScrollEnd={({ api }: BodyScrollEndEvent) => {
            if (api.getLastDisplayedRowIndex() >= rows.length - AHEAD) onNearEnd();
          }}
        />
      </section>
      <p className={styles.legend}>
        <BudgetLegend rows={rows} />
      </p>
    </>
  );
}

const SELECTION = { mode: 'singleRow', checkboxes: false, enableClickSelection: false } as const;

function selectRow(api: GridApi<GridRow> | undefined, id: string | null): void {
  const node = id === null ? undefined : api?.getRowNode(id);
  if (node) node.setSelected(true);
  else api?.deselectAll();
}

function rowReachedByKey({ api, rowIndex, rowPinned, sourceEvent }: CellFocusedEvent<GridRow>) {
  if (rowPinned || rowIndex === null || !(sourceEvent instanceof KeyboardEvent)) return undefined;
  return api.getDisplayedRowAtIndex(rowIndex)?.data;
}
