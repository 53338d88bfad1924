import { APPROVALS, LIFECYCLES, type ListedFields, type ParameterDefinition } from '@roothertz/common/parts';
import {
  formatInPrefix,
  formatQuantity,
  parseUnit,
  PREFIXES,
  type Prefix,
  type QuantityKind,
} from '@roothertz/common/units';
import type { ColDef, ICellRendererParams } from 'ag-grid-community';
import type { StoredPart } from '../../api/parts';
import { Unknown } from '../../components/Figure';
import { FigureHeader } from './FigureHeader';
import type { KindOfPart } from './kindOfPart';
import { optionLabel } from '../../components/optionLabels';
import { figureOf, figuresOf } from './partDraft';
import { PartLink } from './PartLink';

type Column = ColDef<StoredPart>;

/** Kinds whose values lie too many decades apart for one unit: each value brings its own. */
const WITH_OWN_UNIT: readonly QuantityKind[] = ['resistance'];

/** The list's columns: what names the part, its figures in catalogue order, and its standing. */
export function partsColumns(
  { path, choice, columnWidths, catalogue }: KindOfPart,
  mayEdit: boolean,
): Column[] {
  return [
    {
      colId: 'partNumber',
      field: 'partNumber',
      headerName: 'Part',
      width: columnWidths.part,
      pinned: 'left',
      cellRenderer: PartLink,
      cellRendererParams: { path },
    },
    { colId: 'manufacturer', field: 'manufacturer', headerName: 'Maker', width: 106 },
    wordColumn(
      choice.key,
      choice.label,
      columnWidths.choice,
      (part) => figuresOf(catalogue, part)[choice.key],
    ),
    ...catalogue.parameters.map((parameter) => figureColumn(catalogue, parameter)),
    { colId: 'package', field: 'package', headerName: 'Package', width: 104 },
    {
      ...wordColumn('approval', 'Approval', 112, ({ approval }) => approval),
      ...(mayEdit && choiceEditor('approval', APPROVALS)),
    },
    {
      ...wordColumn('lifecycle', 'Lifecycle', 132, ({ lifecycle }) => lifecycle),
      ...(mayEdit && choiceEditor('lifecycle', LIFECYCLES)),
    },
    wordColumn('library', 'Library', 92, ({ library }) => library),
  ];
}

function wordColumn(
  key: string,
  headerName: string,
  width: number,
  wordOf: (part: StoredPart) => unknown,
): Column {
  return {
    colId: key,
    headerName,
    width,
    valueGetter: ({ data }) => data && wordOf(data),
    cellRenderer: ({ value }: ICellRendererParams) =>
      value ? optionLabel(key, value as string) : <Unknown />,
  };
}

/** A choice of words in the cells of the team's own parts. */
function choiceEditor(key: string, values: readonly string[]): Column {
  return {
    editable: ({ data }) => data?.library === 'team',
    singleClickEdit: true,
    cellEditor: 'agSelectCellEditor',
    cellEditorParams: { values, valueListMaxWidth: 260 },
    valueFormatter: ({ value }) => optionLabel(key, value as string),
  };
}

function figureColumn(fields: ListedFields, parameter: ParameterDefinition): Column {
  const { key, symbol, label, displayUnit } = parameter;
  const hasOwnUnit = WITH_OWN_UNIT.includes(parameter.kind);
  const textOf = hasOwnUnit ? textWithUnit(parameter) : textInColumn(parameter);
  const header = { name: symbol ?? label, help: label, unit: hasOwnUnit ? '' : displayUnit };
  return {
    colId: key,
    headerName: header.name,
    width: symbol && !hasOwnUnit ? 78 : 86,
    valueGetter: ({ data }) => data && figureOf(figuresOf(fields, data), key),
    comparator: unknownLast,
    cellRenderer: ({ value }: ICellRendererParams<StoredPart, number | null>) =>
      value == null ? <Unknown /> : textOf(value),
    type: 'rightAligned',
    headerComponentParams: { innerHeaderComponent: FigureHeader, innerHeaderComponentParams: header },
  };
}

function textWithUnit({ kind }: ParameterDefinition): (value: number) => string {
  return (value) => formatQuantity(value, kind);
}

function textInColumn({ kind, displayUnit }: ParameterDefinition): (value: number) => string {
  const prefix = prefixOf(displayUnit);
  return (value) => formatInPrefix(value, kind, prefix);
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
