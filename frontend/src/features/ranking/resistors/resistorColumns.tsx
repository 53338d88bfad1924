import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import { ResistorPartCell } from './ResistorPartCell';
import type { ResistorRow } from './resistorRows';

type Cell<Value> = ICellRendererParams<ResistorRow, Value>;

const RIGHT: ColDef<ResistorRow> = {
  cellStyle: { textAlign: 'right' },
  headerClass: 'ag-right-aligned-header',
};

/** The columns of resistors; the noise columns share one unit. */
export function resistorColumns(unit: string): ColDef<ResistorRow>[] {
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
      minWidth: 136,
      cellRenderer: ({ value }: Cell<ResistorRow['part']>) => value && <ResistorPartCell {...value} />,
    },
    {
      ...RIGHT,
      field: 'total',
      headerName: `total, ${unit}`,
      width: 78,
      cellStyle: { textAlign: 'right', fontWeight: 600 },
    },
    { ...RIGHT, field: 'aboveThermal', headerName: 'above thermal', width: 100 },
    { ...RIGHT, field: 'thermal', headerName: `thermal, ${unit}`, width: 88 },
    { ...RIGHT, field: 'excess', headerName: `excess, ${unit}`, width: 84 },
    { ...RIGHT, field: 'value', headerName: 'value', width: 118 },
    { field: 'technology', headerName: 'Technology', width: 116 },
    { field: 'dissipation', headerName: 'Dissipation of rating', width: 150 },
  ];
}
