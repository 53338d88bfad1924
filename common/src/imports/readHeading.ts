import type { Origin } from '../parts/index.js';
import { parseQuantity, parseUnit } from '../units/index.js';

/** A heading in its pieces: “en typ [nV/√Hz] @1kHz”. */
export interface HeadingPieces {
  /** What is left of the heading without all the rest. */
  name: string;
  /** The name with “typ” or “max”, for some names end in it: “supply max”. */
  wholeName: string;
  /** The unit as it is written, or null. */
  unit: string | null;
  /** Hz, or null. */
  frequency: number | null;
  /** It speaks of noise from peak to peak, or from 0.1 to 10 Hz. */
  peakToPeak: boolean;
  /** What “typ” or “max” says of the figures. */
  origin: Origin | null;
}

const BRACKETS = /[[({]([^\])}]*)[\])}]/g;
const SLOW = /0[.,]1\s*(?:hz)?\s*(?:-|–|—|\.{2,3}|…|to|bis|à|÷)\s*10\s*hz/i;
const PEAKS = /\bp\s*-\s*p\b|\bpp\b|peak\s*-?\s*to\s*-?\s*peak|spitze\s*-?\s*spitze|cr[êe]te/i;
const UNIT_OF_PEAKS = /[\s_-]?(?:p-?p|pk-?pk|peak-to-peak)$/i;
const FREQUENCY =
  /(?:@|\bat\b|\bbei\b|\bà\b)?\s*(?:\bf\s*=\s*)?(?<![\d.,/√])(\d+(?:[.,]\d+)?)\s*([kM]?)hz(?![\p{L}\d])/iu;
const TEMPERATURE = /[@(,]?\s*(?:\bT_?[a-z]?\s*=\s*)?[+-]?\d+\s*°\s*C\)?/iu;
const QUALIFIERS: readonly [RegExp, Origin][] = [
  [/(?<!\p{L})(?:typ|typical|typisch|nom|nominal)(?!\p{L})\.?/iu, 'typical'],
  [/(?<!\p{L})(?:max|maximum|maximal)(?!\p{L})\.?/iu, 'maximum'],
];
const GAPS = /[\s_/,;:]+(?:in\s+)?/gi;
const ROOT_APART = /([VA])[_ ](?=(?:rt|sqrt)_?\(?hz)/i;
const CAPITALS = /^([NPFUMKG]?)(V|A|F|W|HZ|OHMS?|[VA]\/(?:√|RT|SQRT)_?\(?HZ\)?)$/;

/** Takes a heading apart; whatever it doesn't know stays in the name. */
export function readHeading(heading: string): HeadingPieces {
  const slow = heading.replace(SLOW, ' ');
  const frequency = FREQUENCY.exec(slow);
  const { rest, unit, peaks } = takeUnit(withoutConditions(slow));
  const plain = rest.replace(PEAKS, ' ');
  const qualifier = QUALIFIERS.find(([pattern]) => pattern.test(plain));
  return {
    name: tidy(qualifier ? plain.replace(qualifier[0], ' ') : plain),
    wholeName: tidy(plain),
    unit: unit && withRoot(isInCapitals(heading) ? (unitInCapitals(unit) ?? unit) : unit),
    frequency: frequency && hertz(frequency[1] + frequency[2]),
    peakToPeak: peaks || slow !== heading || PEAKS.test(rest),
    origin: qualifier?.[1] ?? null,
  };
}

function withoutConditions(heading: string): string {
  const plain = heading.replace(FREQUENCY, ' ').replace(TEMPERATURE, ' ');
  return tidy(plain.replace(ROOT_APART, '$1/'));
}

function tidy(name: string): string {
  return name
    .replace(/[@,;:_\s]+$/, '')
    .replace(/\s+/g, ' ')
    .trim();
}

function isInCapitals(heading: string): boolean {
  return !/\p{Ll}/u.test(heading);
}

/** Lists in Windows-1252, which has no root sign, write `nV/vHz` or `nV/?Hz`. */
function withRoot(unit: string): string {
  return unit.replace(/\/[v?](?=\(?hz)/i, '/√');
}

/** Programs that write their headings in capitals mean pF by PF, MHz by MHZ, and mA by MA. */
function unitInCapitals(text: string): string | null {
  const [, prefix, capitals] = CAPITALS.exec(text) ?? [];
  if (capitals === undefined) return null;
  const symbol = capitals
    .replace(/(?:√|RT|SQRT)_?\(?HZ\)?/, '√Hz')
    .replace('HZ', 'Hz')
    .replace(/OHMS?/, 'Ω');
  const isMega = prefix === 'M' && (symbol === 'Hz' || symbol === 'Ω');
  return (isMega || prefix === 'G' ? prefix : prefix.toLowerCase()) + symbol;
}

function takeUnit(heading: string): { rest: string; unit: string | null; peaks: boolean } {
  for (const [whole, inner] of heading.matchAll(BRACKETS)) {
    const unit = inner.replace(UNIT_OF_PEAKS, '').trim();
    if (isUnit(unit)) return { rest: heading.replace(whole, ' '), unit, peaks: unit !== inner.trim() };
  }
  for (const { 0: gap, index } of heading.matchAll(GAPS)) {
    const tail = heading.slice(index + gap.length).trim();
    const unit = tail.replace(UNIT_OF_PEAKS, '');
    if (index > 0 && isUnit(unit)) return { rest: heading.slice(0, index), unit, peaks: unit !== tail };
  }
  return { rest: heading, unit: null, peaks: false };
}

function isUnit(text: string): boolean {
  return text !== '' && (parseUnit(text) ?? unitInCapitals(text)) !== null;
}

function hertz(text: string): number | null {
  const reading = parseQuantity(`${text}Hz`, 'frequency');
  return reading.ok && reading.value > 0 ? reading.value : null;
}
