import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { FieldError } from '@roothertz/common/parts';
import { dayOf, RATE_DECIMALS, scaledText, toScaled } from '@roothertz/common/prices';
import { type DataSource, type EntityManager, IsNull } from 'typeorm';
import { AuditService, type Recorded } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import type { DatedRateDto, RatesResponseDto, SaveRatesDto } from './dto/rates.dto.js';
import { ExchangeRate } from './entities/exchange-rate.entity.js';
import { Offer } from './entities/offer.entity.js';
import { currentRates, findRates } from './dated-rates.js';
import { PriceChanges } from './price-changes.service.js';
import { PriceSettingsService } from './price-settings.service.js';

/** The team's own exchange rates, each dated. */
@Injectable()
export class RatesService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly settings: PriceSettingsService,
    private readonly changes: PriceChanges,
    private readonly audit: AuditService,
  ) {}

  async read(caller: Caller): Promise<RatesResponseDto> {
    const { currency } = await this.settings.find(caller);
    return this.answer(this.dataSource.manager, caller, currency);
  }

  save(caller: Caller, { dated, rates }: SaveRatesDto): Promise<RatesResponseDto> {
    const today = dayOf(new Date());
    return this.changes.run(caller, async (manager) => {
      const { currency: baseCurrency } = await this.settings.find(caller, manager);
      refuse(checkRates(rates, baseCurrency, dated ?? today, today));
      const before = currentRates(await findRates(manager, caller.teamId, baseCurrency), today);
      const { teamId, userId: updatedById } = caller;
      const common = { teamId, baseCurrency, dated: dated ?? today, updatedAt: new Date(), updatedById };
      await manager.upsert(
        ExchangeRate,
        rates.map((rate) => ({ ...common, ...toRate(rate) })),
        ['teamId', 'baseCurrency', 'currency', 'dated'],
      );
      await this.audit.record(
        manager,
        caller,
        rates.map((rate) => toRecorded(toRate(rate), common, before)),
      );
      return this.answer(manager, caller, baseCurrency);
    });
  }

  private async answer(manager: EntityManager, caller: Caller, currency: string): Promise<RatesResponseDto> {
    const { teamId } = caller;
    const rates = currentRates(await findRates(manager, teamId, currency), dayOf(new Date()));
    const offers = await manager.find(Offer, {
      where: { teamId, closedAt: IsNull() },
      select: { id: true, currency: true },
    });
    const needed = new Set(offers.map((offer) => offer.currency));
    const missing = [...needed].filter((code) => code !== currency && !rates.has(code));
    return { currency, items: [...rates.values()], missing: missing.sort() };
  }
}

function toRate({ currency, rate }: { currency: string; rate: string }) {
  return { currency, rate: scaledText(toScaled(rate.trim(), RATE_DECIMALS), RATE_DECIMALS) };
}

function toRecorded(
  { currency, rate }: { currency: string; rate: string },
  { baseCurrency, dated }: { baseCurrency: string; dated: string },
  before: ReadonlyMap<string, DatedRateDto>,
): Recorded {
  const from = before.get(currency) ?? null;
  const pair = `${currency}/${baseCurrency}`;
  const object = { kind: 'rate', id: pair, label: pair } as const;
  return { action: 'rates.changed', object, from, to: { currency, rate, dated } };
}

function checkRates(
  rates: SaveRatesDto['rates'],
  baseCurrency: string,
  dated: string,
  today: string,
): FieldError[] {
  const errors: FieldError[] = [];
  if (dated > today) errors.push({ field: 'dated', message: 'dated: a day not after today was expected' });
  rates.forEach(({ currency }, index) => {
    const field = `rates[${index}].currency`;
    if (currency === baseCurrency)
      errors.push({ field, message: 'currency: another one than the team’s own was expected' });
    if (rates.findIndex((rate) => rate.currency === currency) < index)
      errors.push({ field, message: 'currency: it has a rate in this list already' });
  });
  return errors;
}

function refuse(errors: FieldError[]): void {
  if (errors.length > 0)
    throw new DomainError('rates.invalid', 'Some of the rates can’t be kept.', { errors });
}
