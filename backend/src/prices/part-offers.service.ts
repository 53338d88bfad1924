import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { dayOf, type ExchangeRates, priceAt } from '@roothertz/common/prices';
import type { DataSource } from 'typeorm';
import { selectReadableParts } from '../library/readable-parts.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { readId } from '../shared/ids/read-id.js';
import { currentRates, findRates, toExchangeRates } from './dated-rates.js';
import type { PartOffersDto, PriceHistoryDto, PriceHistoryQueryDto } from './dto/part-offers.dto.js';
import { toSupplierResponse } from './dto/supplier.dto.js';
import type { Offer } from './entities/offer.entity.js';
import { toOfferResponse } from './offer-response.js';
import { selectOffers } from './offer-select.js';
import { toPricedOffer } from './price-book.js';
import { PriceSettingsService } from './price-settings.service.js';

/** What the team's suppliers ask for a part, and what they asked before. */
@Injectable()
export class PartOffersService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly settings: PriceSettingsService,
  ) {}

  async list(caller: Caller, partId: string): Promise<PartOffersDto> {
    const offers = await this.findAll(caller, partId);
    const view = await this.settings.view(caller);
    const shown = (list: Offer[]) => list.map((offer) => toOfferResponse(offer, view));
    const closed = offers.filter(({ closedAt }) => closedAt !== null);
    return {
      current: shown(offers.filter(({ closedAt }) => closedAt === null)),
      history: shown(closed.sort((a, b) => Number(b.closedAt) - Number(a.closedAt) || b.id - a.id)),
    };
  }

  async history(caller: Caller, { partId, quantity }: PriceHistoryQueryDto): Promise<PriceHistoryDto> {
    const offers = await this.findAll(caller, partId);
    const { currency } = await this.settings.find(caller);
    const today = dayOf(new Date());
    const dated = await findRates(this.dataSource.manager, caller.teamId, currency);
    const rates = toExchangeRates(currentRates(dated, today));
    const items = offers.map((offer) => ({
      offerId: String(offer.id),
      supplier: toSupplierResponse(offer.supplier),
      from: offer.openedAt.toISOString(),
      until: offer.closedAt && offer.closedAt.toISOString(),
      unitPrice: whileItStood(offer, quantity, rates, currency),
    }));
    return { currency, quantity, items };
  }

  /** Every offer for the part, in the order in which they were opened. */
  private async findAll(caller: Caller, partId: string): Promise<Offer[]> {
    const { manager } = this.dataSource;
    const id = readId(partId);
    const part =
      id && (await selectReadableParts(manager, caller).andWhere('part.id = :id', { id }).getOne());
    if (!part) throw new DomainError('part.not-found', 'There is no such part in your libraries.');
    const offers = await selectOffers(manager, caller).andWhere('offer.partId = :id', { id }).getMany();
    return offers.sort((a, b) => Number(a.openedAt) - Number(b.openedAt) || a.id - b.id);
  }
}

function whileItStood(offer: Offer, quantity: number, rates: ExchangeRates, currency: string): string | null {
  const priced = toPricedOffer(offer);
  return priceAt([priced], quantity, rates, currency, priced.validFrom)?.unitPrice ?? null;
}
