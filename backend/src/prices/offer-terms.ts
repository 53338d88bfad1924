import { type OfferTerms, priceText } from '@roothertz/common/prices';
import type { Offer } from './entities/offer.entity.js';

/** Terms of which what is left out stays, or has its default. */
export type StatedTerms = Partial<OfferTerms>;

export function termsOf(offer: Offer): OfferTerms {
  const { supplierNumber, currency, minimumOrderQuantity, orderMultiple } = offer;
  const { leadTimeDays, stock, validFrom, validUntil } = offer;
  const breaks = offer.breaks
    .map(({ minimumQuantity, unitPrice }) => ({ minimumQuantity, unitPrice: priceText(unitPrice) }))
    .sort((a, b) => a.minimumQuantity - b.minimumQuantity);
  return {
    supplierNumber,
    currency,
    breaks,
    minimumOrderQuantity,
    orderMultiple,
    leadTimeDays,
    stock,
    validFrom,
    validUntil,
  };
}

/** An offer as the trail names it. */
export function objectOf({ id, part, supplier }: Offer) {
  return { kind: 'offer' as const, id, label: `${part.partNumber} from ${supplier.name}` };
}

/** The terms that a statement makes of others. */
export function withStated<Terms extends StatedTerms>(
  terms: Terms,
  stated: StatedTerms,
): Terms & StatedTerms {
  const { supplierNumber, currency, breaks, minimumOrderQuantity, orderMultiple } = stated;
  const { leadTimeDays, stock, validFrom, validUntil } = stated;
  const given = {
    supplierNumber,
    currency,
    breaks: breaks?.map(({ minimumQuantity, unitPrice }) => ({ minimumQuantity, unitPrice })),
    minimumOrderQuantity,
    orderMultiple,
    leadTimeDays,
    stock,
    validFrom,
    validUntil,
  };
  return {
    ...terms,
    ...Object.fromEntries(Object.entries(given).filter(([, value]) => value !== undefined)),
  };
}

export function sameTerms(one: OfferTerms, other: OfferTerms): boolean {
  const inOrder = (terms: OfferTerms) => Object.entries(terms).sort(([a], [b]) => (a < b ? -1 : 1));
  return JSON.stringify(inOrder(one)) === JSON.stringify(inOrder(other));
}
