import { type AmplifierColumns, emptyColumns, NOISE_PARAMETERS } from '@roothertz/common/noise';
import { type AmplifierOrigins, type InputType, OP_AMP_PARAMETERS } from '@roothertz/common/parts';
import { figureAt, type ListedRow, originsReader, searchText, sharedTexts } from './listed-rows.js';

/** A library's op-amps as the ranking takes them, in the order of their ids. */
export interface LibraryColumns {
  ids: Uint32Array;
  manufacturers: string[];
  partNumbers: string[];
  /** where each part's figures come from; parts with the same origins share them */
  origins: AmplifierOrigins[];
  columns: AmplifierColumns;
}

export function toLibraryColumns(rows: readonly ListedRow[]): LibraryColumns {
  const columns = emptyColumns(rows.length);
  const originsOf = originsReader();
  const shared = sharedTexts();
  const origins = rows.map(originsOf);
  rows.forEach((row, index) => {
    const [, , , , packageName, lifecycle, approval, inputType] = row;
    columns.package[index] = shared(packageName);
    columns.lifecycle[index] = shared(lifecycle);
    columns.approval[index] = shared(approval);
    columns.inputType[index] = shared(inputType as InputType | null);
    columns.searchText[index] = searchText(row);
    keepOrigins(columns, index, origins[index]);
    keepFigures(columns, index, row);
  });
  return {
    ids: Uint32Array.from(rows, ([id]) => id),
    manufacturers: rows.map(([, manufacturer]) => shared(manufacturer)),
    partNumbers: rows.map(([, , partNumber]) => partNumber),
    origins,
    columns,
  };
}

function keepFigures(columns: AmplifierColumns, index: number, row: ListedRow): void {
  OP_AMP_PARAMETERS.forEach(({ key }, place) => {
    columns.parameters[key][index] = figureAt(row, place) ?? NaN;
  });
}

function keepOrigins(columns: AmplifierColumns, index: number, origins: AmplifierOrigins): void {
  for (const key of NOISE_PARAMETERS) columns.origins[key][index] = origins[key] ?? 'typical';
}
