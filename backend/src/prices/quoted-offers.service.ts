import { Injectable } from '@nestjs/common';
import type { OfferTerms } from '@roothertz/common/prices';
import { type EntityManager, In, IsNull } from 'typeorm';
import { AuditService, type Recorded } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { nameKey } from '../shared/text/name-key.js';
import { Offer } from './entities/offer.entity.js';
import type { OfferRow } from './offer-drafts.js';
import { offerKey } from './offer-key.js';
import { closeOffers, insertOffers, type NewOffer } from './offer-rows.js';
import { OfferSaver } from './offer-saver.service.js';
import { findOffers, selectOffers } from './offer-select.js';
import { objectOf, termsOf } from './offer-terms.js';
import { PriceChanges } from './price-changes.service.js';
import { SuppliersService } from './suppliers.service.js';

/** An offer that stands. */
export interface StandingOffer {
  id: number;
  version: number;
  partId: number;
  supplierId: number;
  terms: OfferTerms;
}

/** An offer as a supplier's list states it: a change of one that stands, or a new one of a supplier by its name. */
export interface QuotedOffer extends Omit<OfferRow, 'supplierId'> {
  /** Left out in a change. */
  supplier?: string;
}

/** An offer that a list has written, and the one that it took the place of. */
export interface WrittenOffer {
  id: number;
  before: number | null;
}

/** Lets lists of suppliers change a team's offers, and takes their changes back. */
@Injectable()
export class QuotedOffers {
  constructor(
    private readonly changes: PriceChanges,
    private readonly saver: OfferSaver,
    private readonly suppliers: SuppliersService,
    private readonly audit: AuditService,
  ) {}

  /** The ids of a team's suppliers by the keys of their names. */
  async supplierIds(manager: EntityManager, caller: Caller): Promise<Map<string, number>> {
    const found = await this.suppliers.byNameKey(manager, caller);
    return new Map([...found].map(([key, { id }]) => [key, id]));
  }

  /** The offers that stand for parts, of all suppliers. */
  async standing(
    manager: EntityManager,
    caller: Caller,
    partIds: readonly number[],
  ): Promise<StandingOffer[]> {
    if (partIds.length === 0) return [];
    const found = await selectOffers(manager, caller)
      .andWhere('offer.closedAt IS NULL AND offer.partId IN (:...partIds)', { partIds })
      .getMany();
    return found.map((offer) => ({
      id: offer.id,
      version: offer.version,
      partId: offer.partId,
      supplierId: offer.supplierId,
      terms: termsOf(offer),
    }));
  }

  /** Changes a team's prices in one transaction of a connection, all under one revision. */
  change(
    caller: Caller,
    within: EntityManager,
    change: (manager: EntityManager) => Promise<void>,
  ): Promise<void> {
    return this.changes.run(caller, change, within);
  }

  /**
   * Saves offers; suppliers that the team doesn't know yet are added.
   *
   * @param manager of a {@link change}
   * @param pathOf what stands before the field's name in the faults of an offer
   * @returns the ids of the offers as they stand now, in the order of the offers
   */
  async save(
    manager: EntityManager,
    caller: Caller,
    offers: readonly QuotedOffer[],
    pathOf: (offer: number) => string,
  ): Promise<number[]> {
    const known = await this.supplierIds(manager, caller);
    const rows: OfferRow[] = [];
    for (const { supplier, ...row } of offers) {
      if (supplier === undefined) rows.push(row);
      else rows.push({ ...row, supplierId: String(await this.supplierId(manager, caller, known, supplier)) });
    }
    const saved = await this.saver.save(manager, caller, rows, pathOf);
    return saved.map(({ id }) => id);
  }

  /**
   * Brings back what stood before offers were written: it is opened anew, so that the history tells what happened.
   *
   * @param manager of a {@link change}
   * @returns the ids of those that stay, for they were changed or confirmed since
   */
  async takeBack(
    manager: EntityManager,
    caller: Caller,
    written: readonly WrittenOffer[],
  ): Promise<Set<number>> {
    const ids = written.flatMap(({ id, before }) => (before === null ? [id] : [id, before]));
    const offers = await findOffers(manager, caller, ids);
    const others = await otherKeys(manager, caller, [...offers.values()], written);
    const taken = written.filter(({ id, before }) => {
      const previous = before === null ? undefined : offers.get(before);
      return isUntouched(offers.get(id)) && !(previous && others.has(offerKey(previous)));
    });
    const now = new Date();
    const takenIds = taken.map(({ id }) => id);
    await closeOffers(manager, takenIds, caller.userId, now);
    const restored = taken.flatMap(({ id, before }) => {
      const [offer, previous] = [offers.get(id)!, offers.get(before ?? 0)];
      return previous ? [{ offer, previous }] : [];
    });
    const opened = await insertOffers(
      manager,
      restored.map((one) => toReopened(caller, one, now)),
    );
    const reopened = new Map(restored.map(({ offer }, index) => [offer.id, opened[index]]));
    await this.audit.record(
      manager,
      caller,
      taken.map(({ id, before }) => toRecorded(offers.get(id)!, offers.get(before ?? 0), reopened.get(id))),
    );
    const gone = new Set(takenIds);
    return new Set(written.map(({ id }) => id).filter((id) => !gone.has(id)));
  }

  private async supplierId(
    manager: EntityManager,
    caller: Caller,
    known: Map<string, number>,
    name: string,
  ): Promise<number> {
    const id = known.get(nameKey(name)) ?? (await this.suppliers.add(manager, caller, name)).id;
    known.set(nameKey(name), id);
    return id;
  }
}

/** Nobody has changed, closed or confirmed the offer since it was opened. */
function isUntouched(offer: Offer | undefined): boolean {
  if (offer === undefined || offer.closedAt !== null) return false;
  return offer.confirmedAt.getTime() === offer.openedAt.getTime();
}

/** The keys of offers for the same parts that stand beside the written ones. */
async function otherKeys(
  manager: EntityManager,
  { teamId }: Caller,
  offers: readonly Offer[],
  written: readonly WrittenOffer[],
): Promise<Set<string>> {
  const partId = In(offers.map((offer) => offer.partId));
  const own = new Set(written.map(({ id }) => id));
  const standing = await manager.findBy(Offer, { teamId, partId, closedAt: IsNull() });
  return new Set(standing.filter(({ id }) => !own.has(id)).map(offerKey));
}

/** The offer that stood before, opened anew in place of the one that was written. */
function toReopened(
  { teamId, userId }: Caller,
  { offer, previous }: { offer: Offer; previous: Offer },
  openedAt: Date,
): NewOffer {
  const { partId, supplierId, confirmedAt, confirmedById } = previous;
  const version = offer.version + 1;
  const terms = termsOf(previous);
  return { teamId, userId, partId, supplierId, terms, version, confirmedAt, confirmedById, openedAt };
}

function toRecorded(offer: Offer, previous: Offer | undefined, reopened: number | undefined): Recorded {
  const from = { id: String(offer.id), ...termsOf(offer) };
  if (previous === undefined || reopened === undefined)
    return { action: 'offer.closed', object: objectOf(offer), from, to: null };
  return {
    action: 'offer.changed',
    object: { ...objectOf(offer), id: reopened },
    from,
    to: termsOf(previous),
  };
}
