import { normalisePartKey } from '@roothertz/common/parts';
import { dayOf } from '@roothertz/common/prices';
import type { EntityManager } from 'typeorm';
import { ExchangeRate } from '../../prices/entities/exchange-rate.entity.js';
import { PriceSettings } from '../../prices/entities/price-settings.entity.js';
import { Supplier } from '../../prices/entities/supplier.entity.js';
import { insertOffers } from '../../prices/offer-rows.js';
import { nameKey } from '../../shared/text/name-key.js';
import type { DemoData } from './demo-data.js';
import { findPartIds } from './part-ids.js';
import { type ListedOffer, readPriceList } from './price-list.js';
import type { SeededTeam } from './seed-team.js';

const LIST = 'demo/tarnfield-prices.csv';

/** The demo team's suppliers, offers and rates, and what it has settled for them. */
export async function seedPrices(
  manager: EntityManager,
  { teamId, buyerId }: SeededTeam,
  { rates, ...settings }: DemoData['prices'],
): Promise<void> {
  const updatedAt = new Date();
  const today = dayOf(updatedAt);
  await manager.insert(PriceSettings, { teamId, ...settings });
  const base = { teamId, baseCurrency: settings.currency, dated: today, updatedAt, updatedById: buyerId };
  await manager.insert(
    ExchangeRate,
    rates.map((rate) => ({ ...base, ...rate })),
  );
  const listed = readPriceList(LIST, today);
  const supplierIds = await insertSuppliers(manager, teamId, listed);
  const partIds = await findPartIds(manager, teamId);
  const versions = new Map<string, number>();
  await insertOffers(
    manager,
    listed.map((offer) => {
      const partId = partIds.get(normalisePartKey(offer.manufacturer, offer.partNumber));
      if (partId === undefined) throw new Error(`data/${LIST}: no part ${offer.partNumber}`);
      const supplierId = supplierIds.get(offer.supplier)!;
      const key = `${partId} ${supplierId} ${offer.terms.supplierNumber}`;
      const version = (versions.get(key) ?? 0) + 1;
      versions.set(key, version);
      return { teamId, userId: buyerId, partId, supplierId, version, terms: offer.terms, ...moments(offer) };
    }),
  );
}

function moments({ opened, confirmed, closed }: ListedOffer) {
  const at = (day: string) => new Date(`${day}T09:00:00Z`);
  return {
    openedAt: at(opened),
    confirmedAt: at(confirmed),
    ...(closed !== null && { closedAt: at(closed) }),
  };
}

async function insertSuppliers(
  manager: EntityManager,
  teamId: number,
  listed: readonly ListedOffer[],
): Promise<Map<string, number>> {
  const names = [...new Set(listed.map(({ supplier }) => supplier))];
  const createdAt = new Date();
  const rows = names.map((name) => ({ teamId, name, nameKey: nameKey(name), createdAt }));
  const { identifiers } = await manager.insert(Supplier, rows);
  return new Map(names.map((name, index) => [name, identifiers[index].id as number]));
}
