import type { RankedPart, Ranking } from '@roothertz/common/noise';
import type { OpAmpRecord } from '../library/part-record.js';
import type { PartNameDto, RankedOpAmpDto, RankingResponseDto } from './dto/ranking-response.dto.js';
import { type IndexedLibrary, revisionOf } from './library-index.service.js';

/** Ranked parts whose record is gone since they were ranked are left out. */
export function toRankingResponse(
  { total, excluded, quietSetTotal, floor, items }: Ranking,
  libraries: readonly IndexedLibrary[],
  records: ReadonlyMap<number, OpAmpRecord>,
): RankingResponseDto {
  return {
    total,
    excluded: countReasons(excluded),
    quietSet: { total: quietSetTotal },
    floor,
    libraryRevision: revisionOf(libraries),
    items: items.flatMap((item) => {
      const record = records.get(libraries[item.library].ids[item.row]);
      return record === undefined ? [] : [toRankedOpAmp(item, record)];
    }),
  };
}

function toRankedOpAmp(
  { rank, figures, quietSet, meetsTarget }: RankedPart,
  record: OpAmpRecord,
): RankedOpAmpDto {
  const { amplifier, origins } = record;
  const part = { ...toPartName(record), amplifier, origins };
  return { rank, part, ...figures, quietSet, meetsTarget, unitPrice: null };
}

export function toPartName(record: Omit<PartNameDto, 'id'> & { id: number }): PartNameDto {
  const { id, library, manufacturer, partNumber, package: packageName, lifecycle, approval } = record;
  return { id: String(id), library, manufacturer, partNumber, package: packageName, lifecycle, approval };
}

/** How many parts are excluded for each reason, the most frequent one first. */
export function countReasons<Reason>(excluded: readonly { reason: Reason }[]): {
  total: number;
  reasons: { reason: Reason; count: number }[];
} {
  const counts = new Map<Reason, number>();
  for (const { reason } of excluded) counts.set(reason, (counts.get(reason) ?? 0) + 1);
  const reasons = [...counts].map(([reason, count]) => ({ reason, count }));
  return { total: excluded.length, reasons: reasons.sort((a, b) => b.count - a.count) };
}
