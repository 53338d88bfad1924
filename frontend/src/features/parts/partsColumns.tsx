import { OP_AMP_PARAMETERS, type ParameterDefinition } from '@roothertz/common/parts';
import { formatInPrefix, parseUnit, PREFIXES, type Prefix } from '@roothertz/common/units';
import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import type { OpAmp } from '../../api/opAmps';
import { Unknown } from '../../components/Figure';
import { FigureHeader } from './FigureHeader';
import { optionLabel } from './optionLabels';
import { PartLink } from './PartLink';

type Column = ColDef<OpAmp>;

/** The list's columns: what names the part, its figures in catalogue order, and its standing. */
export const PARTS_COLUMNS: Column[] = [
  {
    colId: 'partNumber',
    field: 'partNumber',
    headerName: 'Part',
    width: 112,
    pinned: 'left',
    cellRenderer: PartLink,
  },
  { colId: 'manufacturer', field: 'manufacturer', headerName: 'Maker', width: 126 },
  { ...wordColumn('inputType', 'Input', 88), valueGetter: ({ data }) => data?.amplifier.inputType },
  ...OP_AMP_PARAMETERS.map(figureColumn),
  { colId: 'package', field: 'package', headerName: 'Package', width: 96 },
  wordColumn('approval', 'Approval', 108),
  wordColumn('lifecycle', 'Lifecycle', 124),
  wordColumn('library', 'Library', 92),
];

function wordColumn(
  key: 'inputType' | 'approval' | 'lifecycle' | 'library',
  headerName: string,
  width: number,
): Column {
  return {
    colId: key,
    headerName,
    width,
    field: key === 'inputType' ? undefined : key,
    cellRenderer: ({ value }: ICellRendererParams) =>
      value ? optionLabel(key, value as string) : <Unknown />,
  };
}

function figureColumn(parameter: ParameterDefinition<(typeof OP_AMP_PARAMETERS)[number]['key']>): Column {
  const { key, kind, displayUnit } = parameter;
  const prefix = prefixOf(displayUnit);
  return {
    colId: key,
    headerName: parameter.symbol ?? parameter.label,
    width: parameter.symbol ? 78 : 92,
    valueGetter: ({ data }) => data?.amplifier[key],
    comparator: unknownLast,
    cellRenderer: ({ value }: ICellRendererParams<OpAmp, number | null>) =>
      value == null ? <Unknown /> : formatInPrefix(value, kind, prefix),
    type: 'rightAligned',
    headerComponentParams: { innerHeaderComponent: FigureHeader, innerHeaderComponentParams: { parameter } },
  };
}

function prefixOf(displayUnit: string): Prefix {
  const exponent = parseUnit(displayUnit)?.exponent ?? 0;
  return (Object.keys(PREFIXES) as Prefix[]).find((prefix) => PREFIXES[prefix] === exponent) ?? '';
}

function unknownLast(
  left: number | null,
  right: number | null,
  _a: unknown,
  _b: unknown,
  descending: boolean,
) {
  if (left === null || right === null) {
    if (left === right) return 0;
    return (left === null ? 1 : -1) * (descending ? -1 : 1);
  }
  return left - right;
}
