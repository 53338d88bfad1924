import '../../components/gridModules';
import type { BodyScrollEndEvent, ColDef } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { gridTheme } from '../../components/gridTheme';
import styles from './RankingGrid.module.css';
import { useRowSelection, type SelectableRow } from './useRowSelection';

interface RowsGridProps<Row extends SelectableRow> {
  label: string;
  rows: Row[];
  columns: ColDef<Row>[];
  /** Rows that stay on top, such as the source floor. */
  pinned?: Row[];
  rowHeight?: number;
  headerHeight?: number;
  isStale: boolean;
  selectedId: string | null;
  onSelect: (id: string) => void;
  onNearEnd: () => void;
}

const DEFAULTS: ColDef = { sortable: false, resizable: false, suppressMovable: true, cellDataType: false };
const PINNED_STYLE = { fontWeight: 400, color: 'var(--muted)' };
const denseTheme = gridTheme.withParams({ fontSize: 14, cellHorizontalPadding: 7 });
const NONE: never[] = [];
/** How many rows before the last loaded one the next page is asked for. */
const AHEAD = 20;

/** Ranked rows, as high as they need and the page allows; arrow keys and clicks select one. */
export function RowsGrid<Row extends SelectableRow>({
  label,
  rows,
  columns,
  pinned = NONE,
  rowHeight = 31,
  headerHeight = 34,
  isStale,
  selectedId,
  onSelect,
  onNearEnd,
}: RowsGridProps<Row>) {
  const selection = useRowSelection<Row>(rows, selectedId, onSelect);
  const height = headerHeight + (rows.length + pinned.length) * rowHeight + 4;
  return (
    <section
      id="ranking"
      aria-label={label}
      aria-busy={isStale}
      className={styles.grid}
      style={{ flexBasis: height }}
      {...selection.section}
    >
      <AgGridReact<Row>
        theme={denseTheme}
        rowData={rows}
        pinnedTopRowData={pinned}
        columnDefs={columns}
        defaultColDef={DEFAULTS}
        getRowId={({ data }) => data.id}
        getRowStyle={({ node }) => (node.rowPinned ? PINNED_STYLE : undefined)}
        ensureDomOrder
        rowHeight={rowHeight}
        headerHeight={headerHeight}
        onBodyScrollEnd={({ api }: BodyScrollEndEvent) => {
          if (api.getLastDisplayedRowIndex() >= rows.length - AHEAD) onNearEnd();
        }}
        {...selection.grid}
      />
    </section>
  );
}
