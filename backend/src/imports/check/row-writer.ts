import type { QueryRunner } from 'typeorm';
import { shortened } from '../../shared/text/shortened.js';
import type { RowCounts } from '../row-counts.js';
import { changesOf, type CheckedRow } from './row-checker.js';

const LONGEST_CELL = 2000;
const NAMES = [
  'import_id',
  'position',
  'line',
  'state',
  'manufacturer',
  'part_number',
  'normalised_key',
  'part_id',
  'base_version',
  'content',
  'before_image',
  'changes',
  'doubts',
  'errors',
  'cells',
];

/** Stores the verdicts of a portion of rows, of which the first has this position, and counts them. */
export async function writeVerdicts(
  runner: QueryRunner,
  importId: number,
  first: number,
  rows: readonly CheckedRow[],
  counts: RowCounts,
): Promise<void> {
  const values = rows.map((row, index) => [importId, first + index, ...verdictValues(row)]);
  for (const { verdict } of rows) counts[verdict.state] += 1;
  await runner.query(`INSERT INTO import_rows (${NAMES.join(', ')}) VALUES ?`, [values]);
}

function verdictValues(row: CheckedRow): unknown[] {
  const { record, verdict, key, existing } = row;
  const head = [record.line, verdict.state];
  if (verdict.state === 'refused')
    return [
      ...head,
      '',
      '',
      null,
      null,
      null,
      null,
      null,
      null,
      null,
      json(verdict.errors.map((error) => ({ ...error, value: shortened(error.value, LONGEST_CELL) }))),
      json(record.cells),
    ];
  const { manufacturer, partNumber } = verdict.part;
  const written = verdict.state !== 'unchanged';
  return [
    ...head,
    manufacturer,
    partNumber,
    key,
    existing?.id ?? null,
    existing?.version ?? null,
    written ? json(verdict.part) : null,
    written && existing ? json(existing.part) : null,
    json(changesOf(verdict)),
    json(verdict.doubts.length > 0 ? verdict.doubts : null),
    null,
    null,
  ];
}

function json(value: unknown): string | null {
  return value === null ? null : JSON.stringify(value);
}
