import { type EntityManager, In } from 'typeorm';
import { Offer } from './entities/offer.entity.js';

/** Keeps a confirmation and the one before it; the database sets the columns in the order given here. */
export async function noteConfirmation(
  manager: EntityManager,
  ids: readonly number[],
  confirmation: Pick<Offer, 'confirmedAt' | 'confirmedById'>,
): Promise<void> {
  const earlier = { earlierConfirmedAt: () => 'confirmed_at', earlierConfirmedById: () => 'confirmed_by' };
  await manager.update(Offer, { id: In(ids) }, { ...earlier, ...confirmation });
}

/** Puts the confirmation before in the place of the last one. */
export async function restoreConfirmation(manager: EntityManager, ids: readonly number[]): Promise<void> {
  const restored = { confirmedAt: () => 'earlier_confirmed_at', confirmedById: () => 'earlier_confirmed_by' };
  await manager.update(
    Offer,
    { id: In(ids) },
    { ...restored, earlierConfirmedAt: null, earlierConfirmedById: null },
  );
}
