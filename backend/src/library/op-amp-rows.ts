import { normalisePartKey, type OpAmpPart } from '@roothertz/common/parts';
import type { EntityManager } from 'typeorm';
import { OpAmp } from './entities/op-amp.entity.js';
import { Part } from './entities/part.entity.js';
import type { OpAmpRecord } from './op-amp-record.js';

/** Writes new op-amps into a library and gives their ids. */
export async function insertOpAmps(
  manager: EntityManager,
  libraryId: number,
  opAmps: readonly OpAmpPart[],
  updatedBy: number | null,
): Promise<number[]> {
  const now = new Date();
  const parts = opAmps.map((opAmp) => ({
    libraryId,
    kind: 'op-amp' as const,
    ...partColumns(opAmp),
    createdAt: now,
    updatedAt: now,
    updatedBy,
  }));
  const { identifiers } = await manager.insert(Part, parts);
  const ids = identifiers.map(({ id }) => id as number);
  await manager.insert(
    OpAmp,
    opAmps.map(({ amplifier, origins }, index) => ({ partId: ids[index], amplifier, origins })),
  );
  return ids;
}

/** Writes the changed figures of an op-amp over the current ones, as its next version. */
export async function updateOpAmp(
  manager: EntityManager,
  { id, version }: OpAmpRecord,
  changed: OpAmpPart,
  updatedBy: number,
): Promise<void> {
  const { amplifier, origins } = changed;
  await manager.update(
    Part,
    { id },
    { ...partColumns(changed), version: version + 1, updatedAt: new Date(), updatedBy },
  );
  await manager.update(OpAmp, { partId: id }, { amplifier, origins });
}

function partColumns(opAmp: OpAmpPart) {
  const { manufacturer, partNumber, description, package: packageName, lifecycle, approval } = opAmp;
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
