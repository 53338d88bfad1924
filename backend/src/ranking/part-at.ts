import { amplifierAt, type PartPlace } from '@roothertz/common/noise';
import type { PartNameDto } from '../shared/parts/part-name.dto.js';
import type { RankedPartDto } from './dto/ranking-response.dto.js';
import type { IndexedLibrary } from './library-index.service.js';

/** The part at a place as rankings show it. */
export function partAt(place: PartPlace, libraries: readonly IndexedLibrary[]): RankedPartDto {
  const { columns, origins } = libraries[place.library];
  return {
    ...partNameAt(place, libraries),
    amplifier: amplifierAt(columns, place.row),
    origins: origins[place.row],
  };
}

/** The name of the part at a place, from the libraries' columns. */
export function partNameAt({ library, row }: PartPlace, libraries: readonly IndexedLibrary[]): PartNameDto {
  const { library: name, ids, manufacturers, partNumbers, columns } = libraries[library];
  return toPartName({
    id: ids[row],
    library: name,
    manufacturer: manufacturers[row],
    partNumber: partNumbers[row],
    package: columns.package[row],
    lifecycle: columns.lifecycle[row],
    approval: columns.approval[row],
  });
}

export function toPartName(record: Omit<PartNameDto, 'id'> & { id: number }): PartNameDto {
  const { id, library, manufacturer, partNumber, package: packageName, lifecycle, approval } = record;
  return { id: String(id), library, manufacturer, partNumber, package: packageName, lifecycle, approval };
}
