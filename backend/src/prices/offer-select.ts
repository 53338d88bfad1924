import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { Offer } from './entities/offer.entity.js';

export type OfferSelect = SelectQueryBuilder<Offer>;

/** The offers of a caller's team, open and closed, with all that is told of them: every query starts from here. */
export function selectOffers(manager: EntityManager, { teamId }: Caller): OfferSelect {
  return manager
    .createQueryBuilder(Offer, 'offer')
    .innerJoinAndSelect('offer.part', 'part')
    .innerJoinAndSelect('part.library', 'library')
    .innerJoinAndSelect('offer.supplier', 'supplier')
    .leftJoinAndSelect('offer.breaks', 'price')
    .leftJoin('offer.confirmedBy', 'confirmedBy')
    .addSelect(['confirmedBy.id', 'confirmedBy.name'])
    .leftJoin('offer.openedBy', 'openedBy')
    .addSelect(['openedBy.id', 'openedBy.name'])
    .leftJoin('offer.closedBy', 'closedBy')
    .addSelect(['closedBy.id', 'closedBy.name'])
    .where('offer.teamId = :teamId', { teamId });
}

/** The team's offers among the given ids, by id. */
export async function findOffers(
  manager: EntityManager,
  caller: Caller,
  ids: readonly number[],
): Promise<Map<number, Offer>> {
  if (ids.length === 0) return new Map();
  const found = await selectOffers(manager, caller).andWhere('offer.id IN (:...ids)', { ids }).getMany();
  return new Map(found.map((offer) => [offer.id, offer]));
}
