import type { ReadableLibrary } from './library.service.js';

/** What changes its revision with each change of its content. */
interface Revised {
  id: number;
  revision: number | string;
}

interface Entry<Content> {
  revision: number | string;
  content: Promise<Content>;
}

const MOST_ENTRIES = 50;

/** Keeps what was loaded of each library or team at its latest revision; the one asked for longest ago goes first. */
export class RevisionCache<Content, Source extends Revised = ReadableLibrary> {
  private readonly entries = new Map<number, Entry<Content>>();

  constructor(private readonly load: (source: Source) => Promise<Content>) {}

  contentOf(source: Source): Promise<Content> {
    const { id, revision } = source;
    const known = this.entries.get(id);
    const entry = known?.revision === revision ? known : this.newEntry(source);
    this.entries.delete(id);
    this.entries.set(id, entry);
    const [oldest] = this.entries.keys();
    if (this.entries.size > MOST_ENTRIES) this.entries.delete(oldest);
    return entry.content;
  }

  private newEntry(source: Source): Entry<Content> {
    const entry = { revision: source.revision, content: this.load(source) };
    entry.content.catch(() => {
      if (this.entries.get(source.id) === entry) this.entries.delete(source.id);
    });
    return entry;
  }
}
