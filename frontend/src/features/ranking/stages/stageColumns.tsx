import type { Topology } from '@roothertz/common/conditions';
import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import { BudgetBar } from '../BudgetBar';
import {
  GainCell,
  NetworkCell,
  NetworkHeading,
  StageNoiseCell,
  StagePartCell,
  StagePriceCell,
} from './StageCells';
import type { StageRow } from './stageRows';

type Cell<Value> = ICellRendererParams<StageRow, Value>;

const RIGHT: ColDef<StageRow> = { cellStyle: { textAlign: 'right' }, headerClass: 'ag-right-aligned-header' };

/** The columns of whole stages; the noise column's heading carries the one unit of its figures. */
export function stageColumns(
  unit: string,
  topology: Topology,
  priceHeading: string | null,
): ColDef<StageRow>[] {
  const isTransimpedance = topology === 'transimpedance';
  const hasPrices = priceHeading !== null;
  return [
    {
      colId: 'place',
      field: 'place',
      headerName: '',
      width: 32,
      cellStyle: { paddingLeft: 0, paddingRight: 6, textAlign: 'right', color: 'var(--muted)' },
    },
    {
      colId: 'part',
      field: 'part',
      headerName: 'Part',
      flex: 1,
      minWidth: 96,
      cellRenderer: ({ value }: Cell<StageRow['part']>) => value && <StagePartCell {...value} />,
    },
    {
      ...RIGHT,
      colId: 'noise',
      field: 'noise',
      headerName: `noise, ${unit} rms`,
      width: 96,
      cellRenderer: ({ value }: Cell<StageRow['noise']>) => value && <StageNoiseCell {...value} />,
    },
    {
      colId: 'network',
      field: 'network',
      headerName: isTransimpedance ? 'R_f' : 'R_g, R_f',
      width: hasPrices ? 142 : 146,
      headerComponent: () => <NetworkHeading hasGainResistor={!isTransimpedance} />,
      cellRenderer: ({ value }: Cell<StageRow['network']>) => value && <NetworkCell parts={value} />,
    },
    {
      ...RIGHT,
      colId: 'gain',
      field: 'gain',
      headerName: 'gain',
      width: hasPrices ? 46 : 50,
      hide: isTransimpedance,
      cellRenderer: ({ value }: Cell<StageRow['gain']>) => value && <GainCell {...value} />,
    },
    {
      colId: 'budget',
      field: 'budget',
      headerName: hasPrices ? 'budget' : 'budget, power',
      width: hasPrices ? 54 : 134,
      cellStyle: { display: 'flex', alignItems: 'center', paddingLeft: 4, paddingRight: 2 },
      cellRenderer: ({ value }: Cell<StageRow['budget']>) => value && <BudgetBar {...value} />,
    },
    ...(hasPrices ? [priceColumn(priceHeading)] : []),
  ];
}

const SCROLLBAR = 18;

/** The last column: it leaves room for the scrollbar, which the grid doesn't count when it fits the columns. */
function priceColumn(headerName: string): ColDef<StageRow> {
  return {
    ...RIGHT,
    colId: 'price',
    field: 'price',
    headerName,
    width: 80,
    cellStyle: { textAlign: 'right', paddingLeft: 0, paddingRight: SCROLLBAR },
    cellRenderer: ({ value }: Cell<StageRow['price']>) => value && <StagePriceCell {...value} />,
  };
}
