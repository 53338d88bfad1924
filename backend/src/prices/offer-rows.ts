import type { OfferTerms } from '@roothertz/common/prices';
import type { EntityManager } from 'typeorm';
import { Offer } from './entities/offer.entity.js';
import { OfferBreak } from './entities/offer-break.entity.js';

/** An offer to be opened. */
export interface NewOffer {
  teamId: number;
  partId: number;
  supplierId: number;
  terms: OfferTerms;
  version: number;
  /** when the terms were last seen to hold */
  confirmedAt: Date;
  openedAt: Date;
  closedAt?: Date;
  userId: number;
  /** who saw that; left out = whose change it is */
  confirmedById?: number | null;
}

/** Writes new offers with their breaks and gives their ids. */
export async function insertOffers(manager: EntityManager, offers: readonly NewOffer[]): Promise<number[]> {
  if (offers.length === 0) return [];
  const { identifiers } = await manager.insert(Offer, offers.map(toRow));
  const ids = identifiers.map(({ id }) => id as number);
  const breaks = offers.flatMap(({ terms }, index) =>
    terms.breaks.map((price) => ({ offerId: ids[index], ...price })),
  );
  await manager.insert(OfferBreak, breaks);
  return ids;
}

function toRow({ terms, userId, closedAt, confirmedById = userId, ...offer }: NewOffer) {
  return {
    ...offer,
    ...terms,
    breaks: undefined,
    confirmedById,
    openedById: userId,
    closedAt: closedAt ?? null,
    closedById: closedAt === undefined ? null : userId,
  };
}

/** Closes offers: their terms stay as they stood. */
export async function closeOffers(
  manager: EntityManager,
  ids: readonly number[],
  closedById: number,
  closedAt: Date,
): Promise<void> {
  if (ids.length > 0) await manager.update(Offer, [...ids], { closedAt, closedById });
}
