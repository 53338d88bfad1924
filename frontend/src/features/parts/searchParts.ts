import Fuse, { type IFuseOptions } from 'fuse.js';
import type { StoredPart } from '../../api/parts';

const OPTIONS: IFuseOptions<StoredPart> = {
  keys: [
    { name: 'partNumber', weight: 3 },
    { name: 'manufacturer', weight: 2 },
    { name: 'description', weight: 1 },
  ],
  threshold: 0.3,
  ignoreLocation: true,
  useTokenSearch: true,
  tokenMatch: 'all',
};

/** Searches loaded parts by number, maker and description, forgiving slips, best match first. */
export function createPartsSearch(parts: readonly StoredPart[]): (text: string) => readonly StoredPart[] {
  const fuse = new Fuse(parts, OPTIONS);
  return (text) => {
    const words = text.trim();
    return words === '' ? parts : fuse.search(words).map(({ item }) => item);
  };
}

/** The parts that were found in the page, then those that only the server found. */
export function joinFound(
  inPage: readonly StoredPart[],
  onServer: readonly StoredPart[],
): readonly StoredPart[] {
  const known = new Set(inPage.map(({ id }) => id));
  return [...inPage, ...onServer.filter(({ id }) => !known.has(id))];
}
