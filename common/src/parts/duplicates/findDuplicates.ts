import { lettersAndDigits, normaliseMaker } from '../normalise.js';
import { DUPLICATE_LIKELIHOODS, type DuplicateReason } from './duplicateReasons.js';
import { makerLikeness, SIMILAR_MAKERS } from './makerLikeness.js';
import { baseNumber, lookOf } from './partNumberForms.js';

/** What of a part is compared. */
export interface ComparedPart {
  manufacturer: string;
  partNumber: string;
  package: string;
  /** Parameters and choice in the same order for all parts; `null` = unknown. */
  figures: readonly (number | string | null)[];
  /** The figure that no two names of one part differ in, such as a resistance; `null` where the kind has none. */
  nominal: number | null;
  /** It stands in the team's own library. */
  isOwn: boolean;
}

/** Two parts that may be one, by their places in the list that was given. */
export interface DuplicatePair {
  one: number;
  other: number;
  reasons: DuplicateReason[];
  /** From 0 to 1. */
  likelihood: number;
}

/** In larger groups each part is compared with the next only: they are a series. */
const LARGEST_GROUP = 12;
/** Fewer known figures can be equal by chance. */
const LEAST_KNOWN = 3;
const PIECE = 1000;

/**
 * The pairs of parts that may be one: first those within the team's own library, then those of an own and a curated
 * part, which a team may keep on purpose; the likeliest first. Only parts
 * are compared whose numbers look alike but for package and reel, or whose maker, package and figures are equal, so
 * that the effort grows with the number of parts and not with its square.
 */
export function findDuplicates(parts: readonly ComparedPart[]): DuplicatePair[] {
  const search = searchDuplicates(parts);
  for (;;) {
    const { done, value } = search.next();
    if (done) return value;
  }
}

/** The same search in pieces, so that who has other work as well can do it between them. */
export function* searchDuplicates(parts: readonly ComparedPart[]): Generator<void, DuplicatePair[]> {
  const pairs = new Map<string, DuplicatePair>();
  const keep = (one: number, other: number, compare: Compare) => {
    if (!parts[one].isOwn && !parts[other].isOwn) return;
    if (parts[one].nominal !== parts[other].nominal) return;
    const pair = { one: Math.min(one, other), other: Math.max(one, other) };
    const key = `${pair.one} ${pair.other}`;
    if (pairs.has(key)) return;
    const reasons = compare(parts[one], parts[other]);
    if (reasons.length > 0) pairs.set(key, { ...pair, reasons, likelihood: likelihoodOf(reasons) });
  };
  const alike = yield* groupsBy(parts, ({ partNumber }) => lookOf(baseNumber(partNumber)));
  yield* inPieces(alike, (group) => forEachPair(group, (one, other) => keep(one, other, byNumber)));
  const equal = yield* groupsBy(parts, figuresKeyer());
  yield* inPieces(equal, (group) => {
    if (group.length <= LARGEST_GROUP) forEachPair(group, (one, other) => keep(one, other, byFigures));
  });
  const strangeness = ({ one, other }: DuplicatePair) => (parts[one].isOwn && parts[other].isOwn ? 0 : 1);
  return [...pairs.values()].sort(
    (left, right) =>
      strangeness(left) - strangeness(right) ||
      right.likelihood - left.likelihood ||
      left.one - right.one ||
      left.other - right.other,
  );
}

type Compare = (one: ComparedPart, other: ComparedPart) => DuplicateReason[];

const byNumber: Compare = (one, other) => {
  if (makerLikeness(one.manufacturer, other.manufacturer) < SIMILAR_MAKERS) return [];
  const { known, equal } = compareFigures(one, other);
  if (equal * 2 < known) return [];
  const reason = numberReason(one, other);
  return known === equal && known >= LEAST_KNOWN && reason !== 'same-part'
    ? [reason, 'same-figures']
    : [reason];
};

const byFigures: Compare = () => ['same-figures'];

function numberReason(one: ComparedPart, other: ComparedPart): DuplicateReason {
  if (lettersAndDigits(one.partNumber) === lettersAndDigits(other.partNumber))
    return normaliseMaker(one.manufacturer) === normaliseMaker(other.manufacturer)
      ? 'same-part'
      : 'same-number';
  return lookOf(one.partNumber) === lookOf(other.partNumber) ? 'look-alike' : 'suffix';
}

/** How many figures both know, and how many of these are equal. */
function compareFigures(one: ComparedPart, other: ComparedPart): { known: number; equal: number } {
  let [known, equal] = [0, 0];
  one.figures.forEach((figure, place) => {
    const its = other.figures[place];
    if (figure === null || its === null) return;
    known++;
    if (figure === its) equal++;
  });
  return { known, equal };
}

function likelihoodOf(reasons: readonly DuplicateReason[]): number {
  return 1 - reasons.reduce((doubt, reason) => doubt * (1 - DUPLICATE_LIKELIHOODS[reason]), 1);
}

function figuresKeyer(): (part: ComparedPart) => string | null {
  const makers = remembered(normaliseMaker);
  const packages = remembered(lettersAndDigits);
  return ({ manufacturer, package: name, figures }) => {
    if (figures.filter((figure) => figure !== null).length < LEAST_KNOWN) return null;
    return `${makers(manufacturer)}|${packages(name)}|${figures.join('|')}`;
  };
}

/** A library repeats few makers and packages in all its parts. */
function remembered(read: (text: string) => string): (text: string) => string {
  const known = new Map<string, string>();
  return (text) => {
    const result = known.get(text) ?? read(text);
    known.set(text, result);
    return result;
  };
}

/** The places of parts of an equal key, where there are several; a key of null is equal to none. */
function* groupsBy(
  parts: readonly ComparedPart[],
  keyOf: (part: ComparedPart) => string | null,
): Generator<void, number[][]> {
  const groups = new Map<string, number[]>();
  yield* inPieces(parts, (part, place) => {
    const key = keyOf(part);
    if (key === null) return;
    const group = groups.get(key);
    if (group) group.push(place);
    else groups.set(key, [place]);
  });
  return [...groups.values()].filter(({ length }) => length > 1);
}

function* inPieces<Item>(
  items: readonly Item[],
  visit: (item: Item, place: number) => void,
): Generator<void, void> {
  for (let place = 0; place < items.length; place += 1) {
    visit(items[place], place);
    if (place % PIECE === PIECE - 1) yield;
  }
}

function forEachPair(group: readonly number[], visit: (one: number, other: number) => void): void {
  const reach = group.length > LARGEST_GROUP ? 1 : group.length;
  group.forEach((one, place) => {
    for (const other of group.slice(place + 1, place + 1 + reach)) visit(one, other);
  });
}
