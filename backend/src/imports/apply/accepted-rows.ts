import type { LibraryPart } from '@roothertz/common/parts';
import type { QueryRunner } from 'typeorm';
import type { ImportRow } from '../entities/import-row.entity.js';

/** A row that an import writes. */
export type AcceptedRow = Pick<ImportRow, 'position' | 'line' | 'partNumber' | 'partId' | 'baseVersion'> & {
  normalisedKey: string;
  content: LibraryPart;
  beforeImage: LibraryPart | null;
};

const PORTION = 2000;

/** The next rows behind a position that an import writes. */
export async function acceptedPortion(
  runner: QueryRunner,
  importId: number,
  after: number,
): Promise<AcceptedRow[]> {
  const rows: Record<string, string | number | null>[] = await runner.query(
    `SELECT position, line, part_number, normalised_key, part_id, base_version, content, before_image
     FROM import_rows WHERE import_id = ? AND position > ? AND state IN ('new', 'changed', 'doubtful')
     ORDER BY position LIMIT ${PORTION}`,
    [importId, after],
  );
  return rows.map(toAcceptedRow);
}

export function keysOf(rows: readonly AcceptedRow[]): string[] {
  return rows.map(({ normalisedKey }) => normalisedKey);
}

function toAcceptedRow(row: Record<string, string | number | null>): AcceptedRow {
  return {
    position: row.position as number,
    line: row.line as number,
    partNumber: row.part_number as string,
    normalisedKey: row.normalised_key as string,
    partId: row.part_id as number | null,
    baseVersion: row.base_version as number | null,
    content: parsed(row.content)!,
    beforeImage: parsed(row.before_image),
  };
}

function parsed(json: unknown): LibraryPart | null {
  return (typeof json === 'string' ? JSON.parse(json) : json) as LibraryPart | null;
}
