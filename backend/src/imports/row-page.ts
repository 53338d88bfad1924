import { ROW_STATES } from '@roothertz/common/imports';
import type { ImportPortion } from './entities/import-portion.entity.js';
import type { RowList } from './stored-row.js';

export type CountedPortion = Pick<ImportPortion, 'portion' | 'counts'>;

/** Where the rows of a page stand. */
export interface RowPage {
  portions: number[];
  /** How many rows of the list stand in those portions before the page. */
  skipped: number;
  total: number;
}

/** Finds the portions that hold a page of a list of rows, of all rows without one. */
export function pageOf(
  portions: readonly CountedPortion[],
  { state, limit, offset }: { state?: RowList; limit: number; offset: number },
): RowPage {
  const page: RowPage = { portions: [], skipped: 0, total: 0 };
  for (const { portion, counts } of portions) {
    const own = state === undefined ? sum(ROW_STATES.map((one) => counts[one])) : counts[state];
    const [from, to] = [page.total, page.total + own];
    page.total = to;
    if (to <= offset || from >= offset + limit) continue;
    if (page.portions.length === 0) page.skipped = offset - from;
    page.portions.push(portion);
  }
  return { ...page, skipped: Math.max(0, page.skipped) };
}

function sum(counts: readonly number[]): number {
  return counts.reduce((total, count) => total + count, 0);
}
