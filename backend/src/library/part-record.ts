import type { Library, LibraryPart, ListedFields } from '@roothertz/common/parts';
import type { ParameterRow } from './part-tables.js';

/** A part of a library as other features see it. */
export type PartRecord<Kind extends LibraryPart> = Kind & {
  id: number;
  library: Library;
  version: number;
  updatedAt: Date;
};

export function toPartRecord<Kind extends LibraryPart>(
  { group }: ListedFields,
  row: ParameterRow,
): PartRecord<Kind> {
  const { part, origins } = row;
  const parameters = (row as unknown as Record<string, object>)[group];
  const record = {
    id: part.id,
    library: part.library.teamId === null ? 'curated' : 'team',
    manufacturer: part.manufacturer,
    partNumber: part.partNumber,
    description: part.description,
    package: part.package,
    lifecycle: part.lifecycle,
    approval: part.approval,
    [group]: { ...parameters },
    origins,
    version: part.version,
    updatedAt: part.updatedAt,
  };
  return record as unknown as PartRecord<Kind>;
}
