import type { PartPlace } from '@roothertz/common/noise';
import type { PartNameDto } from './dto/ranking-response.dto.js';
import type { IndexedLibrary } from './library-index.service.js';
import { toPartName } from './ranking-response.js';

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
