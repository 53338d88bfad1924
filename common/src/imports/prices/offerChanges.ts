import { type OfferTerms, PRICE_DECIMALS, toScaled } from '../../prices/index.js';
import type { Doubt, FieldChange, PartValue } from '../rowVerdict.js';

/** A price that is so many times what it was has slipped by a digit. */
const SLIP = 8n;

/** What differs between an offer and what a list makes of it, first the prices by the quantity such as `breaks.100`. */
export function offerChanges(current: OfferTerms | null, next: OfferTerms): FieldChange[] {
  const before = current === null ? new Map<string, PartValue>() : valuesOf(current);
  const after = valuesOf(next);
  const quantities = [...(current?.breaks ?? []), ...next.breaks].map(
    ({ minimumQuantity }) => minimumQuantity,
  );
  const prices = [...new Set(quantities)].sort((one, other) => one - other).map(breakPath);
  return [...new Set([...prices, ...after.keys()])]
    .map((field) => ({ field, old: before.get(field) ?? null, new: after.get(field) ?? null }))
    .filter((change) => change.old !== change.new);
}

/** The path of the price from a quantity on. */
export function breakPath(quantity: number): string {
  return `breaks.${quantity}`;
}

function valuesOf({ breaks, ...terms }: OfferTerms): Map<string, PartValue> {
  const prices = breaks.map(({ minimumQuantity, unitPrice }): [string, PartValue] => [
    breakPath(minimumQuantity),
    unitPrice,
  ]);
  const { supplierNumber, currency, minimumOrderQuantity, orderMultiple } = terms;
  const { leadTimeDays, stock, validFrom, validUntil } = terms;
  return new Map<string, PartValue>([
    ...prices,
    ...Object.entries({ currency, supplierNumber, minimumOrderQuantity, orderMultiple }),
    ...Object.entries({ leadTimeDays, stock, validFrom, validUntil }),
  ]);
}

/** Prices that are about ten times those before, or a tenth: a decimal mark may have slipped. */
export function priceDoubts(current: OfferTerms | null, next: OfferTerms): Doubt[] {
  if (current === null || current.currency !== next.currency) return [];
  return next.breaks.flatMap(({ minimumQuantity, unitPrice }) => {
    const before = priceFrom(current, minimumQuantity);
    const [now, then] = [toScaled(unitPrice, PRICE_DECIMALS), toScaled(before, PRICE_DECIMALS)];
    if (now < then * SLIP && then < now * SLIP) return [];
    const message = `the price before is ${before}: has the decimal mark slipped?`;
    return [{ code: 'price-slip' as const, field: breakPath(minimumQuantity), message }];
  });
}

function priceFrom({ breaks }: OfferTerms, quantity: number): string {
  return (breaks.findLast(({ minimumQuantity }) => minimumQuantity <= quantity) ?? breaks[0]).unitPrice;
}
