import type { RowError } from '@roothertz/common/imports';
import type { LibraryPart } from '@roothertz/common/parts';
import type { PoolConnection } from 'mysql2';
import type { QueryRunner } from 'typeorm';
import { toCells } from '../../library/bulk-parts.js';
import type { PartTable } from '../../library/part-tables.js';
import { shortened } from '../../shared/text/shortened.js';
import type { CsvRecord } from '../file/csv-records.js';
import { noRows, type RowCounts } from '../row-counts.js';
import type { StoredRow } from '../stored-row.js';
import type { CheckedRow } from './row-checker.js';

const LONGEST_CELL = 2000;
const SQL = 'INSERT INTO import_portions (import_id, place, counts, verdicts) VALUES (?, ?, ?, ?)';

/** Stores a portion of rows with their verdicts and adds them to the counts. */
export async function writeRows(
  runner: QueryRunner,
  place: { importId: number; portion: number },
  rows: readonly StoredRow[],
  counts: RowCounts,
): Promise<void> {
  const own = noRows();
  for (const { state } of rows) {
    own[state] += 1;
    counts[state] += 1;
  }
  const stored = JSON.stringify(rows);
  const connection = (await runner.connect()) as PoolConnection;
  const values = [place.importId, place.portion, JSON.stringify({ ...own, kept: 0 }), stored];
  await connection.promise().execute(SQL, values);
}

/** A refused row, with its cells for the list that is to be mended. */
export function refusedRow({ line, cells }: CsvRecord, errors: readonly RowError[]): StoredRow {
  const shown = errors.map((error) => ({ ...error, value: shortened(error.value, LONGEST_CELL) }));
  return { line, state: 'refused', manufacturer: '', partNumber: '', errors: shown, cells };
}

export function toStored(
  table: PartTable<LibraryPart>,
  { record, verdict, key, existing }: CheckedRow,
): StoredRow {
  const { line } = record;
  if (verdict.state === 'refused') return refusedRow(record, verdict.errors);
  const { part, doubts, state } = verdict;
  const { manufacturer, partNumber } = part;
  const row: StoredRow = { line, state, manufacturer, partNumber };
  if (doubts.length > 0) row.doubts = doubts;
  if (state === 'unchanged') return row;
  row.normalisedKey = key!;
  row.content = toCells(table, part);
  if (!existing?.part) return row;
  const { id: partId, version: baseVersion } = existing;
  return { ...row, partId, baseVersion, before: toCells(table, existing.part), changes: verdict.changes };
}
