import type { Offer, PartOffers } from '../../../api/prices';
import { shortPrice } from '@roothertz/common/prices';
import { cellLabel, cellText, comparedCells, quantityOf } from '../draft/cells';
import { isFollowedBy } from '../draft/overruns';

/** What happened to an offer on a day. */
export interface OfferEvent {
  id: string;
  at: string;
  who: string | null;
  supplier: string;
  /** Each in words, such as "at 100: 4.69 → 4.83 EUR". */
  changes: readonly string[];
}

/** What became of a part's offers, the latest first: who opened or changed which terms from what to what. */
export function offerEvents({ current, history }: PartOffers): OfferEvent[] {
  const offers = [...current, ...history];
  const events = offers.flatMap((offer) => [openedEvent(offer, offers), ...closedEvent(offer, offers)]);
  return events.sort((a, b) => b.at.localeCompare(a.at) || Number(b.id) - Number(a.id));
}

function openedEvent(offer: Offer, offers: readonly Offer[]): OfferEvent {
  const { id, openedAt, openedBy, supplier } = offer;
  const before = offers.find((other) => isFollowedBy(other, offer));
  const changes = before ? changesOf(before, offer) : [`new: ${pricesOf(offer)}`];
  return { id, at: openedAt, who: openedBy?.name ?? null, supplier: supplier.name, changes };
}

function closedEvent(offer: Offer, offers: readonly Offer[]): OfferEvent[] {
  const { id, closedAt, closedBy, supplier } = offer;
  if (closedAt === null || offers.some((other) => isFollowedBy(offer, other))) return [];
  return [
    { id: `${id}`, at: closedAt, who: closedBy?.name ?? null, supplier: supplier.name, changes: ['closed'] },
  ];
}

function changesOf(before: Offer, after: Offer): string[] {
  const rows = [before, after].map((offer) => ({ key: '', part: offer.part, offer, usedIn: [] }));
  return comparedCells(rows).flatMap((cell) => {
    const [from, to] = rows.map((row) => cellText(row, cell));
    const unit = quantityOf(cell) === null || to === '' ? '' : ` ${after.currency}`;
    return from === to ? [] : [`${cellLabel(cell)}: ${from || 'none'} → ${to || 'none'}${unit}`];
  });
}

function pricesOf({ breaks, currency }: Offer): string {
  const texts = breaks.map(
    ({ minimumQuantity, unitPrice }) => `${shortPrice(unitPrice)} ${currency} at ${minimumQuantity}`,
  );
  return texts.join(', ');
}
