import '../../components/gridModules';
import type { CellKeyDownEvent, ColDef, RowClickedEvent, SortChangedEvent } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useCallback, useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import { gridTheme } from '../../components/gridTheme';
import type { KindOfPart } from './kindOfPart';
import { partsColumns } from './partsColumns';
import styles from './PartsGrid.module.css';

interface PartsGridProps {
  kind: KindOfPart;
  parts: readonly StoredPart[];
  /** A column, with a minus in front for descending order. */
  sort?: string;
  onSort: (sort: string | undefined) => void;
}

const DEFAULTS: ColDef<StoredPart> = {
  sortable: true,
  resizable: true,
  suppressMovable: true,
  suppressHeaderMenuButton: true,
};

/** The parts as rows; Enter or a click opens one. */
export function PartsGrid({ kind, parts, sort, onSort }: PartsGridProps) {
  const open = useOpenPart(kind.path);
  const columns = useMemo(() => partsColumns(kind).map((column) => withSort(column, sort)), [kind, sort]);
  const tellSort = useCallback(
    ({ api, source }: SortChangedEvent<StoredPart>) => {
      if (source !== 'uiColumnSorted') return;
      const sorted = api.getColumnState().find((column) => column.sort);
      onSort(sorted && `${sorted.sort === 'desc' ? '-' : ''}${sorted.colId}`);
    },
    [onSort],
  );
  return (
    <section aria-label={`${kind.title}s`} className={styles.grid}>
      <AgGridReact<StoredPart>
        theme={gridTheme}
        rowData={parts as StoredPart[]}
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

function useOpenPart(path: string) {
  const navigate = useNavigate();
  return useMemo(() => {
    const open = (part: StoredPart | undefined) => part && void navigate(`${path}/${part.id}`);
    return {
      onCellKeyDown: ({
        data,
        event,
      }: CellKeyDownEvent<StoredPart> | { data?: StoredPart; event?: Event | null }) => {
        if (event instanceof KeyboardEvent && event.key === 'Enter') open(data);
      },
      onRowClicked: ({ data, event }: RowClickedEvent<StoredPart>) => {
        const onLink = event?.target instanceof Element && event.target.closest('a') !== null;
        if (!onLink) open(data);
      },
    };
  }, [navigate, path]);
}

function withSort(column: ColDef<StoredPart>, sort = ''): ColDef<StoredPart> {
  const descending = sort.startsWith('-');
  const isSorted = column.colId === sort.replace(/^-/, '');
  return { ...column, sort: isSorted ? (descending ? 'desc' : 'asc') : null };
}
