import type { EntityManager } from 'typeorm';
import { Subscription } from '../plans/entities/subscription.entity.js';

/**
 * Makes sure that the team has a row to keep its trial or subscription in, so that it can be held. Not within the
 * transaction that holds it: of two that met here, both would wait for each other there.
 */
export async function ensureSubscription(manager: EntityManager, teamId: number): Promise<void> {
  await manager.createQueryBuilder().insert().into(Subscription).values({ teamId }).orIgnore().execute();
}
