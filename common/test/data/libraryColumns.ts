import { emptyColumns, NOISE_PARAMETERS, type AmplifierColumns } from '../../src/noise/index.js';
import { OP_AMP_PARAMETERS, type OpAmpPart } from '../../src/parts/index.js';

/** The op-amps of a list as the columns that the ranking takes. */
export function libraryColumns(parts: readonly OpAmpPart[]): AmplifierColumns {
  const columns = emptyColumns(parts.length);
  parts.forEach((part, row) => fillRow(columns, row, part));
  return columns;
}

function fillRow(columns: AmplifierColumns, row: number, part: OpAmpPart): void {
  for (const { key } of OP_AMP_PARAMETERS) columns.parameters[key][row] = part.amplifier[key] ?? NaN;
  for (const key of NOISE_PARAMETERS) columns.origins[key][row] = part.origins[key] ?? 'typical';
  columns.inputType[row] = part.amplifier.inputType;
  columns.lifecycle[row] = part.lifecycle;
  columns.approval[row] = part.approval;
  columns.package[row] = part.package;
  columns.searchText[row] = `${part.manufacturer} ${part.partNumber} ${part.description}`.toLowerCase();
}
