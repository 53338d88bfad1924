import type { EntityManager } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { seedConditions } from './conditions-seed.js';
import { readDemoData } from './demo-data.js';
import { seedCuratedLibrary, seedTeamLibrary } from './library-seed.js';
import { seedPrices } from './prices-seed.js';
import { seedTeam } from './seed-team.js';

/** Fills what is empty and says in one line what it did; the demo team is for trying out, not for production. */
export async function seed(manager: EntityManager, withDemo: boolean): Promise<string> {
  const done = await seedCuratedLibrary(manager);
  if (withDemo && !(await manager.exists(Team))) {
    const demo = await readDemoData();
    const team = await seedTeam(manager, demo);
    await seedTeamLibrary(manager, team.teamId);
    await seedConditions(manager, team, demo.conditions);
    await seedPrices(manager, team, demo.prices);
    done.push(`team ${demo.team.name}`);
  }
  return done.length > 0 ? `Seeded: ${done.join(', ')}` : 'Nothing to seed';
}
