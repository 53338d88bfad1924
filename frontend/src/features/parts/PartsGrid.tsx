import '../../components/gridModules';
import type { ColDef, SortChangedEvent } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useCallback, useMemo, type Ref } from 'react';
import type { StoredPart } from '../../api/parts';
import { gridTheme } from '../../components/gridTheme';
import type { KindOfPart } from './kindOfPart';
import { partsColumns } from './partsColumns';
import styles from './PartsGrid.module.css';
import { useChooseParts } from './useChooseParts';
import { useEditStanding } from './useEditStanding';
import { useOpenPart } from './useOpenPart';

interface PartsGridProps {
  ref: Ref<AgGridReact<StoredPart>>;
  kind: KindOfPart;
  parts: readonly StoredPart[];
  /** A column, with a minus in front for descending order. */
  sort?: string;
  onSort: (sort: string | undefined) => void;
  /** Told which parts are chosen; null = the member changes none. */
  onChoose: ((ids: ReadonlySet<string>) => void) | null;
}

const DEFAULTS: ColDef<StoredPart> = {
  sortable: true,
  resizable: true,
  suppressMovable: true,
  suppressHeaderMenuButton: true,
};

/** The parts as rows; Enter or a click opens one. Who may change parts chooses rows and edits how they stand. */
export function PartsGrid({ ref, kind, parts, sort, onSort, onChoose }: PartsGridProps) {
  const open = useOpenPart(kind.path);
  const choose = useChooseParts(onChoose);
  const edit = useEditStanding(kind);
  const mayEdit = onChoose !== null;
  const columns = useMemo(
    () => partsColumns(kind, mayEdit).map((column) => withSort(column, sort)),
    [kind, mayEdit, sort],
  );
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
        ref={ref}
        theme={gridTheme}
        rowData={parts as StoredPart[]}
        columnDefs={columns}
        defaultColDef={DEFAULTS}
        getRowId={({ data }) => data.id}
        headerHeight={54}
        onSortChanged={tellSort}
        {...open}
        {...choose}
        {...edit}
      />
    </section>
  );
}

function withSort(column: ColDef<StoredPart>, sort = ''): ColDef<StoredPart> {
  const descending = sort.startsWith('-');
  const isSorted = column.colId === sort.replace(/^-/, '');
  return { ...column, sort: isSorted ? (descending ? 'desc' : 'asc') : null };
}
