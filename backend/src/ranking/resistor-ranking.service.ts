import {
  type RankedResistor,
  rankResistors,
  type ResistorExclusionReason,
  RESISTOR_SORTS,
  type ResistorRanking,
} from '@roothertz/common/noise';
import { type Resistor, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import { Injectable } from '@nestjs/common';
import type { ListedResistor } from '../library/listed-resistors.js';
import type { QuantityPrices } from '../prices/price-book.js';
import type { Caller } from '../shared/access/caller.js';
import { checkedResistorRequest } from '../shared/conditions/ranking-request.js';
import { parseSort } from '../shared/list/sort.js';
import type { RankResistorsDto } from './dto/rank-resistors.dto.js';
import type {
  RankedResistorDto,
  ResistorExclusionListDto,
  ResistorRankingDto,
} from './dto/resistor-ranking.dto.js';
import { LibraryIndex, type ResistorLibrary, revisionOf } from './library-index.service.js';
import { PriceIndex } from './price-index.service.js';
import { toPrice } from './price-response.js';
import { toPartName } from './part-at.js';

interface Ranked extends ResistorRanking {
  libraries: ResistorLibrary[];
  /** All resistors that the ranking was made of; its indices are places in it. */
  resistors: ListedResistor[];
  prices: QuantityPrices;
}

const PARAMETERS = [RESISTOR_CATALOGUE.choice, ...RESISTOR_CATALOGUE.parameters].map(({ key }) => key);

@Injectable()
export class ResistorRankingService {
  constructor(
    private readonly index: LibraryIndex,
    private readonly prices: PriceIndex,
  ) {}

  async rank(caller: Caller, dto: RankResistorsDto): Promise<ResistorRankingDto> {
    const { total, excluded, items, libraries, resistors, prices } = await this.ranked(caller, dto);
    return {
      total,
      excluded: countReasons(excluded),
      libraryRevision: revisionOf(libraries),
      items: items.map((item) => toRankedResistor(item, resistors[item.index], prices)),
    };
  }

  async exclusions(caller: Caller, dto: RankResistorsDto): Promise<ResistorExclusionListDto> {
    const { excluded, resistors } = await this.ranked(caller, dto);
    const page = excluded.slice(dto.offset, dto.offset + dto.limit);
    return {
      items: page.map(({ index, reason, detail }) => ({
        part: toPartName(resistors[index]),
        reason,
        detail,
      })),
      total: excluded.length,
    };
  }

  private async ranked(caller: Caller, dto: RankResistorsDto): Promise<Ranked> {
    const { conditions, filter } = checkedResistorRequest(dto);
    const { key: sort, descending } = parseSort(dto.sort, RESISTOR_SORTS);
    const { limit, offset } = dto;
    const libraries = await this.index.resistorsReadableBy(caller, filter);
    const resistors = libraries.flatMap((library) => library.resistors);
    const prices = await this.prices.at(caller, dto.quantity);
    const totals = prices.totals(resistors.map(({ id }) => id));
    const query = { conditions, filter, sort, descending, limit, offset, prices: totals };
    return { ...rankResistors(query, resistors), libraries, resistors, prices };
  }
}

function toRankedResistor(
  { rank, figures }: RankedResistor,
  listed: ListedResistor,
  prices: QuantityPrices,
): RankedResistorDto {
  const resistor = Object.fromEntries(PARAMETERS.map((key) => [key, listed[key as keyof Resistor]]));
  const part = { ...toPartName(listed), resistor: resistor as unknown as Resistor, origins: listed.origins };
  return { rank, part, ...figures, unitPrice: toPrice(prices, listed.id) };
}

/** How many parts are excluded for each reason, the most frequent one first. */
function countReasons(excluded: ResistorRanking['excluded']): ResistorRankingDto['excluded'] {
  const counts = new Map<ResistorExclusionReason, number>();
  for (const { reason } of excluded) counts.set(reason, (counts.get(reason) ?? 0) + 1);
  const reasons = [...counts].map(([reason, count]) => ({ reason, count }));
  return { total: excluded.length, reasons: reasons.sort((a, b) => b.count - a.count) };
}
