import { addDays, dayOf } from './days.js';
import type { Offer } from './offer.js';

/** Why an offer needs a look; `expired` offers no longer count. */
export const OFFER_STATES = ['stale', 'expiring', 'expired'] as const;
export type OfferState = (typeof OFFER_STATES)[number];

/** An offer that ends within so many days is expiring. */
export const EXPIRING_DAYS = 30;

/**
 * What calls for a look at an offer on a day.
 *
 * @param staleAfterDays an offer whose last confirmation is longer ago than this is stale
 */
export function offerStates(
  { confirmedAt, validUntil }: Pick<Offer, 'confirmedAt' | 'validUntil'>,
  staleAfterDays: number,
  day: string,
): OfferState[] {
  const states: OfferState[] = [];
  if (dayOf(new Date(confirmedAt)) < addDays(day, -staleAfterDays)) states.push('stale');
  if (validUntil !== null && validUntil < day) states.push('expired');
  else if (validUntil !== null && validUntil <= addDays(day, EXPIRING_DAYS)) states.push('expiring');
  return states;
}
