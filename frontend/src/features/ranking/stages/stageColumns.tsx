import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import { BudgetBar } from '../BudgetBar';
import { GainCell, NetworkCell, StageNoiseCell, StagePartCell } from './StageCells';
import type { StageRow } from './stageRows';

type Cell<Value> = ICellRendererParams<StageRow, Value>;

const RIGHT: ColDef<StageRow> = { cellStyle: { textAlign: 'right' }, headerClass: 'ag-right-aligned-header' };

/** The columns of whole stages; the noise column's heading carries the one unit of its figures. */
export function stageColumns(unit: string): ColDef<StageRow>[] {
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
      colId: 'network',
      field: 'network',
      headerName: 'R_g, R_f',
      width: 152,
      headerComponent: () => (
        <span>
          R<sub>g</sub>, R<sub>f</sub>
        </span>
      ),
      cellRenderer: ({ value }: Cell<StageRow['network']>) => value && <NetworkCell parts={value} />,
    },
    {
      ...RIGHT,
      colId: 'gain',
      field: 'gain',
      headerName: 'gain',
      width: 76,
      cellRenderer: ({ value }: Cell<StageRow['gain']>) => value && <GainCell {...value} />,
    },
    {
      ...RIGHT,
      colId: 'noise',
      field: 'noise',
      headerName: `noise, ${unit} rms`,
      width: 100,
      cellRenderer: ({ value }: Cell<StageRow['noise']>) => value && <StageNoiseCell {...value} />,
    },
    {
      colId: 'budget',
      field: 'budget',
      headerName: 'budget, power',
      width: 136,
      cellStyle: { display: 'flex', alignItems: 'center', paddingLeft: 6, paddingRight: 2 },
      cellRenderer: ({ value }: Cell<StageRow['budget']>) => value && <BudgetBar {...value} />,
    },
  ];
}
