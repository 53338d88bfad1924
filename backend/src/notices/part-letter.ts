import type { PartKind } from '@roothertz/common/parts';
import { dividedHalfUp, PRICE_DECIMALS, shortPrice, toScaled } from '@roothertz/common/prices';
import type { Letter } from '../mail/letter.js';
import { moneyText } from './money-text.js';
import type { PartChange, WatchedState } from './watched-state.js';

/** A part that changed, and the saved conditions at which it is chosen. */
export interface ChangedPart {
  id: number;
  kind: PartKind;
  manufacturer: string;
  partNumber: string;
  conditions: string;
  now: WatchedState;
  changes: PartChange[];
}

const MOST_LISTED = 50;

const GRAVEST_FIRST: readonly PartChange['kind'][] = ['obsolete', 'unavailable', 'dearer'];
const IN_SUBJECT: Record<PartChange['kind'], string> = {
  obsolete: 'is now obsolete',
  unavailable: 'is no longer available',
  dearer: 'has become dearer',
};

/** Tells of all that changed for one person, who has at least one change. */
export function partLetter(team: string, parts: readonly ChangedPart[]): Letter {
  const more = parts.length - MOST_LISTED;
  const items = parts.slice(0, MOST_LISTED).map(sentence);
  return {
    subject: subjectOf(parts),
    paragraphs: [
      `These parts are chosen in saved conditions of yours in the team ${team}, and have changed:`,
    ],
    lists: [{ items: more > 0 ? [...items, `and ${more} more`] : items }],
    link: linkOf(parts),
    remark: 'Prices are the team’s own entries. Each change is told once.',
  };
}

/** “OX-27 by Acme (in River geophone): now obsolete; 12 % dearer at 100: 1.23 → 1.38 EUR.” */
export function sentence(part: ChangedPart): string {
  const changes = part.changes.map((change) => words(change, part.now));
  return `${nameOf(part)} (in ${part.conditions}): ${changes.join('; ')}.`;
}

function words(change: PartChange, { quantity, currency }: WatchedState): string {
  if (change.kind === 'obsolete') return 'now obsolete';
  if (change.kind === 'unavailable')
    return 'no longer available: no supplier with a valid offer has any in stock';
  const { from, to } = change;
  return `${percentDearer(from, to)} dearer at ${quantity}: ${shortPrice(from)} → ${moneyText(to, currency!)}`;
}

function percentDearer(from: string, to: string): string {
  const [before, now] = [from, to].map((price) => toScaled(price, PRICE_DECIMALS));
  return `${dividedHalfUp(100n * (now - before), before)}\u00a0%`;
}

function subjectOf(parts: readonly ChangedPart[]): string {
  if (countOfParts(parts) > 1) return `${countOfParts(parts)} parts in your saved conditions have changed`;
  const kinds = new Set(parts.flatMap(({ changes }) => changes.map(({ kind }) => kind)));
  const worst = GRAVEST_FIRST.find((kind) => kinds.has(kind))!;
  return `${nameOf(parts[0])} ${IN_SUBJECT[worst]}`;
}

function linkOf(parts: readonly ChangedPart[]): Letter['link'] {
  if (countOfParts(parts) > 1) return { label: 'Open the ranking', path: '/rank' };
  const [{ id, kind, partNumber }] = parts;
  const path = kind === 'resistor' ? `/parts/resistors/${id}` : `/parts/${id}`;
  return { label: `Open ${partNumber}`, path };
}

function countOfParts(parts: readonly ChangedPart[]): number {
  return new Set(parts.map(({ id }) => id)).size;
}

function nameOf({ partNumber, manufacturer }: ChangedPart): string {
  return `${partNumber} by ${manufacturer}`;
}
