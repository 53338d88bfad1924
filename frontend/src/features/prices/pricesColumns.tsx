import { CURRENCIES } from '@roothertz/common/prices';
import type { ColDef } from 'ag-grid-community';
import type { Supplier } from '../../api/prices';
import { cellText, type CellKey, isEditable, priceCell, standingText } from './draft/cells';
import { type ShownRow, shownText } from './draft/shownRows';
import { ConfirmCell } from './ConfirmCell';
import { EditedCell } from './EditedCell';
import { ListEditor } from './ListEditor';
import { ConfirmedCell, PartCell, StateCell } from './StandingCells';

type Column = ColDef<ShownRow, string>;

interface ColumnsOptions {
  quantities: readonly number[];
  suppliers: readonly Supplier[];
  mayEdit: boolean;
  isNarrow: boolean;
  onConfirm: (rows: readonly ShownRow[]) => void;
}

/** The grid's columns: the part, the terms of the offer with a price at each quantity, and its standing. */
export function pricesColumns({
  quantities,
  suppliers,
  mayEdit,
  isNarrow,
  onConfirm,
}: ColumnsOptions): Column[] {
  const editable = (cell: CellKey, headerName: string, width: number, more: Column = {}): Column => ({
    colId: cell,
    headerName,
    width,
    valueGetter: ({ data }) => data && shownText(data, cell),
    comparator: byText(cell),
    editable: ({ data }) => mayEdit && data !== undefined && isEditable(data, cell),
    cellRenderer: EditedCell,
    ...more,
  });
  const numeric = (cell: CellKey, headerName: string, width: number) =>
    editable(cell, headerName, width, { type: 'rightAligned', comparator: byNumber(cell) });
  const listed = (options: readonly string[]): Column => ({
    cellEditor: ListEditor,
    cellEditorParams: { options },
  });
  const named = [
    standing('state', 'State', 84, StateCell),
    editable('supplier', 'Supplier', 184, listed(suppliers.map(({ name }) => name))),
    editable('supplierNumber', 'Supplier’s no.', 112),
    editable('currency', 'Currency', 78, listed(CURRENCIES)),
  ];
  const priced = quantities.map((quantity) => numeric(priceCell(quantity), `at ${quantity}`, 74));
  return [
    standing('part', 'Part', isNarrow ? 132 : 204, PartCell, { pinned: 'left' }),
    ...(isNarrow ? [...priced, ...named] : [...named, ...priced]),
    numeric('minimumOrderQuantity', 'MOQ', 68),
    numeric('orderMultiple', 'Multiple', 76),
    numeric('leadTimeDays', 'Lead time, d', 98),
    numeric('stock', 'Stock', 76),
    editable('validFrom', 'Valid from', 104),
    editable('validUntil', 'Valid until', 104),
    standing('confirmed', 'Last confirmed', 200, ConfirmedCell),
    standing('usedIn', 'Used in conditions', 220, EditedCell),
    ...(mayEdit ? [confirmColumn(onConfirm, isNarrow)] : []),
  ];
}

function confirmColumn(onConfirm: ColumnsOptions['onConfirm'], isNarrow: boolean): Column {
  return standing('confirm', 'Confirm', 102, ConfirmCell, {
    pinned: isNarrow ? undefined : 'right',
    cellRendererParams: { onConfirm },
    sortable: false,
    resizable: false,
  });
}

function standing(
  colId: string,
  headerName: string,
  width: number,
  cellRenderer: Column['cellRenderer'],
  more: Column = {},
): Column {
  const valueGetter: Column['valueGetter'] = ({ data }) => data && standingText(data, colId);
  return { colId, headerName, width, cellRenderer, valueGetter, ...more };
}

/** Rows are sorted by what is saved, so that they stay where they are while they are edited; empty cells come last. */
function byText(cell: CellKey): Column['comparator'] {
  return compared(
    (row) => cellText(row, cell),
    (a, b) => a.localeCompare(b, 'en'),
  );
}

function byNumber(cell: CellKey): Column['comparator'] {
  return compared(
    (row) => cellText(row, cell),
    (a, b) => Number(a) - Number(b),
  );
}

function compared(
  textOf: (row: ShownRow) => string,
  compare: (a: string, b: string) => number,
): Column['comparator'] {
  return (_a, _b, one, other, descending) => {
    const [a, b] = [one, other].map(({ data }) => (data ? textOf(data) : ''));
    if (a === '' || b === '') return a === b ? 0 : (a === '' ? 1 : -1) * (descending ? -1 : 1);
    return compare(a, b);
  };
}
