import type { QuantityKind } from './kinds.js';
import { QUANTITIES } from './quantities.js';

const RANGE =
  /\d[^\d]*(?:\.{2,}|~)\s*[+-]?[.,]?\d|(?<!\de)(?<=[\p{L}\d.,°%)])\s*-\s*[+-]?[.,]?\d|\d.*\bto\b.*\d/iu;

/** What one may type for a kind: `4.7 kΩ or 4k7`. */
function examples(kind: QuantityKind): string {
  const { example, alternative } = QUANTITIES[kind];
  return alternative ? `${example} or ${alternative}` : example;
}

function expectation(kind: QuantityKind): string {
  const needsUnit = QUANTITIES[kind].unit !== '';
  return `a number${needsUnit ? ' with a unit' : ''} was expected, such as ${examples(kind)}`;
}

function quoted(text: string): string {
  const characters = [...text.trim()];
  return `“${characters.length > 40 ? `${characters.slice(0, 40).join('')}…` : characters.join('')}”`;
}

/** Says that nothing stands where a quantity of a kind was expected, with an example. */
export function emptyMessage(kind: QuantityKind): string {
  return `nothing was entered: ${expectation(kind)}`;
}

/** Says why text holds no number of that kind; `normalised` is the text as `normaliseText` gives it. */
export function notANumberMessage(text: string, normalised: string, kind: QuantityKind): string {
  const reason = RANGE.test(normalised) ? 'one number was expected, this is a range' : expectation(kind);
  return `${quoted(text)} is not ${QUANTITIES[kind].noun}: ${reason}`;
}

/** Says that a text states a quantity of one kind where another was expected. */
export function wrongKindMessage(text: string, found: QuantityKind, kind: QuantityKind): string {
  const { noun, example } = QUANTITIES[kind];
  return `${quoted(text)} is ${QUANTITIES[found].noun}; ${noun} was expected, such as ${example}`;
}

/** Says that `mhz` in lower case leaves open which prefix is meant. */
export function ambiguousHertzMessage(text: string): string {
  return `${quoted(text)} may be millihertz or megahertz: write mHz or MHz`;
}

/** Says that a value lies beyond the range of numbers, about 1e±308. */
export function outOfRangeMessage(text: string, kind: QuantityKind): string {
  return `${quoted(text)} is too large or too small for a number: ${expectation(kind)}`;
}
