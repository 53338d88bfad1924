import { normaliseWord } from '../../parts/index.js';
import { currencyError } from '../../prices/index.js';
import type { ProposedColumn } from '../proposeColumn.js';
import { breakOfHeading } from './breakHeading.js';
import { type TimeUnit, timeUnitOf } from './leadTime.js';
import { PRICE_FIELDS, priceField } from './priceFields.js';

/** A heading in its pieces: “Preis ab 100 [EUR]”, “Lieferzeit (Wochen)”. */
interface Pieces {
  name: string;
  currency: string | null;
  time: TimeUnit | null;
}

const BRACKETS = /[[({]([^\])}]*)[\])}]/g;

/**
 * Says of one heading after the other what the column of a price list is, or null where its words mean nothing: a
 * name of a field, with a currency or a unit of time behind it, or the quantity from which on its prices hold.
 */
export function priceColumnProposer(): (heading: string) => ProposedColumn | null {
  const words = new Map(
    PRICE_FIELDS.flatMap(({ key, label, synonyms }) =>
      [key, label, ...synonyms].map((name): [string, string] => [normaliseWord(name), key]),
    ),
  );
  return (heading) => {
    const pieces = takeApart(heading);
    const field = words.get(normaliseWord(heading)) ?? words.get(normaliseWord(pieces.name));
    if (field !== undefined) return valueColumn(field, pieces);
    const quantity = breakOfHeading(pieces.name);
    return quantity === null ? null : { ...valueColumn('unitPrice', pieces), form: 'break', quantity };
  };
}

/** What a column of a price list is that was recognised by another name. */
export function proposePriceField(field: string, heading: string): ProposedColumn {
  return valueColumn(field, takeApart(heading));
}

function valueColumn(field: string, { currency, time }: Pieces): ProposedColumn {
  const { kind } = priceField(field);
  const unit = { price: currency, 'lead-time': time ?? 'days' }[kind as string] ?? null;
  return {
    field,
    form: 'value',
    unit,
    frequency: null,
    quantity: null,
    origin: null,
    unitAssumed: kind === 'lead-time' && time === null,
  };
}

function takeApart(heading: string): Pieces {
  const bracketed = [...heading.matchAll(BRACKETS)];
  const plain = heading.replace(BRACKETS, ' ');
  const currency = currencyIn(heading);
  const time = bracketed.map(([, inner]) => timeUnitOf(inner)).find((unit) => unit !== null) ?? null;
  const inBrackets = bracketed.map(([, inner]) => inner).filter((inner) => /\d/.test(inner));
  const name = [plain, ...inBrackets].join(' ').trim();
  if (time !== null) return { name, currency, time };
  const { rest, unit } = timeAtEnd(name);
  return { name: withoutCurrency(rest, currency), currency, time: unit };
}

function timeAtEnd(name: string): { rest: string; unit: TimeUnit | null } {
  const match = /^(.*\S)[\s,;:/_-]+(?:in\s+|en\s+)?(\p{L}+\.?)$/iu.exec(name);
  const unit = match && timeUnitOf(match[2]);
  return unit ? { rest: match[1], unit } : { rest: name, unit: null };
}

function currencyIn(heading: string): string | null {
  const codes = heading.match(/(?<![\p{L}\d])[A-Z]{3}(?![\p{L}\d])/gu) ?? [];
  return codes.find((code) => currencyError(code) === null) ?? (heading.includes('€') ? 'EUR' : null);
}

function withoutCurrency(name: string, currency: string | null): string {
  if (currency === null) return name;
  return name
    .replace(currency, ' ')
    .replace('€', ' ')
    .replace(/(?:\s|^)(?:in|en)\s*$/iu, '')
    .replace(/[\s,;:/_-]+$/, '')
    .trim();
}
