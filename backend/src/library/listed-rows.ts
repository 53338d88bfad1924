import type { Approval, LibraryPart, Lifecycle, Origins } from '@roothertz/common/parts';
import type { PoolConnection } from 'mysql2';
import type { DataSource } from 'typeorm';
import { columnName } from './entities/parameter-columns.js';
import type { PartTable } from './part-tables.js';

/** A part of a library as its row's cells; behind the fixed ones stand its figures in the catalogue's order. */
export type ListedRow = [
  id: number,
  manufacturer: string,
  partNumber: string,
  description: string,
  packageName: string,
  lifecycle: Lifecycle,
  approval: Approval,
  choice: string | null,
  origins: string,
  ...figures: (number | null)[],
];
const FIXED_CELLS = 9;

/**
 * Reads a library's parts of a kind in the order of their ids; rows as arrays over the binary protocol keep
 * figures exact and 100 000 parts quick.
 */
export async function readListedRows<Kind extends LibraryPart>(
  dataSource: DataSource,
  table: PartTable<Kind>,
  libraryId: number,
): Promise<ListedRow[]> {
  const runner = dataSource.createQueryRunner();
  try {
    const connection = (await runner.connect()) as PoolConnection;
    const sql = rowsSql(table);
    const [rows] = await connection.promise().execute({ sql, rowsAsArray: true }, [libraryId]);
    return rows as unknown as ListedRow[];
  } finally {
    await runner.release();
  }
}

export function figureAt(row: ListedRow, place: number): number | null {
  return row[FIXED_CELLS + place] as number | null;
}

/** What the search looks in. */
export function searchText([, manufacturer, partNumber, description]: ListedRow): string {
  return `${manufacturer} ${partNumber} ${description}`.toLowerCase();
}

/** Parses each different text of origins once, for a library has few. */
export function originsReader(): (row: ListedRow) => Origins {
  const read = new Map<string, Origins>();
  return (row) => {
    const json = row[FIXED_CELLS - 1] as string;
    const origins = read.get(json) ?? (JSON.parse(json) as Origins);
    read.set(json, origins);
    return origins;
  };
}

/** Keeps one copy of each text, for a library repeats a few words in all its rows. */
export function sharedTexts(): <Text extends string | null>(text: Text) => Text {
  const kept = new Map<string | null, string | null>();
  return <Text extends string | null>(text: Text) => {
    if (!kept.has(text)) kept.set(text, text);
    return kept.get(text) as Text;
  };
}

function rowsSql<Kind extends LibraryPart>({ catalogue, name }: PartTable<Kind>): string {
  const figures = catalogue.parameters.map(({ key }) => `kind.${columnName(key)}`);
  return `
    SELECT part.id, part.manufacturer, part.part_number, part.description, part.package, part.lifecycle,
      part.approval, kind.${columnName(catalogue.choice.key)}, CAST(kind.origins AS CHAR), ${figures.join(', ')}
    FROM parts part JOIN ${name} kind ON kind.part_id = part.id
    WHERE part.library_id = ? ORDER BY part.id`;
}
