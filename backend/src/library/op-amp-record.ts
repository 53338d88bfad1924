import type { Library, OpAmpPart } from '@roothertz/common/parts';
import type { OpAmp } from './entities/op-amp.entity.js';

/** An op-amp of a library as other features see it. */
export interface OpAmpRecord extends OpAmpPart {
  id: number;
  library: Library;
  version: number;
  updatedAt: Date;
}

export function toOpAmpRecord({ part, amplifier, origins }: OpAmp): OpAmpRecord {
  return {
    id: part.id,
    library: part.library.teamId === null ? 'curated' : 'team',
    manufacturer: part.manufacturer,
    partNumber: part.partNumber,
    description: part.description,
    package: part.package,
    lifecycle: part.lifecycle,
    approval: part.approval,
    amplifier: { ...amplifier },
    origins,
    version: part.version,
    updatedAt: part.updatedAt,
  };
}
