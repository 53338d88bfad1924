import { normaliseMaker } from '../normalise.js';

/** From this on two makers are taken for one. */
export const SIMILAR_MAKERS = 0.75;

const LEAST_BEGINNING = 3;
const BEGINNING_LIKENESS = 0.9;

/**
 * How alike two makers' names are, from 0 to 1: 1 where they differ in case, marks and company form only,
 * 0.9 where one begins the other ("Hallam" and "Hallam Devices"), else the share of letter pairs that both have.
 *
 * Source of the share: Dice 1945; its use here and the limits are our judgement.
 */
export function makerLikeness(one: string, other: string): number {
  const [short, long] = [normaliseMaker(one), normaliseMaker(other)].sort(
    (left, right) => left.length - right.length,
  );
  if (short === long) return 1;
  if (short.length >= LEAST_BEGINNING && long.startsWith(short)) return BEGINNING_LIKENESS;
  return sharedPairs(short, long);
}

function sharedPairs(one: string, other: string): number {
  const rest = pairsOf(other);
  const total = Math.max(one.length - 1, 0) + rest.length;
  let shared = 0;
  for (const pair of pairsOf(one)) {
    const place = rest.indexOf(pair);
    if (place < 0) continue;
    rest.splice(place, 1);
    shared++;
  }
  return total === 0 ? 0 : (2 * shared) / total;
}

function pairsOf(text: string): string[] {
  return Array.from({ length: Math.max(text.length - 1, 0) }, (_, place) => text.slice(place, place + 2));
}
