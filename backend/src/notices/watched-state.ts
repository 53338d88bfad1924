import type { Lifecycle } from '@roothertz/common/parts';
import { PRICE_DECIMALS, toScaled } from '@roothertz/common/prices';

/** What is watched of a part at saved conditions. */
export interface WatchedState {
  lifecycle: Lifecycle;
  /** Whether an offer holds today whose stock isn't known to be 0. */
  available: boolean;
  quantity: number;
  /** At the quantity; null = there is none. */
  unitPrice: string | null;
  /** Of the price: the team's at the time. */
  currency: string | null;
}

export type PartChange =
  { kind: 'obsolete' } | { kind: 'unavailable' } | { kind: 'dearer'; from: string; to: string };

/** A price counts as dearer when it is above this many hundredths of the one before. */
const DEARER_PERCENT = 110n;

/** What is worth telling of a part, against what was known of it. */
export function changesSince(before: WatchedState, now: WatchedState): PartChange[] {
  const changes: PartChange[] = [];
  if (now.lifecycle === 'obsolete' && before.lifecycle !== 'obsolete') changes.push({ kind: 'obsolete' });
  if (before.available && !now.available) changes.push({ kind: 'unavailable' });
  if (isDearer(before, now)) changes.push({ kind: 'dearer', from: before.unitPrice!, to: now.unitPrice! });
  return changes;
}

/**
 * What the next comparison starts from. A price stays until it is told or another quantity or currency makes it
 * incomparable: many small steps are then told together, and a low that nobody was told of isn't counted from.
 */
export function knownAfter(before: WatchedState, now: WatchedState): WatchedState {
  const isKept = areComparable(before, now) && !isDearer(before, now);
  const { unitPrice, currency } = isKept ? before : now;
  return { ...now, unitPrice, currency };
}

/** What is known once the quantity has been changed, and nothing was told yet. */
export function atNewQuantity(before: WatchedState, now: WatchedState): WatchedState {
  const { quantity, unitPrice, currency } = now;
  return before.quantity === quantity ? before : { ...before, quantity, unitPrice, currency };
}

function isDearer(before: WatchedState, now: WatchedState): boolean {
  if (!areComparable(before, now) || now.unitPrice === null) return false;
  return scaled(now.unitPrice) * 100n > scaled(before.unitPrice!) * DEARER_PERCENT;
}

/** A price too small for its decimals is none to compare with. */
function areComparable(before: WatchedState, now: WatchedState): boolean {
  const isPriced = before.unitPrice !== null && scaled(before.unitPrice) > 0n;
  const isSameCurrency = now.unitPrice === null || before.currency === now.currency;
  return isPriced && isSameCurrency && before.quantity === now.quantity;
}

function scaled(price: string): bigint {
  return toScaled(price, PRICE_DECIMALS);
}
