import { boundsError, type FieldError } from '../parts/index.js';
import { currencyError } from './currencies.js';
import { isDay } from './days.js';
import { PRICE_DECIMALS, shortPrice, toScaled } from './money.js';
import type { Offer, PriceBreak } from './offer.js';
import { MOST_BREAKS, OFFER_FIELDS } from './offerFields.js';
import { readPrice } from './readPrice.js';

/** What of an offer is to be checked: texts of supplier and confirmation are the caller's. */
export type CheckedOffer = Omit<Offer, 'supplier' | 'supplierNumber' | 'confirmedAt'>;

/**
 * Everything that is wrong with an offer, by the field's path such as `breaks[1].unitPrice`: values out of
 * bounds, breaks that aren't in ascending order of quantity, a price that rises with the quantity, an end
 * before its beginning or before today. Empty = it can be kept.
 *
 * @param today the day on which the offer is entered
 */
export function checkOffer(offer: CheckedOffer, today: string): FieldError[] {
  return [
    ...entry('currency', currencyError(offer.currency)),
    ...checkBreaks(offer.breaks),
    ...entry(
      'minimumOrderQuantity',
      boundsError(OFFER_FIELDS.minimumOrderQuantity, offer.minimumOrderQuantity),
    ),
    ...entry('orderMultiple', boundsError(OFFER_FIELDS.orderMultiple, offer.orderMultiple)),
    ...optionalCount('leadTimeDays', offer.leadTimeDays),
    ...optionalCount('stock', offer.stock),
    ...checkValidity(offer, today),
  ];
}

function checkBreaks(breaks: readonly PriceBreak[]): FieldError[] {
  if (breaks.length === 0 || breaks.length > MOST_BREAKS)
    return entry('breaks', `breaks: 1 to ${MOST_BREAKS} of them were expected`);
  return breaks.flatMap((current, index) => {
    const own = checkBreak(current, index);
    return own.length > 0 || index === 0 ? own : checkOrder(breaks[index - 1], current, index);
  });
}

function checkBreak({ minimumQuantity, unitPrice }: PriceBreak, index: number): FieldError[] {
  const price = readPrice(unitPrice);
  return [
    ...entry(`breaks[${index}].minimumQuantity`, boundsError(OFFER_FIELDS.minimumQuantity, minimumQuantity)),
    ...entry(`breaks[${index}].unitPrice`, price.ok ? null : price.message),
  ];
}

function checkOrder(before: PriceBreak, current: PriceBreak, index: number): FieldError[] {
  if (current.minimumQuantity <= before.minimumQuantity)
    return entry(
      `breaks[${index}].minimumQuantity`,
      `minimum quantity: more than the ${before.minimumQuantity} of the break before was expected`,
    );
  if (!readPrice(before.unitPrice).ok || scaled(current) <= scaled(before)) return [];
  return entry(
    `breaks[${index}].unitPrice`,
    `unit price: not more than the ${shortPrice(before.unitPrice)} of the break before was expected`,
  );
}

function scaled({ unitPrice }: PriceBreak): bigint {
  return toScaled(unitPrice.trim(), PRICE_DECIMALS);
}

function checkValidity({ validFrom, validUntil }: CheckedOffer, today: string): FieldError[] {
  const day = 'a day such as 2026-12-31 was expected';
  if (!isDay(validFrom)) return entry('validFrom', `valid from: ${day}`);
  if (validUntil === null) return [];
  if (!isDay(validUntil)) return entry('validUntil', `valid until: ${day}`);
  if (validUntil < validFrom)
    return entry('validUntil', `valid until: a day not before ${validFrom} was expected`);
  return entry('validUntil', validUntil < today ? 'valid until: this day is past' : null);
}

function optionalCount(field: 'leadTimeDays' | 'stock', value: number | null): FieldError[] {
  return entry(field, value === null ? null : boundsError(OFFER_FIELDS[field], value));
}

function entry(field: string, message: string | null): FieldError[] {
  return message === null ? [] : [{ field, message }];
}
