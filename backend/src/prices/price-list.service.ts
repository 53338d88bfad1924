import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { ConditionsService } from '../conditions/conditions.service.js';
import { findReadableParts, toPartName } from '../library/readable-parts.js';
import type { Caller } from '../shared/access/caller.js';
import type { ListPricesDto, PriceListDto } from './dto/list-prices.dto.js';
import type { PriceCountsDto } from './dto/price-counts.dto.js';
import { toOfferedPart, toOfferResponse } from './offer-response.js';
import { findOffers } from './offer-select.js';
import {
  filterPrices,
  parsePriceSort,
  type PriceQuery,
  type PriceSelect,
  selectPrices,
  sortPrices,
} from './price-select.js';
import { PriceSettingsService } from './price-settings.service.js';

interface Row {
  partId: number;
  offerId: number | null;
}

/** The rows of the grid: parts with each of their offers, or without. */
@Injectable()
export class PriceListService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly settings: PriceSettingsService,
    private readonly conditions: ConditionsService,
  ) {}

  async list(caller: Caller, query: ListPricesDto): Promise<PriceListDto> {
    const { manager } = this.dataSource;
    const sort = parsePriceSort(query.sort ?? 'manufacturer');
    const view = await this.settings.view(caller);
    const uses = await this.conditions.partsInUse(caller);
    const select = filterPrices(selectPrices(manager, caller), query, view, [...uses.keys()]);
    const total = await countRows(select);
    const rows = await sortPrices(select.select('part.id', 'partId').addSelect('offer.id', 'offerId'), sort)
      .limit(query.limit)
      .offset(query.offset)
      .getRawMany<Row>();
    const parts = await this.findParts(caller, rows);
    const offers = await findOffers(
      manager,
      caller,
      rows.flatMap(({ offerId }) => offerId ?? []),
    );
    const items = rows.flatMap(({ partId, offerId }) => {
      const part = parts.get(partId);
      const offer = offers.get(offerId ?? 0);
      const usedIn = uses.get(partId)?.map(({ name }) => name) ?? [];
      return part
        ? [{ part: toOfferedPart(part), offer: offer ? toOfferResponse(offer, view) : null, usedIn }]
        : [];
    });
    return { items, total };
  }

  async count(caller: Caller): Promise<PriceCountsDto> {
    const view = await this.settings.view(caller);
    const inUse = [...(await this.conditions.partsInUse(caller)).keys()];
    const count = (query: PriceQuery) =>
      countRows(filterPrices(selectPrices(this.dataSource.manager, caller), query, view, inUse));
    return {
      offers: await count({}),
      stale: await count({ state: ['stale'] }),
      expiring: await count({ state: ['expiring'] }),
      expired: await count({ state: ['expired'] }),
      missing: await count({ state: ['missing'], library: ['team'] }),
      usedInConditions: await count({ usedInConditions: true }),
    };
  }

  private async findParts(caller: Caller, rows: readonly Row[]) {
    const ids = rows.map(({ partId }) => partId);
    const parts = await findReadableParts(this.dataSource.manager, caller, ids);
    return new Map(parts.map((part) => [part.id, toPartName(part)]));
  }
}

async function countRows(select: PriceSelect): Promise<number> {
  const counted = await select.clone().select('COUNT(*)', 'total').getRawOne<{ total: string }>();
  return Number(counted?.total);
}
