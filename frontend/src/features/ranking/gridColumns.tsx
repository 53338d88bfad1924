import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import { BudgetBar } from './BudgetBar';
import type { GridRow } from './gridRows';
import { NoiseCell } from './NoiseCell';
import { PartCell } from './PartCell';
import { PlaceCell } from './PlaceCell';

type Cell<Value> = ICellRendererParams<GridRow, Value>;

const FIGURE: ColDef<GridRow> = { cellStyle: { textAlign: 'right' }, headerClass: 'ag-right-aligned-header' };

const SCROLLBAR = 18;

/** The ranking's columns; headings carry the one unit of all noise figures, and the currency of all prices. */
export function gridColumns(unit: string, priceHeading: string | null): ColDef<GridRow>[] {
  return [
    {
      colId: 'place',
      field: 'place',
      headerName: '',
      width: 36,
      cellStyle: { paddingLeft: 0, paddingRight: 6 },
      cellRenderer: ({ value }: Cell<GridRow['place']>) => value && <PlaceCell {...value} />,
    },
    {
      colId: 'part',
      field: 'part',
      headerName: 'Part',
      flex: 1,
      minWidth: 130,
      cellRenderer: ({ value }: Cell<GridRow['part']>) => value && <PartCell {...value} />,
    },
    {
      ...FIGURE,
      colId: 'noise',
      field: 'noise',
      headerName: `noise, ${unit} rms`,
      width: 94,
      cellRenderer: ({ value }: Cell<GridRow['noise']>) => value && <NoiseCell {...value} />,
    },
    { ...FIGURE, colId: 'aboveFloor', field: 'aboveFloor', headerName: 'above floor', width: 78 },
    {
      colId: 'budget',
      field: 'budget',
      headerName: 'budget, power',
      width: 104,
      cellStyle: { paddingLeft: 6, paddingRight: 4 },
      cellRenderer: ({ value }: Cell<GridRow['budget']>) => value && <BudgetBar {...value} />,
    },
    ...(priceHeading === null ? [] : [priceColumn(priceHeading)]),
  ];
}

/** The last column: it leaves room for the scrollbar, which the grid doesn't count when it fits the columns. */
function priceColumn(headerName: string): ColDef<GridRow> {
  const cellStyle = { textAlign: 'right', paddingLeft: 0, paddingRight: SCROLLBAR };
  return { ...FIGURE, colId: 'price', field: 'price', headerName, width: 80, cellStyle };
}
