import type { Library } from '@roothertz/common/parts';

interface NamedPart {
  id: string;
  library: Library;
  manufacturer: string;
  partNumber: string;
}

export const LIBRARY_WORDS: Record<Library, string> = { curated: 'curated', team: 'own' };

/** Part numbers that two of the parts have, one in each library: these need their library beside them. */
export function sharedNumbers(parts: readonly NamedPart[]): ReadonlySet<string> {
  const idOf = new Map<string, string>();
  const shared = new Set<string>();
  for (const { id, partNumber } of parts) {
    if ((idOf.get(partNumber) ?? id) !== id) shared.add(partNumber);
    idOf.set(partNumber, id);
  }
  return shared;
}

/** The word for the part's library where the number alone doesn't tell which part it is; null elsewhere. */
export function libraryOf({ partNumber, library }: NamedPart, shared: ReadonlySet<string>): string | null {
  return shared.has(partNumber) ? LIBRARY_WORDS[library] : null;
}

/** The part number, with the library where it alone doesn't tell which part it is. */
export function numberOf({ partNumber, library }: NamedPart, shared: ReadonlySet<string>): string {
  return shared.has(partNumber) ? `${partNumber} (${LIBRARY_WORDS[library]})` : partNumber;
}
