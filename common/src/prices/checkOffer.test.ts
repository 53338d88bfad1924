import { describe, expect, it } from 'vitest';
import { type CheckedOffer, checkOffer, type PriceBreak } from './index.js';

const TODAY = '2026-12-01';
const valid: CheckedOffer = {
  currency: 'EUR',
  breaks: [
    { minimumQuantity: 1, unitPrice: '4.20' },
    { minimumQuantity: 100, unitPrice: '3.1' },
    { minimumQuantity: 1000, unitPrice: '3.1000' },
  ],
  minimumOrderQuantity: 5,
  orderMultiple: 5,
  leadTimeDays: 42,
  stock: 0,
  validFrom: '2026-03-01',
  validUntil: '2026-12-01',
};

const errorsOf = (changes: Partial<CheckedOffer>) => checkOffer({ ...valid, ...changes }, TODAY);
const fieldsOf = (changes: Partial<CheckedOffer>) => errorsOf(changes).map(({ field }) => field);
const breaks = (...list: [number, string][]): PriceBreak[] =>
  list.map(([minimumQuantity, unitPrice]) => ({ minimumQuantity, unitPrice }));

describe('checkOffer', () => {
  it('takes an offer in order', () => {
    expect(checkOffer(valid, TODAY)).toEqual([]);
    expect(errorsOf({ leadTimeDays: null, stock: null, validUntil: null })).toEqual([]);
  });

  it.each([
    ['currency', { currency: 'EURO' }],
    ['currency', { currency: 'eur' }],
    ['breaks', { breaks: [] }],
    ['breaks', { breaks: Array.from({ length: 21 }, (_, n) => breaks([n + 1, '1'])[0]) }],
    ['breaks[0].unitPrice', { breaks: breaks([1, '0']) }],
    ['breaks[0].unitPrice', { breaks: breaks([1, '-1.20']) }],
    ['breaks[0].minimumQuantity', { breaks: breaks([0, '1']) }],
    ['breaks[0].minimumQuantity', { breaks: breaks([1.5, '1']) }],
    ['breaks[1].minimumQuantity', { breaks: breaks([100, '2'], [10, '1']) }],
    ['breaks[1].minimumQuantity', { breaks: breaks([10, '2'], [10, '1']) }],
    ['breaks[2].unitPrice', { breaks: breaks([1, '2'], [10, '1.5'], [100, '1.5001']) }],
    ['breaks[1].unitPrice', { breaks: breaks([1, '9.5'], [10, '10.5']) }],
    ['minimumOrderQuantity', { minimumOrderQuantity: 0 }],
    ['orderMultiple', { orderMultiple: 2.5 }],
    ['leadTimeDays', { leadTimeDays: -1 }],
    ['stock', { stock: NaN }],
    ['validFrom', { validFrom: '2026-02-30' }],
    ['validFrom', { validFrom: '1.3.2026' }],
    ['validUntil', { validUntil: '2026-02-28' }],
    ['validUntil', { validUntil: '2026-11-30' }],
    ['validUntil', { validUntil: 'soon' }],
  ] satisfies [string, Partial<CheckedOffer>][])('refuses at %s: %j', (field, changes) => {
    expect(fieldsOf(changes)).toEqual([field]);
  });

  it('names every fault of an offer at once', () => {
    const faults = { breaks: breaks([1, 'x'], [1, '-2']), stock: -1, validUntil: '2020-01-01' };
    expect(fieldsOf(faults)).toEqual(['breaks[0].unitPrice', 'breaks[1].unitPrice', 'stock', 'validUntil']);
  });
});
