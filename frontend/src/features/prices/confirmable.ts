import type { ShownRow } from './draft/shownRows';

/** Whether an offer can be confirmed as it stands: not one that has ended, nor one whose changes saving confirms. */
export function isConfirmable({ offer, change }: ShownRow): boolean {
  return offer !== null && change === undefined && !offer.states.includes('expired');
}
