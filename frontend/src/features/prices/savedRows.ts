import type { Offer, PriceListPage, PriceListRow } from '../../api/prices';
import type { SentRow } from './draft/savedRefusals';

/** Loaded pages with the offers as they were saved, until the server's own list is there. */
export function withSaved(
  pages: readonly PriceListPage[],
  sent: readonly SentRow[],
  offers: readonly Offer[],
): PriceListPage[] {
  const changed = new Map<string, Offer>();
  const opened = new Map<string, PriceListRow[]>();
  sent.forEach(({ row: { part, usedIn }, body }, index) => {
    const offer = offers[index];
    if (body.id !== undefined) changed.set(body.id, offer);
    else opened.set(part.id, [...(opened.get(part.id) ?? []), { part, offer, usedIn: [...usedIn] }]);
  });
  const shown = (row: PriceListRow): PriceListRow[] => {
    const added = opened.get(row.part.id) ?? [];
    opened.delete(row.part.id);
    if (row.offer === null && added.length > 0) return added;
    return [{ ...row, offer: (row.offer && changed.get(row.offer.id)) ?? row.offer }, ...added];
  };
  return pages.map((page) => ({ ...page, items: page.items.flatMap(shown) }));
}
