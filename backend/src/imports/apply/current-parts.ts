import type { QueryRunner } from 'typeorm';

/** What tells whether a part was edited. */
export interface CurrentPart {
  id: number;
  version: number;
  updatedAt: Date;
}

/** The parts of a library by their keys, as they stand. */
export async function currentParts(
  runner: QueryRunner,
  libraryId: number,
  keys: readonly string[],
): Promise<Map<string, CurrentPart>> {
  const rows: (CurrentPart & { normalisedKey: string })[] = await runner.query(
    `SELECT id, normalised_key AS normalisedKey, version, updated_at AS updatedAt
     FROM parts WHERE library_id = ? AND normalised_key IN (?)`,
    [libraryId, keys],
  );
  return new Map(rows.map((row) => [row.normalisedKey, row]));
}
