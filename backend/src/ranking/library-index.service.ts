import type { PartFilter } from '@roothertz/common/conditions';
import { Injectable } from '@nestjs/common';
import { LibraryService, type ReadableLibrary } from '../library/library.service.js';
import type { ListedResistor } from '../library/listed-resistors.js';
import type { LibraryColumns } from '../library/op-amp-columns.js';
import type { Caller } from '../shared/access/caller.js';
import { RevisionCache } from '../library/revision-cache.js';

/** A library's op-amps as the ranking takes them, at the revision that the database has. */
export interface IndexedLibrary extends ReadableLibrary, LibraryColumns {}

/** A library's resistors as the ranking takes them, at the revision that the database has. */
export interface ResistorLibrary extends ReadableLibrary {
  resistors: ListedResistor[];
}

type LibraryChoice = Pick<PartFilter, 'library'>;

/**
 * Keeps the libraries' parts in memory. Their revisions are read from the database at each asking, so that
 * several API processes stay right.
 */
@Injectable()
export class LibraryIndex {
  private readonly opAmps: RevisionCache<LibraryColumns>;
  private readonly resistors: RevisionCache<ListedResistor[]>;

  constructor(private readonly libraries: LibraryService) {
    this.opAmps = new RevisionCache(({ id }) => libraries.loadOpAmpColumns(id));
    this.resistors = new RevisionCache((library) => libraries.loadResistors(library));
  }

  /** The op-amps of the libraries that the caller reads and the filter names; without names, of all. */
  async opAmpsReadableBy(caller: Caller, filter: LibraryChoice): Promise<IndexedLibrary[]> {
    const chosen = await this.chosenLibraries(caller, filter);
    return Promise.all(
      chosen.map(async (library) => ({ ...library, ...(await this.opAmps.contentOf(library)) })),
    );
  }

  /** The resistors of the libraries that the caller reads and the filter names; without names, of all. */
  async resistorsReadableBy(caller: Caller, filter: LibraryChoice): Promise<ResistorLibrary[]> {
    const chosen = await this.chosenLibraries(caller, filter);
    return Promise.all(
      chosen.map(async (library) => ({ ...library, resistors: await this.resistors.contentOf(library) })),
    );
  }

  private async chosenLibraries(caller: Caller, filter: LibraryChoice): Promise<ReadableLibrary[]> {
    const readable = await this.libraries.readableLibraries(caller);
    return readable.filter(({ library }) => !filter.library?.length || filter.library.includes(library));
  }
}

/** A text that changes whenever a part of one of the libraries changes. */
export function revisionOf(libraries: readonly ReadableLibrary[]): string {
  return libraries.map(({ id, revision }) => `${id}.${revision}`).join('-');
}
