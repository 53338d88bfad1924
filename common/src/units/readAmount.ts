import { decimalOf, type Decimal } from './decimal.js';

/** A number and the text after it. */
export interface Amount {
  number: Decimal;
  unitText: string;
}

const NUMBER = /^([+-]?) ?((?:\d|[.,]\d)(?:[\d.,'’]| (?=\d(?!\/)))*)(?:e([+-]?\d+))?/i;

/**
 * Reads the number that normalised text begins with; null where there is none or its marks contradict each other.
 * A lone comma or point is the decimal mark; with both, the last one is; a mark that comes twice groups thousands,
 * as a space or an apostrophe does.
 */
export function readAmount(text: string): Amount | null {
  const match = NUMBER.exec(text);
  if (!match) return null;
  const [whole, sign, body, exponent = '0'] = match;
  const digits = plainDigits(body);
  if (digits === null) return null;
  return {
    number: decimalOf(sign + digits, Number(exponent)),
    unitText: text.slice(whole.length).trim(),
  };
}

function plainDigits(body: string): string | null {
  const mark = decimalMark(body);
  const at = mark === null ? body.length : body.lastIndexOf(mark);
  const whole = ungroup(body.slice(0, at));
  const part = ungroupPart(body.slice(at + 1));
  return whole === null || part === null ? null : `${whole}.${part}`;
}

function decimalMark(body: string): string | null {
  const marks = [...body].filter((character) => character === '.' || character === ',');
  const last = marks.at(-1);
  if (last === undefined) return null;
  const repeated = marks.filter((mark) => mark === last).length > 1;
  return repeated ? null : last;
}

function ungroup(whole: string): string | null {
  if (/^\d*$/.test(whole)) return whole || '0';
  const grouped = /^[1-9]\d{0,2}([.,'’ ])\d{3}(?:\1\d{3})*$/.test(whole);
  return grouped ? whole.replace(/\D/g, '') : null;
}

/** The SI groups digits after the decimal mark with spaces too: 0.123 456. */
function ungroupPart(part: string): string | null {
  return /^(?:\d*|(?:\d{3} )+\d{1,3})$/.test(part) ? part.replace(/ /g, '') : null;
}
