import {
  type ColumnMapping,
  type FieldChange,
  type PartValue,
  PRICE_COLUMNS,
  PRICE_FIELDS,
  priceField,
  TIME_UNITS,
} from '@roothertz/common/imports';
import { CURRENCIES } from '@roothertz/common/prices';
import { formatQuantity } from '@roothertz/common/units';
import type { ChangeWords } from './changeWords';
import type { FieldChoice, ListView } from './listView';

/** The currencies of most offers, before all others. */
const USUAL_CURRENCIES = ['EUR', 'USD', 'GBP', 'CHF', 'JPY'];
const ALL_CURRENCIES = [...new Set([...USUAL_CURRENCIES, ...CURRENCIES])];
/** The digits beyond the second decimal that say nothing. */
const SPARE_ZEROS = /(\.\d{2}\d*?)0+$/;
const NAMES = ['manufacturer', 'partNumber', 'supplier', 'supplierNumber'];
const PRICES = ['unitPrice', 'quantity', 'currency'];

export const CURRENCY_CHOICES = ALL_CURRENCIES.map((code) => ({ value: code, label: code }));

/** How the page shows a supplier's price list. */
export const PRICE_VIEW: ListView = {
  columns: PRICE_COLUMNS,
  choices: [
    { value: '', label: 'left out' },
    { label: 'Part and supplier', options: NAMES.map(choiceOf) },
    {
      label: 'Prices',
      options: [{ value: 'break:unitPrice', label: 'price by quantity' }, ...PRICES.map(choiceOf)],
    },
    {
      label: 'Terms',
      options: PRICE_FIELDS.map(({ key }) => key)
        .filter((key) => ![...NAMES, ...PRICES].includes(key))
        .map(choiceOf),
    },
  ],
  usualUnit: (_, field) => (priceField(field).kind === 'lead-time' ? 'days' : null),
  units: unitsOf,
  changeWords: offerWords,
};

function choiceOf(key: string): FieldChoice {
  return { value: `value:${key}`, label: priceField(key).label };
}

function unitsOf({ field }: ColumnMapping): { value: string; label: string }[] {
  const { kind } = priceField(field);
  if (kind === 'lead-time') return TIME_UNITS.map((unit) => ({ value: unit, label: unit }));
  return kind === 'price' ? [{ value: '', label: 'no currency' }, ...CURRENCY_CHOICES] : [];
}

function offerWords({ field, old, new: next }: FieldChange): ChangeWords {
  const quantity = /^breaks\.(\d+)$/.exec(field)?.[1];
  const label =
    quantity === undefined ? priceField(field).label : `from ${formatQuantity(Number(quantity), 'count')}`;
  return { label, old: termWords(field, old), next: termWords(field, next) };
}

function termWords(field: string, value: PartValue): string {
  if (value === null) return field.startsWith('breaks') || field === 'validUntil' ? 'none' : 'unknown';
  if (field === 'leadTimeDays') return `${value} days`;
  if (field.startsWith('breaks')) return String(value).replace(SPARE_ZEROS, '$1');
  if (value === '') return 'none';
  return typeof value === 'number' ? formatQuantity(value, 'count') : value;
}
