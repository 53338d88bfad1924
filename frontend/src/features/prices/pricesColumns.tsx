import { CURRENCIES } from '@roothertz/common/prices';
import type { ColDef } from 'ag-grid-community';
import type { Supplier } from '../../api/prices';
import { type CellKey, isEditable, priceCell, standingText } from './draft/cells';
import { type ShownRow, shownText } from './draft/shownRows';
import { ConfirmCell } from './ConfirmCell';
import { EditedCell } from './EditedCell';
import { ListEditor } from './ListEditor';
import { sortKeyOf, sortOf } from './pricesView';
import { ConfirmedCell, PartCell, StateCell } from './StandingCells';

type Column = ColDef<ShownRow, string>;

interface ColumnsOptions {
  quantities: readonly number[];
  suppliers: readonly Supplier[];
  mayEdit: boolean;
  isNarrow: boolean;
  /** A column as the server calls it, with a minus in front for descending order. */
  sort: string | undefined;
  onConfirm: (rows: readonly ShownRow[]) => void;
}

/** The grid's columns: the part, the terms of the offer with a price at each quantity, and its standing. */
export function pricesColumns({
  quantities,
  suppliers,
  mayEdit,
  isNarrow,
  sort,
  onConfirm,
}: ColumnsOptions): Column[] {
  const editable = (cell: CellKey, headerName: string, width: number, more: Column = {}): Column => ({
    colId: cell,
    headerName,
    width,
    valueGetter: ({ data }) => data && shownText(data, cell),
    editable: ({ data }) => mayEdit && data !== undefined && isEditable(data, cell),
    cellRenderer: EditedCell,
    ...more,
  });
  const numeric = (cell: CellKey, headerName: string, width: number) =>
    editable(cell, headerName, width, { type: 'rightAligned' });
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
  const columns = [
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
  return columns.map((column) => sortedColumn(column, sort));
}

/** The server sorts, for not all rows may be loaded; the grid keeps the order in which they come. */
function sortedColumn(column: Column, sort: string | undefined): Column {
  const id = column.colId!;
  const sortable = sortKeyOf(id) !== undefined;
  return { ...column, sortable, comparator: () => 0, sort: sortOf(id, sort) };
}

function confirmColumn(onConfirm: ColumnsOptions['onConfirm'], isNarrow: boolean): Column {
  return standing('confirm', 'Confirm', 102, ConfirmCell, {
    pinned: isNarrow ? undefined : 'right',
    cellRendererParams: { onConfirm },
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
