import { checkOffer, newOfferTerms, type OfferTerms } from '@roothertz/common/prices';
import type { Offer } from './entities/offer.entity.js';
import type { Fault } from './offer-faults.js';
import { type StatedTerms, termsOf, withStated } from './offer-terms.js';

/** A change of the offer `id` at its `version`, or else a new offer. */
export interface OfferRow extends StatedTerms {
  id?: string;
  version?: number;
  partId?: string;
  supplierId?: string;
}

/** What the database has of what some rows name. */
export interface Known {
  offers: ReadonlyMap<number, Offer>;
  parts: ReadonlySet<number>;
  suppliers: ReadonlySet<number>;
}

/** The terms that a row makes of an offer, or of nothing. */
export interface Draft {
  current: Offer | null;
  partId: number;
  supplierId: number;
  terms: OfferTerms;
}

export type DraftReading = { draft: Draft } | { faults: Fault[] };

export function draftOffer(row: OfferRow, known: Known, today: string): DraftReading {
  const draft = row.id === undefined ? newDraft(row, known, today) : changedDraft(row, known);
  if ('faults' in draft) return draft;
  const faults = checkOffer(draft.draft.terms, today).map(({ field, message }): Fault => ({
    code: 'offer.invalid',
    field,
    message,
  }));
  return faults.length > 0 ? { faults } : draft;
}

function changedDraft(
  { id, version, partId, supplierId, ...stated }: OfferRow,
  { offers }: Known,
): DraftReading {
  const current = offers.get(Number(id));
  if (!current) return fault('offer.not-found', 'id', 'your team has no such offer');
  if (partId !== undefined || supplierId !== undefined)
    return fault('offer.invalid', partId === undefined ? 'supplierId' : 'partId', 'this can’t be changed');
  if (current.closedAt !== null || current.version !== version)
    return fault('offer.stale', 'version', 'somebody has changed this offer meanwhile');
  const terms = withStated(termsOf(current), stated);
  return { draft: { current, partId: current.partId, supplierId: current.supplierId, terms } };
}

function newDraft(row: OfferRow, { parts, suppliers }: Known, today: string): DraftReading {
  const { partId, supplierId, currency, breaks } = row;
  const missing = Object.entries({ partId, supplierId, currency, breaks })
    .filter(([, value]) => value === undefined)
    .map(([field]): Fault => ({ code: 'offer.invalid', field, message: 'a new offer needs this' }));
  if (missing.length > 0) return { faults: missing };
  if (!parts.has(Number(partId)))
    return fault('part.not-found', 'partId', 'your libraries have no such part');
  if (!suppliers.has(Number(supplierId)))
    return fault('supplier.not-found', 'supplierId', 'your team has no such supplier');
  const terms = withStated(newOfferTerms(today), row) as OfferTerms;
  return { draft: { current: null, partId: Number(partId), supplierId: Number(supplierId), terms } };
}

function fault(code: Fault['code'], field: string, message: string): DraftReading {
  return { faults: [{ code, field, message }] };
}
