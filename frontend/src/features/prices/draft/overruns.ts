import type { Offer, PartOffers } from '../../../api/prices';
import { cellText, comparedCells, type CellKey, type GridRow } from './cells';
import { type Change, draftText, type Overrun } from './draft';

/** A change closes an offer at the moment at which it opens the next. */
export function isFollowedBy(one: Offer, next: Offer): boolean {
  return (
    one.closedAt === next.openedAt && one.supplier.id === next.supplier.id && one.version + 1 === next.version
  );
}

/** What became of an offer: its latest terms, and whether they stand; null where nothing did. */
export function overrunOf(id: string, { current, history }: PartOffers): Overrun | null {
  const offers = [...current, ...history];
  let offer = offers.find((one) => one.id === id);
  for (let next = offer; next; next = offers.find((one) => isFollowedBy(offer!, one))) offer = next;
  const isClosed = offer !== undefined && offer.closedAt !== null;
  return offer && (isClosed || offer.id !== id) ? { offer, isClosed } : null;
}

/** A cell in which an offer of somebody else and a change of mine differ, or that either has changed. */
export interface Difference {
  cell: CellKey;
  was: string;
  theirs: string;
  mine: string;
}

/** What they and I have made of the cells that either of us has changed. */
export function differences(theirs: GridRow, change: Change): Difference[] {
  const { base, cells } = change;
  return comparedCells([base, theirs], cells.keys()).flatMap((cell) => {
    const [was, now] = [cellText(base, cell), cellText(theirs, cell)];
    const mine = draftText(base, change, cell);
    return was === now && mine === was ? [] : [{ cell, was, theirs: now, mine }];
  });
}
