import { checkConditions } from '@roothertz/common/conditions';
import { normalisePartKey } from '@roothertz/common/parts';
import type { EntityManager } from 'typeorm';
import { SavedConditionsPart } from '../../conditions/entities/saved-conditions-part.entity.js';
import { SavedConditions } from '../../conditions/entities/saved-conditions.entity.js';
import { nameKey } from '../../shared/text/name-key.js';
import type { DemoData } from './demo-data.js';
import { findPartIds } from './part-ids.js';
import type { SeededTeam } from './seed-team.js';

/** The demo team's named operating conditions; the first fault ends it, naming conditions and field. */
export async function seedConditions(
  manager: EntityManager,
  { teamId, engineerId }: SeededTeam,
  named: DemoData['conditions'],
): Promise<void> {
  const partIds = await findPartIds(manager, teamId);
  for (const { name, ranking, chosen } of named) {
    const [error] = checkConditions(ranking);
    if (error) throw new Error(`Conditions “${name}”, ${error.field}: ${error.message}`);
    const { identifiers } = await manager.insert(SavedConditions, {
      ...savedNow(engineerId),
      teamId,
      name,
      nameKey: nameKey(name),
      ...ranking,
    });
    const conditionsId = identifiers[0].id as number;
    for (const { manufacturer, partNumber } of chosen) {
      const partId = partIds.get(normalisePartKey(manufacturer, partNumber));
      if (partId === undefined) throw new Error(`Conditions “${name}”: no part ${partNumber}`);
      await manager.insert(SavedConditionsPart, { conditionsId, partId });
    }
  }
}

function savedNow(userId: number) {
  const now = new Date();
  return { createdAt: now, createdById: userId, updatedAt: now, updatedById: userId };
}
