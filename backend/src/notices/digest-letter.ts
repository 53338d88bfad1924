import { EXPIRING_DAYS, type Offer } from '@roothertz/common/prices';
import type { Letter, LetterList } from '../mail/letter.js';
import { dayText } from '../shared/text/day-text.js';
import { moneyText } from './money-text.js';

/** An offer that calls for a look. */
export interface ListedOffer {
  part: { manufacturer: string; partNumber: string };
  supplier: { name: string };
  currency: string;
  breaks: Offer['breaks'];
  confirmedAt: string;
  validUntil: string | null;
}

/** What a team's digest tells. */
export interface Digest {
  team: string;
  staleAfterDays: number;
  counts: { stale: number; expiring: number; expired: number };
  /** Those that end first. */
  expiring: readonly ListedOffer[];
  /** Those confirmed longest ago. */
  stale: readonly ListedOffer[];
}

export function digestLetter(digest: Digest): Letter {
  const { team, counts } = digest;
  return {
    subject: `Prices of ${team}: ${[staleWords(counts.stale), endingWords(counts.expiring)].filter(Boolean).join(', ')}`,
    paragraphs: paragraphsOf(digest),
    lists: listsOf(digest),
    link: { label: 'Open these prices', path: '/prices?state=stale,expiring' },
    remark: 'Sent each Monday on which there are such prices, to those who keep them.',
  };
}

function listsOf({ counts, expiring, stale }: Digest): LetterList[] {
  const ending = listOf(expiring.map(endingSentence), counts.expiring, 'Ending soon', 'end first');
  const old = listOf(
    stale.map(staleSentence),
    counts.stale,
    'Not confirmed for long',
    'were confirmed longest ago',
  );
  return [ending, old].filter(({ items }) => items.length > 0);
}

/** What all have in common stands above them, or what the first ones do where there are more. */
function listOf(items: string[], count: number, all: string, first: string): LetterList {
  return { heading: items.length < count ? `The ${items.length} of ${count} that ${first}` : all, items };
}

function paragraphsOf({ counts: { stale, expiring, expired }, staleAfterDays }: Digest): string[] {
  const sentences = [
    stale && `${offers(stale)} ${were(stale)} last confirmed more than ${staleAfterDays} days ago.`,
    expiring && `${offers(expiring)} ${expiring === 1 ? 'ends' : 'end'} within ${EXPIRING_DAYS} days.`,
    expired &&
      `${offers(expired)} ${expired === 1 ? 'has' : 'have'} ended and no longer ${expired === 1 ? 'counts' : 'count'}.`,
  ];
  return [sentences.filter(Boolean).join(' ')];
}

function endingSentence(offer: ListedOffer): string {
  return `${offerWords(offer)}, ends on ${dayText(new Date(offer.validUntil!))}`;
}

function staleSentence(offer: ListedOffer): string {
  return `${offerWords(offer)}, last confirmed on ${dayText(new Date(offer.confirmedAt))}`;
}

function offerWords({ part, supplier, breaks: [first], currency }: ListedOffer): string {
  const price = `${moneyText(first.unitPrice, currency)} for ${first.minimumQuantity} or more`;
  return `${part.partNumber} by ${part.manufacturer}, from ${supplier.name} at ${price}`;
}

function staleWords(count: number): string {
  return count === 0 ? '' : `${count} stale`;
}

function endingWords(count: number): string {
  return count === 0 ? '' : `${count} ending soon`;
}

function offers(count: number): string {
  return count === 1 ? 'One offer' : `${count} offers`;
}

function were(count: number): string {
  return count === 1 ? 'was' : 'were';
}
