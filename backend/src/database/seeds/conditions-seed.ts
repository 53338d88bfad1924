import { checkConditions } from '@roothertz/common/conditions';
import type { EntityManager } from 'typeorm';
import { SavedConditions } from '../../conditions/entities/saved-conditions.entity.js';
import { nameKey } from '../../shared/text/name-key.js';
import type { DemoData } from './demo-data.js';
import type { SeededTeam } from './seed-team.js';

/** The demo team's named operating conditions; the first fault ends it, naming conditions and field. */
export async function seedConditions(
  manager: EntityManager,
  { teamId, userId }: SeededTeam,
  named: DemoData['conditions'],
): Promise<void> {
  for (const { name, ranking } of named) {
    const [error] = checkConditions(ranking);
    if (error) throw new Error(`Conditions “${name}”, ${error.field}: ${error.message}`);
    await manager.insert(SavedConditions, {
      ...savedNow(userId),
      teamId,
      name,
      nameKey: nameKey(name),
      ...ranking,
    });
  }
}

function savedNow(userId: number) {
  const now = new Date();
  return { createdAt: now, createdById: userId, updatedAt: now, updatedById: userId };
}
