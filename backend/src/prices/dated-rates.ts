import type { ExchangeRates } from '@roothertz/common/prices';
import type { EntityManager } from 'typeorm';
import { ExchangeRate } from './entities/exchange-rate.entity.js';

/** What a unit of a currency is worth in the team's, from a day on. */
export interface DatedRate {
  currency: string;
  rate: string;
  dated: string;
}

/** The rates against a base currency, in the order of their days. */
export async function findRates(
  manager: EntityManager,
  teamId: number,
  baseCurrency: string,
): Promise<DatedRate[]> {
  const found = await manager.find(ExchangeRate, {
    where: { teamId, baseCurrency },
    order: { dated: 'ASC', currency: 'ASC' },
  });
  return found.map(({ currency, rate, dated }) => ({ currency, rate, dated }));
}

/** The rate of each currency that holds on a day: the newest that isn't dated after it. */
export function currentRates(rates: readonly DatedRate[], day: string): Map<string, DatedRate> {
  return new Map(rates.filter(({ dated }) => dated <= day).map((rate) => [rate.currency, rate]));
}

export function toExchangeRates(rates: ReadonlyMap<string, DatedRate>): ExchangeRates {
  return Object.fromEntries([...rates.values()].map(({ currency, rate }) => [currency, rate]));
}
