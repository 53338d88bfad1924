import type { QuantityField, TextField } from '../parts/index.js';

const MOST_PIECES = 1e9;

/** The numeric fields of offers and of the team's settings for prices. */
export const OFFER_FIELDS = {
  minimumQuantity: {
    label: 'minimum quantity',
    kind: 'count',
    integer: true,
    bounds: { from: 1, to: MOST_PIECES },
    help: 'Pieces from which on the unit price holds.',
  },
  minimumOrderQuantity: {
    label: 'MOQ',
    kind: 'count',
    integer: true,
    bounds: { from: 1, to: MOST_PIECES },
    help: 'Pieces that an order must have at least.',
  },
  orderMultiple: {
    label: 'order multiple',
    kind: 'count',
    integer: true,
    bounds: { from: 1, to: 1e6 },
    help: 'Only whole multiples of this many pieces are sold, such as a reel.',
  },
  leadTimeDays: {
    label: 'lead time',
    kind: 'count',
    integer: true,
    bounds: { from: 0, to: 3650 },
    help: 'Days from order to delivery.',
  },
  stock: {
    label: 'stock',
    kind: 'count',
    integer: true,
    bounds: { from: 0, to: MOST_PIECES },
    help: 'Pieces that the supplier has.',
  },
  staleAfterDays: {
    label: 'stale after',
    kind: 'count',
    integer: true,
    bounds: { from: 1, to: 3650 },
    help: 'Days after the last confirmation from which on a price counts as stale.',
  },
} as const satisfies Record<string, QuantityField>;

export const SUPPLIER_NAME = {
  key: 'name',
  label: 'name',
  required: true,
  maxLength: 120,
  fallback: null,
  synonyms: [],
} as const satisfies TextField;

export const SUPPLIER_NUMBER = {
  key: 'supplierNumber',
  label: 'supplier’s number',
  maxLength: 60,
  fallback: '',
  synonyms: [],
} as const satisfies TextField;

/** The most offers that are saved or confirmed at once: a supplier's whole list, pasted. */
export const MOST_OFFERS_SAVED = 5000;

/** The most breaks that an offer has. */
export const MOST_BREAKS = 20;
