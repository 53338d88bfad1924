import type { CheapestPart, PartPlace, RankedPart, Ranking } from '@roothertz/common/noise';
import type { OpAmpRecord } from '../library/part-record.js';
import type { QuantityPrices } from '../prices/price-book.js';
import type { CheapestDto, RankedOpAmpDto, RankingResponseDto } from './dto/ranking-response.dto.js';
import { type IndexedLibrary, revisionOf } from './library-index.service.js';
import { partNameAt, toPartName } from './part-name-at.js';
import { toPrice } from './price-response.js';

/** Ranked parts whose record is gone since they were ranked are left out. */
export function toRankingResponse(
  { total, excluded, quietSetTotal, cheapest, frontier, floor, items }: Ranking,
  libraries: readonly IndexedLibrary[],
  records: ReadonlyMap<number, OpAmpRecord>,
  prices: QuantityPrices,
): RankingResponseDto {
  return {
    total,
    excluded: countReasons(excluded),
    quietSet: { total: quietSetTotal },
    cheapest: cheapest && toCheapest(cheapest, libraries, prices),
    frontier: frontier.map(({ inputNoiseRms, ...place }) => ({
      ...toPricedName(place, libraries, prices),
      inputNoiseRms,
    })),
    floor,
    libraryRevision: revisionOf(libraries),
    items: items.flatMap((item) => {
      const record = records.get(libraries[item.library].ids[item.row]);
      return record === undefined ? [] : [toRankedOpAmp(item, record, prices)];
    }),
  };
}

function toRankedOpAmp(
  { rank, figures, quietSet, meetsTarget }: RankedPart,
  record: OpAmpRecord,
  prices: QuantityPrices,
): RankedOpAmpDto {
  const { amplifier, origins } = record;
  const part = { ...toPartName(record), amplifier, origins };
  return { rank, part, ...figures, quietSet, meetsTarget, unitPrice: toPrice(prices, record.id) };
}

function toCheapest(
  { aboveQuietest, ...place }: CheapestPart,
  libraries: readonly IndexedLibrary[],
  prices: QuantityPrices,
): CheapestDto {
  return { ...toPricedName(place, libraries, prices), aboveQuietest };
}

/** A part that has a price. */
function toPricedName(place: PartPlace, libraries: readonly IndexedLibrary[], prices: QuantityPrices) {
  const part = partNameAt(place, libraries);
  return { part, unitPrice: toPrice(prices, Number(part.id))! };
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
