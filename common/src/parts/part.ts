import type { Approval, Lifecycle, Origin } from './vocabulary.js';

/** What a library keeps of a part of any kind, whoever brought it: form, API or CSV. */
export interface PartFields {
  manufacturer: string;
  partNumber: string;
  description: string;
  package: string;
  lifecycle: Lifecycle;
  approval: Approval;
}

/** Where each known figure comes from; a parameter that isn't listed is a data sheet's typical value. */
export type Origins<Key extends string = string> = Partial<Record<Key, Origin>>;

/** A part of any kind; its parameters stand under the name of their group. */
export interface LibraryPart extends PartFields {
  origins: Origins;
}

/** The origins of the figures that are known: an unknown figure (`null`) comes from nowhere. */
export function originsOfKnown<Key extends string>(
  figures: Readonly<Record<Key, unknown>>,
  origins: Origins<Key>,
): Origins<Key> {
  const known = Object.entries(origins).filter(
    ([key, origin]) => origin !== undefined && figures[key as Key] !== null,
  );
  return Object.fromEntries(known) as Origins<Key>;
}
