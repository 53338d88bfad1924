import { emptyColumns, NOISE_PARAMETERS, type AmplifierColumns } from '@roothertz/common/noise';
import {
  type AmplifierOrigins,
  type Approval,
  type InputType,
  type Lifecycle,
  OP_AMP_PARAMETERS,
} from '@roothertz/common/parts';
import type { PoolConnection } from 'mysql2';
import type { DataSource } from 'typeorm';
import { parameterColumn } from './entities/op-amp.entity.js';

/** A library's op-amps as the ranking takes them, in the order of their ids. */
export interface LibraryColumns {
  ids: Uint32Array;
  manufacturers: string[];
  partNumbers: string[];
  columns: AmplifierColumns;
}

type Row = [
  id: number,
  manufacturer: string,
  partNumber: string,
  description: string,
  packageName: string,
  lifecycle: Lifecycle,
  approval: Approval,
  inputType: InputType | null,
  origins: string,
  ...figures: (number | null)[],
];
const FIXED_CELLS = 9;

const COLUMNS_SQL = `
  SELECT part.id, part.manufacturer, part.part_number, part.description, part.package, part.lifecycle,
    part.approval, op_amp.input_type, CAST(op_amp.origins AS CHAR),
    ${OP_AMP_PARAMETERS.map(({ key }) => `op_amp.${parameterColumn(key)}`).join(', ')}
  FROM parts part JOIN op_amps op_amp ON op_amp.part_id = part.id
  WHERE part.library_id = ? ORDER BY part.id`;

/** Reads a library's op-amps; rows as arrays over the binary protocol keep figures exact and 100 000 parts quick. */
export async function readLibraryColumns(dataSource: DataSource, libraryId: number): Promise<LibraryColumns> {
  const runner = dataSource.createQueryRunner();
  try {
    const connection = (await runner.connect()) as PoolConnection;
    const [rows] = await connection.promise().execute({ sql: COLUMNS_SQL, rowsAsArray: true }, [libraryId]);
    return toLibraryColumns(rows as unknown as Row[]);
  } finally {
    await runner.release();
  }
}

function toLibraryColumns(rows: readonly Row[]): LibraryColumns {
  const columns = emptyColumns(rows.length);
  const readOrigins = originsReader();
  const shared = sharedTexts();
  rows.forEach((row, index) => {
    const [, manufacturer, partNumber, description, packageName, lifecycle, approval, inputType] = row;
    columns.package[index] = shared(packageName);
    columns.lifecycle[index] = shared(lifecycle);
    columns.approval[index] = shared(approval);
    columns.inputType[index] = inputType && shared(inputType);
    columns.searchText[index] = `${manufacturer} ${partNumber} ${description}`.toLowerCase();
    keepOrigins(columns, index, readOrigins(row[FIXED_CELLS - 1] as string));
    keepFigures(columns, index, row);
  });
  return {
    ids: Uint32Array.from(rows, ([id]) => id),
    manufacturers: rows.map(([, manufacturer]) => shared(manufacturer)),
    partNumbers: rows.map(([, , partNumber]) => partNumber),
    columns,
  };
}

function keepFigures(columns: AmplifierColumns, index: number, row: Row): void {
  OP_AMP_PARAMETERS.forEach(({ key }, place) => {
    columns.parameters[key][index] = (row[FIXED_CELLS + place] as number | null) ?? NaN;
  });
}

function keepOrigins(columns: AmplifierColumns, index: number, origins: AmplifierOrigins): void {
  for (const key of NOISE_PARAMETERS) columns.origins[key][index] = origins[key] ?? 'typical';
}

/** Parses each different text of origins once, for a library has few. */
function originsReader(): (json: string) => AmplifierOrigins {
  const read = new Map<string, AmplifierOrigins>();
  return (json) => {
    const origins = read.get(json) ?? (JSON.parse(json) as AmplifierOrigins);
    read.set(json, origins);
    return origins;
  };
}

/** Keeps one copy of each text, for a library repeats a few words in all its rows. */
function sharedTexts(): <Text extends string>(text: Text) => Text {
  const kept = new Map<string, string>();
  return <Text extends string>(text: Text) => {
    if (!kept.has(text)) kept.set(text, text);
    return kept.get(text) as Text;
  };
}
