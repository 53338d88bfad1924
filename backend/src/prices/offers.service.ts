import { Injectable } from '@nestjs/common';
import { dayOf } from '@roothertz/common/prices';
import type { EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { readId } from '../shared/ids/read-id.js';
import type { OfferListDto, OfferResponseDto } from './dto/offer-response.dto.js';
import type { CreateOfferDto, UpdateOfferDto } from './dto/save-offers.dto.js';
import type { Offer } from './entities/offer.entity.js';
import type { OfferRow } from './offer-drafts.js';
import { type Fault, refuseFaults } from './offer-faults.js';
import { noteConfirmation, restoreConfirmation } from './offer-confirmations.js';
import { toOfferResponse } from './offer-response.js';
import { closeOffers } from './offer-rows.js';
import { OfferSaver } from './offer-saver.service.js';
import { findOffers } from './offer-select.js';
import { objectOf, termsOf } from './offer-terms.js';
import { PriceChanges } from './price-changes.service.js';
import { PriceSettingsService } from './price-settings.service.js';

@Injectable()
export class OffersService {
  constructor(
    private readonly changes: PriceChanges,
    private readonly settings: PriceSettingsService,
    private readonly saver: OfferSaver,
    private readonly audit: AuditService,
  ) {}

  async create(caller: Caller, dto: CreateOfferDto): Promise<OfferResponseDto> {
    const { items } = await this.save(caller, [dto], () => '');
    return items[0];
  }

  async update(caller: Caller, id: string, dto: UpdateOfferDto): Promise<OfferResponseDto> {
    const { items } = await this.save(caller, [{ ...dto, id }], () => '');
    return items[0];
  }

  /** Saves the rows of the grid, all or none. */
  saveRows(caller: Caller, rows: readonly OfferRow[]): Promise<OfferListDto> {
    return this.save(caller, rows, (row) => `rows[${row}].`);
  }

  close(caller: Caller, id: string, version: number): Promise<void> {
    return this.changes.run(caller, async (manager) => {
      const [offer] = await findOpen(manager, caller, [id], () => 'id');
      if (offer.version !== version)
        refuseFaults([{ code: 'offer.stale', field: 'version', message: CHANGED }]);
      await closeOffers(manager, [offer.id], caller.userId, new Date());
      const from = termsOf(offer);
      await this.audit.record(manager, caller, [
        { action: 'offer.closed', object: objectOf(offer), from, to: null },
      ]);
    });
  }

  /** Notes that offers still hold as they stand. */
  confirm(caller: Caller, ids: readonly string[]): Promise<OfferListDto> {
    return this.changes.run(caller, async (manager) => {
      const offers = await findOpen(manager, caller, [...new Set(ids)], (index) => `ids[${index}]`);
      refuseFaults(expired(offers));
      const confirmedAt = new Date();
      const numbers = offers.map(({ id }) => id);
      await noteConfirmation(manager, numbers, { confirmedAt, confirmedById: caller.userId });
      await this.audit.record(
        manager,
        caller,
        offers.map((offer) => ({
          action: 'offer.confirmed',
          object: objectOf(offer),
          from: { confirmedAt: offer.confirmedAt },
          to: { confirmedAt },
        })),
      );
      return this.answer(manager, caller, numbers);
    });
  }

  /** Takes back the caller's own last confirmations: the ones before them hold again. */
  takeBack(caller: Caller, ids: readonly string[]): Promise<OfferListDto> {
    return this.changes.run(caller, async (manager) => {
      const offers = await findOpen(manager, caller, [...new Set(ids)], (index) => `ids[${index}]`);
      refuseFaults(confirmedOtherwise(offers, caller));
      const numbers = offers.map(({ id }) => id);
      await restoreConfirmation(manager, numbers);
      await this.audit.record(
        manager,
        caller,
        offers.map((offer) => ({
          action: 'offer.confirmation-undone',
          object: objectOf(offer),
          from: { confirmedAt: offer.confirmedAt },
          to: { confirmedAt: offer.earlierConfirmedAt },
        })),
      );
      return this.answer(manager, caller, numbers);
    });
  }

  private save(
    caller: Caller,
    rows: readonly OfferRow[],
    pathOf: (row: number) => string,
  ): Promise<OfferListDto> {
    return this.changes.run(caller, async (manager) => {
      const offers = await this.saver.save(manager, caller, rows, pathOf);
      return this.toList(manager, caller, offers);
    });
  }

  private async answer(
    manager: EntityManager,
    caller: Caller,
    ids: readonly number[],
  ): Promise<OfferListDto> {
    const offers = await findOffers(manager, caller, ids);
    return this.toList(
      manager,
      caller,
      ids.map((id) => offers.get(id)!),
    );
  }

  private async toList(
    manager: EntityManager,
    caller: Caller,
    offers: readonly Offer[],
  ): Promise<OfferListDto> {
    const view = await this.settings.view(caller, manager);
    return { items: offers.map((offer) => toOfferResponse(offer, view)), total: offers.length };
  }
}

const CHANGED = 'somebody has changed this offer meanwhile';

/** The open offers of the ids, in their order; one that is missing or closed is refused. */
async function findOpen(
  manager: EntityManager,
  caller: Caller,
  ids: readonly string[],
  pathOf: (index: number) => string,
): Promise<Offer[]> {
  const found = await findOffers(
    manager,
    caller,
    ids.map((id) => readId(id) ?? 0),
  );
  const offers = ids.map((id) => found.get(Number(id)));
  refuseFaults(
    offers.flatMap((offer, index): Fault[] => {
      const field = pathOf(index);
      if (!offer) return [{ code: 'offer.not-found', field, message: 'your team has no such offer' }];
      return offer.closedAt === null ? [] : [{ code: 'offer.stale', field, message: CHANGED }];
    }),
  );
  return offers as Offer[];
}

function expired(offers: readonly Offer[]): Fault[] {
  const today = dayOf(new Date());
  return offers.flatMap(({ validUntil }, index): Fault[] => {
    if (validUntil === null || validUntil >= today) return [];
    const message = `it ended on ${validUntil}: give it another end first`;
    return [{ code: 'offer.invalid', field: `ids[${index}]`, message }];
  });
}

/** What was confirmed by somebody else since, or whose confirmation has been taken back already. */
function confirmedOtherwise(offers: readonly Offer[], { userId }: Caller): Fault[] {
  return offers.flatMap(({ earlierConfirmedAt, confirmedById }, index): Fault[] =>
    earlierConfirmedAt !== null && confirmedById === userId
      ? []
      : [
          {
            code: 'offer.stale',
            field: `ids[${index}]`,
            message: 'its last confirmation isn’t one of yours',
          },
        ],
  );
}
