import type { ReadableLibrary } from '../library/library.service.js';

interface Entry<Content> {
  revision: number;
  content: Promise<Content>;
}

const MOST_LIBRARIES = 50;

/** Keeps what was loaded of each library at its latest revision; the one asked for longest ago goes first. */
export class RevisionCache<Content> {
  private readonly entries = new Map<number, Entry<Content>>();

  constructor(private readonly load: (library: ReadableLibrary) => Promise<Content>) {}

  contentOf(library: ReadableLibrary): Promise<Content> {
    const { id, revision } = library;
    const known = this.entries.get(id);
    const entry = known?.revision === revision ? known : this.newEntry(library);
    this.entries.delete(id);
    this.entries.set(id, entry);
    const [oldest] = this.entries.keys();
    if (this.entries.size > MOST_LIBRARIES) this.entries.delete(oldest);
    return entry.content;
  }

  private newEntry(library: ReadableLibrary): Entry<Content> {
    const entry = { revision: library.revision, content: this.load(library) };
    entry.content.catch(() => {
      if (this.entries.get(library.id) === entry) this.entries.delete(library.id);
    });
    return entry;
  }
}
