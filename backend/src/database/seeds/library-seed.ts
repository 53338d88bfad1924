import type { OpAmpPart } from '@roothertz/common/parts';
import type { EntityManager } from 'typeorm';
import { Library } from '../../library/entities/library.entity.js';
import { insertOpAmps } from '../../library/op-amp-rows.js';
import { readOpAmpList } from './op-amp-list.js';

const CHUNK = 500;

/** The curated library, which every team reads. */
export function seedCuratedLibrary(manager: EntityManager): Promise<void> {
  return seedLibrary(manager, null, readOpAmpList('curated/op-amps.csv'));
}

/** The demo team's own list. */
export function seedTeamLibrary(manager: EntityManager, teamId: number): Promise<void> {
  return seedLibrary(manager, teamId, readOpAmpList('demo/tarnfield-op-amps.csv'));
}

async function seedLibrary(
  manager: EntityManager,
  teamId: number | null,
  opAmps: readonly OpAmpPart[],
): Promise<void> {
  const { identifiers } = await manager.insert(Library, { teamId });
  for (let start = 0; start < opAmps.length; start += CHUNK)
    await insertOpAmps(manager, identifiers[0].id, opAmps.slice(start, start + CHUNK), null);
}
