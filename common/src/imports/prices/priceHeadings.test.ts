import { describe, expect, it } from 'vitest';
import { breakOfHeading } from './breakHeading.js';
import { priceColumnProposer } from './priceHeadings.js';

describe('breakOfHeading', () => {
  it.each([
    ['1', 1],
    ['10+', 10],
    ['10 pcs', 10],
    ['≥ 100', 100],
    ['10–99', 10],
    ['1 bis 9', 1],
    ['ab 100', 100],
    ['à partir de 25', 25],
    ['dès 25 pièces', 25],
    ['Preis 1000', 1000],
    ['Preis ab 1.000 Stück', 1000],
    ['price @ 2,500', 2500],
    ["1'000", 1000],
    ['2 500 Stk.', 2500],
    ['Qty 5k', 5000],
  ])('reads “%s” as the quantity %d', (heading, quantity) => {
    expect(breakOfHeading(heading)).toBe(quantity);
  });

  it.each([
    '',
    'price',
    'price per 100',
    'Preis/1000',
    'break 3',
    'address 2',
    '< 100',
    '1 10',
    '0',
    '1.5',
    'KW 12',
  ])('finds no quantity in “%s”', (heading) => {
    expect(breakOfHeading(heading)).toBeNull();
  });
});

describe('priceColumnProposer', () => {
  const propose = priceColumnProposer();

  it.each([
    ['Hersteller', { field: 'manufacturer' }],
    ['Manufacturer Part Number', { field: 'partNumber' }],
    ['Bestellnr.', { field: 'supplierNumber' }],
    ['fournisseur', { field: 'supplier' }],
    ['Mindestbestellmenge', { field: 'minimumOrderQuantity' }],
    ['Lieferzeit (Wochen)', { field: 'leadTimeDays', unit: 'weeks', unitAssumed: false }],
    ['lead time days', { field: 'leadTimeDays', unit: 'days', unitAssumed: false }],
    ['Lieferzeit', { field: 'leadTimeDays', unit: 'days', unitAssumed: true }],
    ['Unit price [USD]', { field: 'unitPrice', form: 'value', unit: 'USD' }],
    ['Preis in EUR', { field: 'unitPrice', form: 'value', unit: 'EUR' }],
    ['Preis ab 100 [EUR]', { field: 'unitPrice', form: 'break', quantity: 100, unit: 'EUR' }],
    ['price (100+)', { field: 'unitPrice', form: 'break', quantity: 100, unit: null }],
    ['25 € ', { field: 'unitPrice', form: 'break', quantity: 25, unit: 'EUR' }],
    ['Menge', { field: 'quantity' }],
    ['valable jusqu’au', { field: 'validUntil' }],
  ])('takes “%s” for %o', (heading, expected) => {
    expect(propose(heading)).toMatchObject(expected);
  });

  it.each(['Lagerort', 'Preis je 100', 'remark', 'Price break 1'])('leaves “%s” out', (heading) => {
    expect(propose(heading)).toBeNull();
  });
});
