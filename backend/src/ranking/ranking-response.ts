import type { CheapestPart, PartPlace, RankedPart, Ranking } from '@roothertz/common/noise';
import type { QuantityPrices } from '../prices/price-book.js';
import type { CheapestDto, RankedOpAmpDto, RankingResponseDto } from './dto/ranking-response.dto.js';
import { type IndexedLibrary, revisionOf } from './library-index.service.js';
import { partAt, partNameAt } from './part-at.js';
import { toPrice } from './price-response.js';

export function toRankingResponse(
  { total, excluded, quietSetTotal, cheapest, frontier, floor, items }: Ranking,
  libraries: readonly IndexedLibrary[],
  prices: QuantityPrices,
): RankingResponseDto {
  return {
    total,
    excluded,
    quietSet: { total: quietSetTotal },
    cheapest: cheapest && toCheapest(cheapest, libraries, prices),
    frontier: frontier.map(({ inputNoiseRms, ...place }) => ({
      ...toPricedName(place, libraries, prices),
      inputNoiseRms,
    })),
    floor,
    libraryRevision: revisionOf(libraries),
    items: items.map((item) => toRankedOpAmp(item, libraries, prices)),
  };
}

function toRankedOpAmp(
  { rank, figures, quietSet, meetsTarget, ...place }: RankedPart,
  libraries: readonly IndexedLibrary[],
  prices: QuantityPrices,
): RankedOpAmpDto {
  const part = partAt(place, libraries);
  return { rank, part, ...figures, quietSet, meetsTarget, unitPrice: toPrice(prices, Number(part.id)) };
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
