import { gapFields, type ListedFields } from '@roothertz/common/parts';
import { isUnknown, type PartSelect } from './part-select.js';

/** How many parts lack what. */
export interface GapCounts {
  total: number;
  /** They lack nothing. */
  complete: number;
  missing: { parameter: string; count: number }[];
}

/** Counts in one pass over the parts of a selection what they lack. */
export async function countGaps(select: PartSelect, fields: ListedFields): Promise<GapCounts> {
  const gaps = gapFields(fields);
  const isComplete = gaps.map(({ key }) => `NOT (${isUnknown(fields, key)})`).join(' AND ');
  select.select('COUNT(*)', 'total').addSelect(`SUM(${isComplete})`, 'complete');
  for (const { key } of gaps) select.addSelect(`SUM(${isUnknown(fields, key)})`, key);
  const counts = (await select.getRawOne<Record<string, string | null>>())!;
  return {
    total: Number(counts.total),
    complete: Number(counts.complete),
    missing: gaps.map(({ key }) => ({ parameter: key, count: Number(counts[key]) })),
  };
}
