import { dayOf } from '@roothertz/common/prices';
import { Injectable } from '@nestjs/common';
import { type EntityManager, In, IsNull } from 'typeorm';
import { AuditService, type Recorded } from '../audit/audit.service.js';
import { findReadableIds } from '../library/readable-parts.js';
import type { Caller } from '../shared/access/caller.js';
import { readId } from '../shared/ids/read-id.js';
import { Offer } from './entities/offer.entity.js';
import { Supplier } from './entities/supplier.entity.js';
import { type Draft, draftOffer, type Known, type OfferRow } from './offer-drafts.js';
import { type Fault, refuseFaults } from './offer-faults.js';
import { offerKey } from './offer-key.js';
import { closeOffers, insertOffers } from './offer-rows.js';
import { findOffers } from './offer-select.js';
import { objectOf, sameTerms, termsOf } from './offer-terms.js';

const TAKEN = 'supplier’s number: this supplier has an offer for this part under it already';

/** Saves offers all or none: changed terms close the offer that stands and open the next. */
@Injectable()
export class OfferSaver {
  constructor(private readonly audit: AuditService) {}

  /**
   * @param manager of a transaction that holds the team's prices
   * @param pathOf what stands before the field's name in the faults of a row
   * @returns the offers as they stand now, in the order of the rows
   */
  async save(
    manager: EntityManager,
    caller: Caller,
    rows: readonly OfferRow[],
    pathOf: (row: number) => string,
  ): Promise<Offer[]> {
    const known = await findKnown(manager, caller, rows);
    const drafts: Draft[] = [];
    const faults = rows.flatMap((row, index) => {
      const reading = draftOffer(row, known, dayOf(new Date()));
      if ('draft' in reading) drafts.push(reading.draft);
      return 'faults' in reading ? atPath(reading.faults, pathOf(index)) : [];
    });
    refuseFaults(faults);
    refuseFaults(await findDuplicates(manager, caller, drafts, pathOf));
    const changed = drafts.filter(({ current, terms }) => !current || !sameTerms(termsOf(current), terms));
    const opened = await this.write(manager, caller, changed);
    const ids = drafts.map((draft) => opened[changed.indexOf(draft)] ?? draft.current!.id);
    const saved = await findOffers(manager, caller, ids);
    await this.audit.record(
      manager,
      caller,
      changed.map((draft, index) => toRecorded(draft, saved.get(opened[index])!)),
    );
    return ids.map((id) => saved.get(id)!);
  }

  private async write(
    manager: EntityManager,
    { teamId, userId }: Caller,
    changed: readonly Draft[],
  ): Promise<number[]> {
    const now = new Date();
    const closed = changed.flatMap(({ current }) => current?.id ?? []);
    await closeOffers(manager, closed, userId, now);
    return insertOffers(
      manager,
      changed.map(({ current, partId, supplierId, terms }) => {
        const version = (current?.version ?? 0) + 1;
        return { teamId, userId, partId, supplierId, terms, version, confirmedAt: now, openedAt: now };
      }),
    );
  }
}

function toRecorded({ current, partId, supplierId, terms }: Draft, offer: Offer): Recorded {
  return {
    action: current ? 'offer.changed' : 'offer.opened',
    object: objectOf(offer),
    from: current && { id: String(current.id), ...termsOf(current) },
    to: { partId: String(partId), supplierId: String(supplierId), ...terms },
  };
}

async function findKnown(manager: EntityManager, caller: Caller, rows: readonly OfferRow[]): Promise<Known> {
  const numbers = (key: 'id' | 'partId' | 'supplierId') => [
    ...new Set(rows.flatMap((row) => (row[key] === undefined ? [] : [readId(row[key]) ?? 0]))),
  ];
  const suppliers = await manager.findBy(Supplier, { teamId: caller.teamId, id: In(numbers('supplierId')) });
  return {
    offers: await findOffers(manager, caller, numbers('id')),
    parts: await findReadableIds(manager, caller, numbers('partId')),
    suppliers: new Set(suppliers.map(({ id }) => id)),
  };
}

/** A part has one offer of a supplier under a supplier's number, and a change names an offer once. */
async function findDuplicates(
  manager: EntityManager,
  { teamId }: Caller,
  drafts: readonly Draft[],
  pathOf: (row: number) => string,
): Promise<Fault[]> {
  const partId = In(drafts.map((draft) => draft.partId));
  const open = await manager.findBy(Offer, { teamId, partId, closedAt: IsNull() });
  const changed = new Set(drafts.map(({ current }) => current?.id));
  const taken = new Set(open.filter(({ id }) => !changed.has(id)).map(offerKey));
  return drafts.flatMap(({ current, terms, ...draft }, index): Fault[] => {
    const code = 'offer.duplicate';
    if (current && !changed.delete(current.id))
      return [{ code, field: `${pathOf(index)}id`, message: 'another row changes this offer already' }];
    const key = offerKey({ ...draft, supplierNumber: terms.supplierNumber });
    if (taken.has(key)) return [{ code, field: `${pathOf(index)}supplierNumber`, message: TAKEN }];
    taken.add(key);
    return [];
  });
}

function atPath(faults: readonly Fault[], path: string): Fault[] {
  return faults.map((fault) => ({ ...fault, field: `${path}${fault.field}` }));
}
