import type { LibraryPart, PartKind } from '@roothertz/common/parts';
import type { PoolConnection, RowDataPacket } from 'mysql2';
import type { QueryRunner } from 'typeorm';
import { columnName } from './entities/parameter-columns.js';
import type { PartTable } from './part-tables.js';

/** The texts, origins, choice and figures of a part in the order of its tables. */
export type PartCells = (string | number | null)[];

/** A part that is to be written, with what makes it the same part however its name is written. */
export interface KeyedPart {
  normalisedKey: string;
  cells: PartCells;
}

/** A part that is to be written over the one of this id, as its next version. */
export interface ReplacingPart extends KeyedPart {
  id: number;
  version: number;
}

/** A part as a search by keys finds it; the part is null where it is of another kind than was asked for. */
export interface FoundPart<Kind extends LibraryPart> {
  id: number;
  libraryId: number;
  kind: PartKind;
  version: number;
  normalisedKey: string;
  part: Kind | null;
}

/** Whose writing it is, and when. */
export interface Stamp {
  at: Date;
  userId: number;
}

const FIRST_VERSION = 1;
const MOST_KEYS = 150_000;
const KEYS_AT_ONCE = 5000;
const TEXTS = ['manufacturer', 'part_number', 'description', 'package', 'lifecycle', 'approval'];
const CHANGED = [...TEXTS, 'normalised_key', 'version', 'updated_at', 'updated_by'];

/** The parts of these keys in the libraries; over the binary protocol figures stay exact. */
export async function findPartsByKeys<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  libraryIds: readonly number[],
  keys: readonly string[],
): Promise<FoundPart<Kind>[]> {
  if (keys.length === 0) return [];
  const connection = (await runner.connect()) as PoolConnection;
  const sql = `
    SELECT part.id, part.library_id, part.kind, part.version, part.normalised_key,
      ${TEXTS.map((name) => `part.${name}`).join(', ')}, CAST(kind.origins AS CHAR),
      ${parameterNames(table)
        .map((name) => `kind.${name}`)
        .join(', ')}
    FROM parts part LEFT JOIN ${table.name} kind ON kind.part_id = part.id
    WHERE part.library_id IN (${marks(libraryIds)}) AND part.normalised_key IN (${marks(keys)})`;
  const [rows] = await connection
    .promise()
    .execute<RowDataPacket[][]>({ sql, rowsAsArray: true }, [...libraryIds, ...keys]);
  return rows.map((row) => toFoundPart(table, row));
}

/**
 * The keys of all parts of the libraries, so that only those among them need be looked up; null where they are too
 * many to be kept.
 */
export async function knownKeys(
  runner: QueryRunner,
  libraryIds: readonly number[],
): Promise<ReadonlySet<string> | null> {
  const keys = new Set<string>();
  for (const libraryId of libraryIds)
    for (let last: string | undefined = ''; last !== undefined;) {
      const rows: { key: string }[] = await runner.query(
        `SELECT normalised_key AS \`key\` FROM parts WHERE library_id = ? AND normalised_key > ?
         ORDER BY normalised_key LIMIT ${KEYS_AT_ONCE}`,
        [libraryId, last],
      );
      for (const { key } of rows) keys.add(key);
      if (keys.size > MOST_KEYS) return null;
      last = rows.at(-1)?.key;
    }
  return keys;
}

/** Writes new parts of a kind into a library; to be called in the transaction that bumped its revision. */
export async function insertPartsInBulk<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  libraryId: number,
  parts: readonly KeyedPart[],
  stamp: Stamp,
): Promise<void> {
  if (parts.length === 0) return;
  const rows = parts.map((part) => partRow(table, libraryId, part, FIRST_VERSION, stamp));
  const { insertId } = (await runner.query(
    `INSERT INTO parts (library_id, kind, created_at, ${CHANGED.join(', ')}) VALUES ?`,
    [rows],
  )) as { insertId: number };
  await writeParameters(
    runner,
    table,
    parts.map(({ cells }, index) => ({ id: insertId + index, cells })),
  );
}

/** Writes parts over those of the same ids; to be called in the transaction that bumped the library's revision. */
export async function replacePartsInBulk<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  libraryId: number,
  parts: readonly ReplacingPart[],
  stamp: Stamp,
): Promise<void> {
  if (parts.length === 0) return;
  const rows = parts.map((part) => [part.id, ...partRow(table, libraryId, part, part.version, stamp)]);
  await runner.query(
    `INSERT INTO parts (id, library_id, kind, created_at, ${CHANGED.join(', ')}) VALUES ?
     ON DUPLICATE KEY UPDATE ${CHANGED.map((name) => `${name} = VALUES(${name})`).join(', ')}`,
    [rows],
  );
  await writeParameters(runner, table, parts);
}

/** A part as its cells. */
export function toCells<Kind extends LibraryPart>(table: PartTable<Kind>, part: Kind): PartCells {
  const { manufacturer, partNumber, description, package: packageName, lifecycle, approval, origins } = part;
  const texts = [manufacturer, partNumber, description, packageName, lifecycle, approval];
  const { group } = table.catalogue;
  const parameters = (part as unknown as Record<string, Record<string, string | number | null>>)[group];
  return [...texts, JSON.stringify(origins), ...parameterKeys(table).map((key) => parameters[key])];
}

function partRow<Kind extends LibraryPart>(
  { catalogue }: PartTable<Kind>,
  libraryId: number,
  { normalisedKey, cells }: KeyedPart,
  version: number,
  { at, userId }: Stamp,
): unknown[] {
  return [libraryId, catalogue.kind, at, ...cells.slice(0, TEXTS.length), normalisedKey, version, at, userId];
}

async function writeParameters<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  parts: readonly { id: number; cells: PartCells }[],
): Promise<void> {
  const names = ['origins', ...parameterNames(table)];
  await runner.query(
    `INSERT INTO ${table.name} (part_id, ${names.join(', ')}) VALUES ?
     ON DUPLICATE KEY UPDATE ${names.map((name) => `${name} = VALUES(${name})`).join(', ')}`,
    [parts.map(({ id, cells }) => [id, ...cells.slice(TEXTS.length)])],
  );
}

function parameterKeys<Kind extends LibraryPart>({ catalogue }: PartTable<Kind>): string[] {
  return [catalogue.choice.key, ...catalogue.parameters.map(({ key }) => key)];
}

function parameterNames<Kind extends LibraryPart>(table: PartTable<Kind>): string[] {
  return parameterKeys(table).map(columnName);
}

function toFoundPart<Kind extends LibraryPart>(table: PartTable<Kind>, row: unknown[]): FoundPart<Kind> {
  const [id, libraryId, kind, version, normalisedKey] = row as [number, number, PartKind, number, string];
  const ofKind = kind === table.catalogue.kind;
  return {
    id,
    libraryId,
    kind,
    version,
    normalisedKey,
    part: ofKind ? partOfCells(table, row.slice(5)) : null,
  };
}

/** The part that the cells hold: the inverse of {@link toCells}. */
export function partOfCells<Kind extends LibraryPart>(
  table: PartTable<Kind>,
  cells: readonly unknown[],
): Kind {
  const [manufacturer, partNumber, description, packageName, lifecycle, approval, origins, ...figures] =
    cells;
  const parameters = parameterKeys(table).map((key, place) => [key, figures[place]]);
  return {
    manufacturer,
    partNumber,
    description,
    package: packageName,
    lifecycle,
    approval,
    [table.catalogue.group]: Object.fromEntries(parameters),
    origins: JSON.parse(origins as string),
  } as unknown as Kind;
}

function marks(values: readonly unknown[]): string {
  return values.map(() => '?').join(', ');
}
