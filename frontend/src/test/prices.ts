import type { Offer, PriceListRow } from '../api/prices';

/** An offer of Brook & Weir at 4.20 EUR from one and 3.10 EUR from a hundred pieces on. */
export function offerOf(changes: Partial<Offer> = {}): Offer {
  return {
    id: '11',
    part: { id: '41', library: 'team', kind: 'op-amp', manufacturer: 'Vireo', partNumber: 'VR-1108' },
    supplier: { id: '3', name: 'Brook & Weir' },
    supplierNumber: 'BW-1',
    currency: 'EUR',
    breaks: [
      { minimumQuantity: 1, unitPrice: '4.2000' },
      { minimumQuantity: 100, unitPrice: '3.1000' },
    ],
    minimumOrderQuantity: 10,
    orderMultiple: 5,
    leadTimeDays: 42,
    stock: null,
    validFrom: '2026-01-01',
    validUntil: null,
    confirmedAt: '2026-03-05T10:00:00.000Z',
    confirmedBy: { id: '7', name: 'Ada Merrow' },
    openedAt: '2026-01-05T10:00:00.000Z',
    openedBy: { id: '7', name: 'Ada Merrow' },
    closedAt: null,
    closedBy: null,
    states: ['stale'],
    version: 2,
    ...changes,
  };
}

export function priceRow(changes: Partial<Offer> = {}, usedIn: string[] = []): PriceListRow {
  const offer = offerOf(changes);
  return { part: offer.part, offer, usedIn };
}

/** A second part's offer, and a part without one. */
const OTHER_PART = { ...offerOf().part, id: '42', partNumber: 'LQ-12' };

export function otherRow(): PriceListRow {
  return priceRow({ id: '12', part: OTHER_PART, supplierNumber: 'BW-2', version: 1, states: [] });
}

export function rowWithout(): PriceListRow {
  return { part: { ...OTHER_PART, id: '43', partNumber: 'SB-7' }, offer: null, usedIn: [] };
}
