import type { Offer, PartOffers } from '../../../api/prices';
import { cellText, type CellKey, PLAIN_CELLS, priceCell } from '../draft/cells';

/** What happened to an offer on a day. */
export interface OfferEvent {
  id: string;
  at: string;
  who: string | null;
  supplier: string;
  /** Each in words, such as "at 100: 4.69 → 4.83 EUR". */
  changes: readonly string[];
}

const LABELS: Record<(typeof PLAIN_CELLS)[number], string> = {
  supplier: 'supplier',
  supplierNumber: 'supplier’s number',
  currency: 'currency',
  minimumOrderQuantity: 'MOQ',
  orderMultiple: 'multiple',
  leadTimeDays: 'lead time in days',
  stock: 'stock',
  validFrom: 'valid from',
  validUntil: 'valid until',
};

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
  const { id, closedAt, supplier } = offer;
  if (closedAt === null || offers.some((other) => isFollowedBy(offer, other))) return [];
  return [{ id: `${id}`, at: closedAt, who: null, supplier: supplier.name, changes: ['closed'] }];
}

/** A change closes an offer at the moment at which it opens the next. */
function isFollowedBy(one: Offer, next: Offer): boolean {
  return (
    one.closedAt === next.openedAt && one.supplier.id === next.supplier.id && one.version + 1 === next.version
  );
}

function changesOf(before: Offer, after: Offer): string[] {
  const rows = [before, after].map((offer) => ({ key: '', part: offer.part, offer, usedIn: [] }));
  const quantities = new Set(
    [...before.breaks, ...after.breaks].map(({ minimumQuantity }) => minimumQuantity),
  );
  const cells: [CellKey, string, string][] = [
    ...[...quantities]
      .sort((a, b) => a - b)
      .map((quantity): [CellKey, string, string] => [
        priceCell(quantity),
        `at ${quantity}`,
        ` ${after.currency}`,
      ]),
    ...PLAIN_CELLS.map((cell): [CellKey, string, string] => [cell, LABELS[cell], '']),
  ];
  return cells.flatMap(([cell, label, unit]) => {
    const [from, to] = rows.map((row) => cellText(row, cell));
    return from === to ? [] : [`${label}: ${from || 'none'} → ${to || 'none'}${to && unit}`];
  });
}

function pricesOf({ breaks, currency }: Offer): string {
  const texts = breaks.map(
    ({ minimumQuantity, unitPrice }) => `${Number(unitPrice)} ${currency} at ${minimumQuantity}`,
  );
  return texts.join(', ');
}
