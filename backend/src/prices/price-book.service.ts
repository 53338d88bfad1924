import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Offer as OfferOfSupplier } from '@roothertz/common/prices';
import type { DataSource } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { findRates } from './dated-rates.js';
import { Offer } from './entities/offer.entity.js';
import { type PriceBook, toPricedOffer } from './price-book.js';
import { PriceSettingsService } from './price-settings.service.js';

export interface PricedTeam {
  id: number;
  revision: number;
}

/** Gives a team's prices to other features. */
@Injectable()
export class PriceBookService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly settings: PriceSettingsService,
  ) {}

  async teamOf({ teamId }: Caller): Promise<PricedTeam> {
    const { revision } = await this.settings.find({ teamId });
    return { id: teamId, revision };
  }

  /** The team's prices; to be cached by the revision that {@link teamOf} gave. */
  async load({ id: teamId }: PricedTeam): Promise<PriceBook> {
    const { manager } = this.dataSource;
    const { currency, staleAfterDays } = await this.settings.find({ teamId });
    const rates = await findRates(manager, teamId, currency);
    const found = await manager
      .createQueryBuilder(Offer, 'offer')
      .innerJoinAndSelect('offer.supplier', 'supplier')
      .innerJoinAndSelect('offer.breaks', 'price')
      .where('offer.teamId = :teamId AND offer.closedAt IS NULL', { teamId })
      .orderBy('offer.id')
      .getMany();
    return { currency, staleAfterDays, rates, offers: byPart(found) };
  }
}

function byPart(found: readonly Offer[]): Map<number, OfferOfSupplier[]> {
  const offers = new Map<number, OfferOfSupplier[]>();
  for (const offer of found) {
    const list = offers.get(offer.partId) ?? [];
    offers.set(offer.partId, [...list, toPricedOffer(offer)]);
  }
  return offers;
}
