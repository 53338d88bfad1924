import type { PartFilter } from '@roothertz/common/conditions';
import { Injectable } from '@nestjs/common';
import type { LibraryColumns } from '../library/op-amp-columns.js';
import { LibraryService, type ReadableLibrary } from '../library/library.service.js';
import type { Caller } from '../shared/access/caller.js';

/** A library as the ranking takes it, at the revision that the database has. */
export interface IndexedLibrary extends ReadableLibrary, LibraryColumns {}

interface Entry {
  revision: number;
  columns: Promise<LibraryColumns>;
}

const MOST_LIBRARIES = 50;

/**
 * Keeps the libraries' columns in memory, each at its latest revision. The revision is read from the database
 * at each asking, so that several API processes stay right; the library that was asked for longest ago goes first.
 */
@Injectable()
export class LibraryIndex {
  private readonly entries = new Map<number, Entry>();

  constructor(private readonly libraries: LibraryService) {}

  /** The libraries that the caller reads and the filter names; a filter without names means all. */
  async readableBy(caller: Caller, filter: Pick<PartFilter, 'library'>): Promise<IndexedLibrary[]> {
    const readable = await this.libraries.readableLibraries(caller);
    const chosen = readable.filter(
      ({ library }) => !filter.library?.length || filter.library.includes(library),
    );
    return Promise.all(chosen.map(async (library) => ({ ...library, ...(await this.columnsOf(library)) })));
  }

  private columnsOf({ id, revision }: ReadableLibrary): Promise<LibraryColumns> {
    const known = this.entries.get(id);
    const entry = known?.revision === revision ? known : this.load(id, revision);
    this.entries.delete(id);
    this.entries.set(id, entry);
    const [oldest] = this.entries.keys();
    if (this.entries.size > MOST_LIBRARIES) this.entries.delete(oldest);
    return entry.columns;
  }

  private load(id: number, revision: number): Entry {
    const entry = { revision, columns: this.libraries.loadOpAmpColumns(id) };
    entry.columns.catch(() => {
      if (this.entries.get(id) === entry) this.entries.delete(id);
    });
    return entry;
  }
}

/** A text that changes whenever a part of one of the libraries changes. */
export function revisionOf(libraries: readonly ReadableLibrary[]): string {
  return libraries.map(({ id, revision }) => `${id}.${revision}`).join('-');
}
