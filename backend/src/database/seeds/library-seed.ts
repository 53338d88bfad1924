import { type LibraryPart, OP_AMP_CATALOGUE, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import { type EntityManager, IsNull } from 'typeorm';
import { Library } from '../../library/entities/library.entity.js';
import { Part } from '../../library/entities/part.entity.js';
import { insertParts } from '../../library/part-rows.js';
import { OP_AMPS, type PartTable, RESISTORS } from '../../library/part-tables.js';
import { readPartList, readSeriesList } from './part-list.js';

const CHUNK = 500;

/** Fills the curated library, which every team reads, with the kinds of part that it lacks, and names them. */
export async function seedCuratedLibrary(manager: EntityManager): Promise<string[]> {
  const library = await manager.findOneBy(Library, { teamId: IsNull() });
  const libraryId = library?.id ?? (await createLibrary(manager, null));
  const opAmps = await fill(manager, OP_AMPS, libraryId, () =>
    readPartList(OP_AMP_CATALOGUE, 'curated/op-amps.csv'),
  );
  const resistors = await fill(manager, RESISTORS, libraryId, () =>
    readSeriesList('curated/resistor-series.csv'),
  );
  return [...(opAmps ? ['curated op-amps'] : []), ...(resistors ? ['curated resistors'] : [])];
}

/** The demo team's own lists. */
export async function seedTeamLibrary(manager: EntityManager, teamId: number): Promise<void> {
  const libraryId = await createLibrary(manager, teamId);
  await fill(manager, OP_AMPS, libraryId, () => readPartList(OP_AMP_CATALOGUE, 'demo/tarnfield-op-amps.csv'));
  await fill(manager, RESISTORS, libraryId, () =>
    readPartList(RESISTOR_CATALOGUE, 'demo/tarnfield-resistors.csv'),
  );
}

async function createLibrary(manager: EntityManager, teamId: number | null): Promise<number> {
  const { identifiers } = await manager.insert(Library, { teamId });
  return identifiers[0].id as number;
}

/** Whether parts were missing and are now there. */
async function fill<Kind extends LibraryPart>(
  manager: EntityManager,
  table: PartTable<Kind>,
  libraryId: number,
  read: () => Kind[],
): Promise<boolean> {
  if (await manager.existsBy(Part, { libraryId, kind: table.catalogue.kind })) return false;
  const parts = read();
  for (let start = 0; start < parts.length; start += CHUNK)
    await insertParts(manager, table, libraryId, parts.slice(start, start + CHUNK), null);
  await manager.increment(Library, { id: libraryId }, 'revision', 1);
  return true;
}
