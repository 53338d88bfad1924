import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Offer as OfferOfSupplier } from '@roothertz/common/prices';
import type { DataSource, EntityManager } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { findRates } from './dated-rates.js';
import { Offer } from './entities/offer.entity.js';
import type { OfferSelect } from './offer-select.js';
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

  async teamOf({ teamId }: Pick<Caller, 'teamId'>): Promise<PricedTeam> {
    const { revision } = await this.settings.find({ teamId });
    return { id: teamId, revision };
  }

  /** The team's prices; to be cached by the revision that {@link teamOf} gave. */
  load({ id }: PricedTeam): Promise<PriceBook> {
    const { manager } = this.dataSource;
    return this.read(manager, id, selectStanding(manager, id));
  }

  /** The team's prices of some parts, as a transaction sees them. */
  loadOf(manager: EntityManager, teamId: number, partIds: readonly number[]): Promise<PriceBook> {
    const select = selectStanding(manager, teamId);
    return this.read(
      manager,
      teamId,
      select.andWhere('offer.partId IN (:...partIds)', { partIds: [0, ...partIds] }),
    );
  }

  /** The teams that have offers which stand. */
  async teamsWithOffers(): Promise<number[]> {
    const found = await this.dataSource.manager
      .createQueryBuilder(Offer, 'offer')
      .select('DISTINCT offer.teamId', 'teamId')
      .where('offer.closedAt IS NULL')
      .orderBy('offer.teamId')
      .getRawMany<{ teamId: number }>();
    return found.map(({ teamId }) => teamId);
  }

  private async read(manager: EntityManager, teamId: number, select: OfferSelect): Promise<PriceBook> {
    const { currency, staleAfterDays } = await this.settings.find({ teamId }, manager);
    const rates = await findRates(manager, teamId, currency);
    const offers = byPart(await select.getMany());
    return { currency, staleAfterDays, rates, offers };
  }
}

/** A team's offers that stand, with what their prices are worked out from. */
function selectStanding(manager: EntityManager, teamId: number): OfferSelect {
  return manager
    .createQueryBuilder(Offer, 'offer')
    .innerJoinAndSelect('offer.supplier', 'supplier')
    .innerJoinAndSelect('offer.breaks', 'price')
    .where('offer.teamId = :teamId AND offer.closedAt IS NULL', { teamId })
    .orderBy('offer.id');
}

function byPart(found: readonly Offer[]): Map<number, OfferOfSupplier[]> {
  const offers = new Map<number, OfferOfSupplier[]>();
  for (const offer of found) {
    const list = offers.get(offer.partId) ?? [];
    offers.set(offer.partId, [...list, toPricedOffer(offer)]);
  }
  return offers;
}
