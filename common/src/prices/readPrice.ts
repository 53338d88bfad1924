import type { Reading } from '../parts/index.js';
import { plainNumbers } from './plainNumber.js';
import { priceText, RATE_DECIMALS, scaledText, toScaled } from './money.js';

/** Digits before the decimal mark that a price or rate may have. */
const WHOLE_DIGITS = 9;

/**
 * Reads a unit price: digits and at most four decimals. Grouped digits, whose meaning depends on who wrote
 * them, and currencies, of which an offer has one for all its breaks, are refused, as is what isn't above 0.
 *
 * @param mark the decimal mark: never guessed, for `1,234` can be either
 */
export function readPrice(input: string, mark: '.' | ',' = '.'): Reading<string> {
  return reading('unit price', input, mark, 4, priceText);
}

/** Reads an exchange rate: digits and at most eight decimals, above 0. */
export function readRate(input: string, mark: '.' | ',' = '.'): Reading<string> {
  return reading('rate', input, mark, 8, (text) => scaledText(toScaled(text, RATE_DECIMALS), RATE_DECIMALS));
}

function reading(
  label: string,
  input: string,
  mark: '.' | ',',
  decimals: number,
  keep: (text: string) => string,
): Reading<string> {
  const text = input.trim();
  const message = numberError(text, mark, decimals);
  return message === null
    ? { ok: true, value: keep(text.replace(',', '.')) }
    : { ok: false, message: `${label}: ${message}` };
}

function numberError(text: string, mark: '.' | ',', decimals: number): string | null {
  const example = mark === '.' ? '1234.56' : '1234,56';
  if (text === '') return 'a number was expected';
  if (/^[-−]\s*[\d.,]/.test(text)) return 'a value above 0 was expected';
  if (/\p{Sc}|[A-Z]{3}/u.test(text))
    return 'a number without a currency was expected: an offer has one currency for all its prices';
  if (/^\d[\d.,\s’']*$/.test(text) && !isPlain(text, mark))
    return `digits in groups or another decimal mark can be misread: write it as ${plainly(text, mark) || example}`;
  if (!isPlain(text, mark)) return `a number such as ${example} was expected`;
  const [whole, fraction = ''] = text.split(mark);
  if (whole.length > WHOLE_DIGITS)
    return `at most ${WHOLE_DIGITS} digits before the decimal mark were expected`;
  if (fraction.length > decimals) return `at most ${decimals} decimals were expected`;
  return /[1-9]/.test(text) ? null : 'a value above 0 was expected';
}

function plainly(text: string, mark: '.' | ','): string {
  return plainNumbers(text)
    .map((number) => number.replace('.', mark))
    .join(' or ');
}

function isPlain(text: string, mark: '.' | ','): boolean {
  return mark === '.' ? /^\d+(\.\d+)?$/.test(text) : /^\d+(,\d+)?$/.test(text);
}
