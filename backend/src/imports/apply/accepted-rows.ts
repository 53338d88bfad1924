import { type DataSource, MoreThan } from 'typeorm';
import type { PartCells } from '../../library/bulk-parts.js';
import { ImportPortion } from '../entities/import-portion.entity.js';
import type { StoredRow } from '../stored-row.js';

/** A row that an import writes. */
export type AcceptedRow = StoredRow & { normalisedKey: string; content: PartCells };

/** A portion of an import's rows, and those among them that it writes. */
export interface AcceptedPortion {
  portion: ImportPortion;
  accepted: AcceptedRow[];
}

export async function* acceptedPortions(
  dataSource: DataSource,
  importId: number,
): AsyncGenerator<AcceptedPortion> {
  for await (const portion of portionsOf(dataSource, importId))
    yield { portion, accepted: portion.rows.filter(isAccepted) };
}

/** The portions of an import's rows; the next one is read by another connection meanwhile. */
export async function* portionsOf(dataSource: DataSource, importId: number): AsyncGenerator<ImportPortion> {
  let portion = await portionAfter(dataSource, importId, 0);
  while (portion !== null) {
    const next = portionAfter(dataSource, importId, portion.portion);
    next.catch(() => undefined);
    yield portion;
    portion = await next;
  }
}

export function keysOf(rows: readonly AcceptedRow[]): string[] {
  return rows.map(({ normalisedKey }) => normalisedKey);
}

function portionAfter(
  dataSource: DataSource,
  importId: number,
  after: number,
): Promise<ImportPortion | null> {
  return dataSource.getRepository(ImportPortion).findOne({
    where: { importId, portion: MoreThan(after) },
    order: { portion: 'ASC' },
  });
}

function isAccepted(row: StoredRow): row is AcceptedRow {
  return row.content !== undefined;
}
