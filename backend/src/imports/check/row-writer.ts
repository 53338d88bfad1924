import type { LibraryPart } from '@roothertz/common/parts';
import type { PoolConnection } from 'mysql2';
import type { QueryRunner } from 'typeorm';
import { toCells } from '../../library/bulk-parts.js';
import type { PartTable } from '../../library/part-tables.js';
import { shortened } from '../../shared/text/shortened.js';
import { noRows, type RowCounts } from '../row-counts.js';
import type { StoredRow } from '../stored-row.js';
import type { CheckedRow } from './row-checker.js';

const LONGEST_CELL = 2000;
const SQL = 'INSERT INTO import_portions (import_id, place, counts, verdicts) VALUES (?, ?, ?, ?)';

/** Stores the verdicts of a portion of rows and adds them to the counts. */
export async function writeVerdicts(
  runner: QueryRunner,
  table: PartTable<LibraryPart>,
  place: { importId: number; portion: number },
  rows: readonly CheckedRow[],
  counts: RowCounts,
): Promise<void> {
  const own = noRows();
  for (const { verdict } of rows) {
    own[verdict.state] += 1;
    counts[verdict.state] += 1;
  }
  const stored = JSON.stringify(rows.map((row) => toStored(table, row)));
  const connection = (await runner.connect()) as PoolConnection;
  const values = [place.importId, place.portion, JSON.stringify({ ...own, kept: 0 }), stored];
  await connection.promise().execute(SQL, values);
}

function toStored(table: PartTable<LibraryPart>, { record, verdict, key, existing }: CheckedRow): StoredRow {
  const { line } = record;
  if (verdict.state === 'refused') {
    const errors = verdict.errors.map((error) => ({ ...error, value: shortened(error.value, LONGEST_CELL) }));
    return { line, state: verdict.state, manufacturer: '', partNumber: '', errors, cells: record.cells };
  }
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
