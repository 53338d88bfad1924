import '../../components/gridModules';
import type { CellKeyDownEvent, ColDef, RowClickedEvent, SortChangedEvent } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useCallback, useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import type { OpAmp } from '../../api/opAmps';
import { gridTheme } from '../../components/gridTheme';
import { PARTS_COLUMNS } from './partsColumns';
import styles from './PartsGrid.module.css';

interface PartsGridProps {
  parts: readonly OpAmp[];
  /** A column, with a minus in front for descending order. */
  sort?: string;
  onSort: (sort: string | undefined) => void;
}

const DEFAULTS: ColDef<OpAmp> = {
  sortable: true,
  resizable: true,
  suppressMovable: true,
  suppressHeaderMenuButton: true,
};

/** The parts as rows; Enter or a click opens one. */
export function PartsGrid({ parts, sort, onSort }: PartsGridProps) {
  const open = useOpenPart();
  const columns = useMemo(() => PARTS_COLUMNS.map((column) => withSort(column, sort)), [sort]);
  const tellSort = useCallback(
    ({ api, source }: SortChangedEvent<OpAmp>) => {
      if (source !== 'uiColumnSorted') return;
      const sorted = api.getColumnState().find((column) => column.sort);
      onSort(sorted && `${sorted.sort === 'desc' ? '-' : ''}${sorted.colId}`);
    },
    [onSort],
  );
  return (
    <section aria-label="Op-amps" className={styles.grid}>
      <AgGridReact<OpAmp>
        theme={gridTheme}
        rowData={parts as OpAmp[]}
        columnDefs={columns}
        defaultColDef={DEFAULTS}
        getRowId={({ data }) => data.id}
        headerHeight={54}
        onSortChanged={tellSort}
        {...open}
      />
    </section>
  );
}

function useOpenPart() {
  const navigate = useNavigate();
  return useMemo(() => {
    const open = (part: OpAmp | undefined) => part && void navigate(`/parts/${part.id}`);
    return {
      onCellKeyDown: ({ data, event }: CellKeyDownEvent<OpAmp> | { data?: OpAmp; event?: Event | null }) => {
        if (event instanceof KeyboardEvent && event.key === 'Enter') open(data);
      },
      onRowClicked: ({ data, event }: RowClickedEvent<OpAmp>) => {
        const onLink = event?.target instanceof Element && event.target.closest('a') !== null;
        if (!onLink) open(data);
      },
    };
  }, [navigate]);
}

function withSort(column: ColDef<OpAmp>, sort = ''): ColDef<OpAmp> {
  const descending = sort.startsWith('-');
  const isSorted = column.colId === sort.replace(/^-/, '');
  return { ...column, sort: isSorted ? (descending ? 'desc' : 'asc') : null };
}
