import type { EntityManager } from 'typeorm';
import { findPartNames, type KeyedPartName } from '../../library/readable-parts.js';
import type { QuotedOffers, StandingOffer } from '../../prices/quoted-offers.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { nameKey } from '../../shared/text/name-key.js';
import type { OfferGroup } from './offer-groups.js';

/** What the team has already of what a list speaks of. */
export interface KnownOffers {
  /** The ids of the suppliers by the keys of their names. */
  suppliers: ReadonlyMap<string, number>;
  parts: ReadonlyMap<string, KeyedPartName[]>;
  offers: readonly StandingOffer[];
}

/** Where the offer of a group belongs: to a part, in the place of an offer that stands or beside it. */
export type OfferPlace =
  | { partId: number; existing: StandingOffer | null; isNewSupplier: boolean }
  | { field: string; why: string; expected: string };

export async function knownOffers(
  manager: EntityManager,
  caller: Caller,
  quoted: QuotedOffers,
  suppliers: ReadonlyMap<string, number>,
  groups: readonly OfferGroup[],
): Promise<KnownOffers> {
  const found = await findPartNames(manager, caller, [...new Set(groups.map(({ partKey }) => partKey))]);
  const parts = new Map<string, KeyedPartName[]>();
  for (const part of found) parts.set(part.normalisedKey, [...(parts.get(part.normalisedKey) ?? []), part]);
  const partIds = found.map(({ id }) => id);
  return { suppliers, parts, offers: await quoted.standing(manager, caller, partIds) };
}

/**
 * Finds the part by its normalised name, the team's own record before the curated one, and the supplier's offer for
 * it: under the same number, or else the one that has no number yet.
 */
export function placeOf(
  { partKey, supplierKey, numberKey }: OfferGroup,
  { suppliers, parts, offers }: KnownOffers,
): OfferPlace {
  const candidates = parts.get(partKey) ?? [];
  if (candidates.length === 0)
    return {
      field: 'partNumber',
      why: 'your libraries have no such part',
      expected: 'a part of your libraries: a librarian adds it',
    };
  const supplierId = suppliers.get(supplierKey);
  const own = offers.filter((offer) => offer.supplierId === supplierId);
  const priced = candidates.find(({ id }) => own.some(({ partId }) => partId === id));
  const partId = (priced ?? candidates[0]).id;
  const standing = own.filter((offer) => offer.partId === partId);
  const existing = standing.find(({ terms }) => nameKey(terms.supplierNumber) === numberKey) ?? null;
  const isNewSupplier = supplierId === undefined;
  if (existing !== null || standing.length === 0) return { partId, existing, isNewSupplier };
  if (numberKey !== '')
    return {
      partId,
      existing: standing.find(({ terms }) => terms.supplierNumber === '') ?? null,
      isNewSupplier,
    };
  if (standing.length === 1) return { partId, existing: standing[0], isNewSupplier };
  const why = `this supplier has ${standing.length} offers for the part: its number must say which one is meant`;
  return { field: 'supplierNumber', why, expected: 'the number of one of them' };
}
