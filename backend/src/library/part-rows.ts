import { type LibraryPart, normalisePartKey, type PartFields } from '@roothertz/common/parts';
import type { EntityManager } from 'typeorm';
import { Part } from './entities/part.entity.js';
import type { PartRecord } from './part-record.js';
import type { PartTable } from './part-tables.js';

/** Writes new parts of a kind into a library and gives their ids. */
export async function insertParts<Kind extends LibraryPart>(
  manager: EntityManager,
  { catalogue, entity }: PartTable<Kind>,
  libraryId: number,
  parts: readonly Kind[],
  updatedBy: number | null,
): Promise<number[]> {
  const now = new Date();
  const rows = parts.map((part) => ({
    libraryId,
    kind: catalogue.kind,
    ...partColumns(part),
    createdAt: now,
    updatedAt: now,
    updatedBy,
  }));
  const { identifiers } = await manager.insert(Part, rows);
  const ids = identifiers.map(({ id }) => id as number);
  await manager.insert(
    entity,
    parts.map((part, index) => ({ partId: ids[index], ...parameterColumns(catalogue.group, part) })),
  );
  return ids;
}

/** Writes the changed figures of a part over the current ones, as its next version. */
export async function updatePart<Kind extends LibraryPart>(
  manager: EntityManager,
  { catalogue, entity }: PartTable<Kind>,
  { id, version }: PartRecord<Kind>,
  changed: Kind,
  updatedBy: number,
): Promise<void> {
  await manager.update(
    Part,
    { id },
    { ...partColumns(changed), version: version + 1, updatedAt: new Date(), updatedBy },
  );
  await manager.update(entity, { partId: id }, parameterColumns(catalogue.group, changed));
}

function parameterColumns<Kind extends LibraryPart>(group: string, part: Kind) {
  return { [group]: part[group as keyof Kind], origins: part.origins };
}

function partColumns(part: PartFields) {
  const { manufacturer, partNumber, description, package: packageName, lifecycle, approval } = part;
  const normalisedKey = normalisePartKey(manufacturer, partNumber);
  return {
    manufacturer,
    partNumber,
    normalisedKey,
    description,
    package: packageName,
    lifecycle,
    approval,
  };
}
