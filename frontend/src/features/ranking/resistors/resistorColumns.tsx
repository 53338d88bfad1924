import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import { ResistorPartCell } from './ResistorPartCell';
import type { ResistorRow } from './resistorRows';

type Cell<Value> = ICellRendererParams<ResistorRow, Value>;

const RIGHT: ColDef<ResistorRow> = {
  cellStyle: { textAlign: 'right' },
  headerClass: 'ag-right-aligned-header',
};

/** The last column: it leaves room for the scrollbar, which the grid doesn't count when it fits the columns. */
const PRICE: ColDef<ResistorRow> = {
  ...RIGHT,
  field: 'price',
  width: 82,
  cellStyle: { textAlign: 'right', paddingLeft: 0, paddingRight: 18 },
};

/** The columns of resistors; the noise columns share one unit. */
export function resistorColumns(unit: string, priceHeading: string | null): ColDef<ResistorRow>[] {
  return [
    {
      colId: 'place',
      field: 'place',
      headerName: '',
      width: 36,
      cellStyle: { paddingLeft: 0, paddingRight: 6, textAlign: 'right', color: 'var(--muted)' },
    },
    {
      colId: 'part',
      field: 'part',
      headerName: 'Part',
      flex: 1,
      minWidth: 124,
      cellRenderer: ({ value }: Cell<ResistorRow['part']>) => value && <ResistorPartCell {...value} />,
    },
    {
      ...RIGHT,
      field: 'total',
      headerName: `total, ${unit}`,
      width: 74,
      cellStyle: { textAlign: 'right', fontWeight: 600 },
    },
    { ...RIGHT, field: 'aboveThermal', headerName: 'above thermal', width: 99 },
    { ...RIGHT, field: 'thermal', headerName: `thermal, ${unit}`, width: 84 },
    { ...RIGHT, field: 'excess', headerName: `excess, ${unit}`, width: 80 },
    { ...RIGHT, field: 'value', headerName: 'value', width: 112 },
    { field: 'technology', headerName: 'Technology', width: 106 },
    { field: 'dissipation', headerName: 'Dissipation of rating', width: 133 },
    ...(priceHeading === null ? [] : [{ ...PRICE, headerName: priceHeading }]),
  ];
}
