import type { QueryRunner } from 'typeorm';
import { ImportPortion } from '../entities/import-portion.entity.js';
import type { StoredRow } from '../stored-row.js';

/** Marks rows of a portion that an undoing leaves as they are, and answers how many they are. */
export async function markKept(
  runner: QueryRunner,
  { importId, portion, counts, rows }: ImportPortion,
  kept: readonly StoredRow[],
): Promise<number> {
  for (const row of kept) row.kept = true;
  if (kept.length > 0)
    await runner.manager.update(
      ImportPortion,
      { importId, portion },
      { counts: { ...counts, kept: kept.length }, rows: rows as object[] },
    );
  return kept.length;
}
