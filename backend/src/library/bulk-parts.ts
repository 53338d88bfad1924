import type { LibraryPart, PartKind } from '@roothertz/common/parts';
import type { PoolConnection, RowDataPacket } from 'mysql2';
import type { QueryRunner } from 'typeorm';
import { columnName } from './entities/parameter-columns.js';
import type { PartTable } from './part-tables.js';

/** A part that is to be written, with what makes it the same part however its name is written. */
export interface KeyedPart<Kind extends LibraryPart> {
  normalisedKey: string;
  part: Kind;
}

/** A part that is to be written over the one of this id, as its next version. */
export interface ReplacingPart<Kind extends LibraryPart> extends KeyedPart<Kind> {
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

/** Writes new parts of a kind into a library; to be called in the transaction that bumped its revision. */
export async function insertPartsInBulk<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  libraryId: number,
  parts: readonly KeyedPart<Kind>[],
  { at, userId }: Stamp,
): Promise<void> {
  if (parts.length === 0) return;
  const rows = parts.map(({ part, normalisedKey }) => [
    libraryId,
    table.catalogue.kind,
    ...textsOf(part),
    normalisedKey,
    FIRST_VERSION,
    at,
    userId,
    at,
  ]);
  const { insertId } = (await runner.query(
    `INSERT INTO parts (library_id, kind, ${CHANGED.join(', ')}, created_at) VALUES ?`,
    [rows],
  )) as { insertId: number };
  await writeParameters(
    runner,
    table,
    parts.map(({ part }, index) => ({ id: insertId + index, part })),
  );
}

/** Writes parts over those of the same ids; to be called in the transaction that bumped the library's revision. */
export async function replacePartsInBulk<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  libraryId: number,
  parts: readonly ReplacingPart<Kind>[],
  { at, userId }: Stamp,
): Promise<void> {
  if (parts.length === 0) return;
  const rows = parts.map(({ id, part, normalisedKey, version }) => [
    id,
    libraryId,
    table.catalogue.kind,
    ...textsOf(part),
    normalisedKey,
    version,
    at,
    userId,
    at,
  ]);
  await runner.query(
    `INSERT INTO parts (id, library_id, kind, ${CHANGED.join(', ')}, created_at) VALUES ?
     ON DUPLICATE KEY UPDATE ${CHANGED.map((name) => `${name} = VALUES(${name})`).join(', ')}`,
    [rows],
  );
  await writeParameters(runner, table, parts);
}

async function writeParameters<Kind extends LibraryPart>(
  runner: QueryRunner,
  table: PartTable<Kind>,
  parts: readonly { id: number; part: Kind }[],
): Promise<void> {
  const names = [...parameterNames(table), 'origins'];
  await runner.query(
    `INSERT INTO ${table.name} (part_id, ${names.join(', ')}) VALUES ?
     ON DUPLICATE KEY UPDATE ${names.map((name) => `${name} = VALUES(${name})`).join(', ')}`,
    [parts.map(({ id, part }) => [id, ...parametersOf(table, part), JSON.stringify(part.origins)])],
  );
}

function parameterKeys<Kind extends LibraryPart>({ catalogue }: PartTable<Kind>): string[] {
  return [catalogue.choice.key, ...catalogue.parameters.map(({ key }) => key)];
}

function parameterNames<Kind extends LibraryPart>(table: PartTable<Kind>): string[] {
  return parameterKeys(table).map(columnName);
}

function parametersOf<Kind extends LibraryPart>(table: PartTable<Kind>, part: Kind): unknown[] {
  const parameters = (part as unknown as Record<string, Record<string, unknown>>)[table.catalogue.group];
  return parameterKeys(table).map((key) => parameters[key]);
}

function textsOf({
  manufacturer,
  partNumber,
  description,
  package: packageName,
  lifecycle,
  approval,
}: LibraryPart) {
  return [manufacturer, partNumber, description, packageName, lifecycle, approval];
}

function toFoundPart<Kind extends LibraryPart>(table: PartTable<Kind>, row: unknown[]): FoundPart<Kind> {
  const [id, libraryId, kind, version, normalisedKey] = row as [number, number, PartKind, number, string];
  const ofKind = kind === table.catalogue.kind;
  return { id, libraryId, kind, version, normalisedKey, part: ofKind ? toPart(table, row.slice(5)) : null };
}

function toPart<Kind extends LibraryPart>(table: PartTable<Kind>, cells: unknown[]): Kind {
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
