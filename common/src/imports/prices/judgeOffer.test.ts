import { describe, expect, it } from 'vitest';
import type { OfferTerms } from '../../prices/index.js';
import type { ColumnMapping } from '../columnMapping.js';
import { checkPriceMapping } from './checkPriceMapping.js';
import { judgeOffer } from './judgeOffer.js';
import { priceColumnProposer } from './priceHeadings.js';
import { priceRowReader } from './priceRow.js';

const TODAY = '2026-12-01';
const WHOLE = { supplier: 'Larkholm Components', currency: 'EUR' };
const WIDE = [
  'Hersteller',
  'Herstellernummer',
  '1',
  '10+',
  'ab 100',
  'MOQ',
  'VPE',
  'Lieferzeit (Wochen)',
  'gültig bis',
];
const LONG = ['maker', 'mpn', 'qty', 'unit price', 'ccy', 'lead time [days]'];

function mappingOf(headings: readonly string[]): ColumnMapping[] {
  const propose = priceColumnProposer();
  return headings.flatMap((heading, column) => {
    const proposed = propose(heading);
    if (proposed === null) return [];
    const { field, form, unit, frequency, quantity, origin } = proposed;
    return [{ column, field, form, unit, frequency, quantity, origin }];
  });
}

function judge(headings: string[], rows: string[][], existing: OfferTerms | null = null, wholeList = WHOLE) {
  const mapping = mappingOf(headings);
  expect(checkPriceMapping(mapping, headings.length, wholeList)).toEqual([]);
  const reader = priceRowReader(mapping, 'comma', wholeList);
  const lines = rows.map((cells, index) => ({ line: index + 2, cells, row: reader.read(cells) }));
  return judgeOffer(reader, lines, existing, TODAY);
}

const ROW = ['Vireo', 'VR-1', '4,20', '3,9', '3,10', '1.000', '10 Stk', '6', '31.12.2027'];
const STANDING = judge(WIDE, [ROW]).terms!;

describe('judgeOffer in the wide form', () => {
  it('makes an offer of one row, with weeks as days and a price for each quantity', () => {
    const { terms, lines } = judge(WIDE, [ROW]);
    expect(terms).toEqual({
      supplierNumber: '',
      currency: 'EUR',
      breaks: [
        { minimumQuantity: 1, unitPrice: '4.2000' },
        { minimumQuantity: 10, unitPrice: '3.9000' },
        { minimumQuantity: 100, unitPrice: '3.1000' },
      ],
      minimumOrderQuantity: 1000,
      orderMultiple: 10,
      leadTimeDays: 42,
      stock: null,
      validFrom: TODAY,
      validUntil: '2027-12-31',
    });
    expect(lines).toMatchObject([{ state: 'new', doubts: [], errors: [] }]);
    expect(lines[0].changes).toContainEqual({ field: 'breaks.10', old: null, new: '3.9000' });
  });

  it('leaves an offer that it read before unchanged', () => {
    expect(judge(WIDE, [ROW], STANDING).lines).toMatchObject([{ state: 'unchanged', changes: [] }]);
  });

  it('names what changes, drops a quantity whose cell has a dash, and keeps what the list leaves open', () => {
    const cells = ['Vireo', 'VR-1', '4,20', '–', '3', '', '', '', ''];
    const { terms, lines } = judge(WIDE, [cells], { ...STANDING, stock: 7 });
    expect(lines).toMatchObject([
      {
        state: 'changed',
        changes: [
          { field: 'breaks.10', old: '3.9000', new: null },
          { field: 'breaks.100', old: '3.1000', new: '3.0000' },
        ],
      },
    ]);
    expect(terms).toMatchObject({ stock: 7, leadTimeDays: 42, minimumOrderQuantity: 1000 });
  });

  it('doubts a price that is ten times the one before', () => {
    const cells = ['Vireo', 'VR-1', '42,0', '39', '31', '', '', '', ''];
    expect(judge(WIDE, [cells], STANDING).lines).toMatchObject([
      {
        state: 'doubtful',
        doubts: [
          { code: 'price-slip', field: 'breaks.1', message: expect.stringContaining('4.2000') },
          { code: 'price-slip', field: 'breaks.10' },
          { code: 'price-slip', field: 'breaks.100' },
        ],
      },
    ]);
  });

  it.each([
    [2, '1.234,56', /digits in groups/],
    [2, '-4', /above 0/],
    [2, '€ 4,20', /without a currency/],
    [4, '4,30', /not more than the 3\.90/],
    [5, '0', /a value from 1/],
    [7, '6-8', /a whole number of days or weeks/],
    [8, '2026-11-30', /a day not before 2026-12-01/],
    [8, '03/04/2027', /write it as 2027-04-03/],
  ])('refuses the cell of column %d that says %s', (column, cell, why) => {
    const cells = ROW.with(column, cell);
    const { terms, lines } = judge(WIDE, [cells]);
    expect(terms).toBeNull();
    expect(lines).toMatchObject([{ state: 'refused', errors: [{ column, value: cell }] }]);
    expect(lines[0].errors[0].why).toMatch(why);
  });

  it('takes a row that stands there twice once, and refuses the second of two that differ', () => {
    expect(judge(WIDE, [ROW, ROW]).lines).toMatchObject([
      { state: 'new' },
      { state: 'unchanged', doubts: [{ code: 'repeated' }] },
    ]);
    expect(judge(WIDE, [ROW, ROW.with(2, '5')]).lines).toMatchObject([
      { state: 'new' },
      { state: 'refused', errors: [{ column: 1, why: 'stands on line 2 too, with other values' }] },
    ]);
  });
});

describe('judgeOffer in the long form', () => {
  const rows = [
    ['Vireo', 'VR-1', '100', '3,10', 'EUR', '14'],
    ['Vireo', 'VR-1', '1', '4,20', 'EUR', '14'],
  ];

  it('makes one offer of its rows, whatever their order', () => {
    const { terms, lines } = judge(LONG, rows);
    expect(terms).toMatchObject({
      leadTimeDays: 14,
      breaks: [
        { minimumQuantity: 1, unitPrice: '4.2000' },
        { minimumQuantity: 100, unitPrice: '3.1000' },
      ],
    });
    expect(lines.map(({ state }) => state)).toEqual(['new', 'new']);
  });

  it('shows each change at the row that makes it', () => {
    const existing = judge(LONG, rows).terms;
    const { lines } = judge(LONG, [rows[0], rows[1].with(3, '4,10')], existing);
    expect(lines).toMatchObject([
      { state: 'unchanged', changes: [] },
      { state: 'changed', changes: [{ field: 'breaks.1', old: '4.2000', new: '4.1000' }] },
    ]);
  });

  it('refuses all rows of an offer where one is wrong, naming it', () => {
    expect(judge(LONG, [rows[0], rows[1].with(3, 'n/a')])).toMatchObject({
      terms: null,
      lines: [
        { state: 'refused', errors: [{ why: 'line 3 of the same offer is refused' }] },
        { state: 'refused', errors: [{ column: 3, value: 'n/a' }] },
      ],
    });
  });

  it.each([
    ['two currencies', rows[1].with(4, 'USD'), 4, 'line 2 of the same offer says EUR'],
    ['two prices for a quantity', rows[0].with(3, '3'), 3, 'line 2 has another price from 100 on'],
    ['a price without its quantity', rows[1].with(2, ''), 2, 'minimum quantity: a whole number'],
  ])('refuses %s', (_, second, column, why) => {
    const { lines } = judge(LONG, [rows[0], second]);
    expect(lines[1].errors).toMatchObject([{ column, why: expect.stringContaining(why) }]);
  });
});

describe('checkPriceMapping', () => {
  const wide = mappingOf(WIDE);
  const [maker, number, one] = wide;

  it.each([
    ['columns', [maker, one], WHOLE],
    ['wholeList.supplier', wide, { ...WHOLE, supplier: null }],
    ['wholeList.currency', wide, { ...WHOLE, currency: null }],
    ['columns.2.quantity', [maker, number, { ...one, quantity: null }], WHOLE],
    ['columns.2.unit', [maker, number, { ...one, unit: 'XYZ' }], WHOLE],
    ['columns.2.form', [maker, number, { ...one, form: 'spot' as const }], WHOLE],
    ['columns.3.field', [maker, number, one, { ...one, column: 5 }], WHOLE],
    ['columns', [...wide, { ...one, column: 9, form: 'value' as const, quantity: null }], WHOLE],
    [
      'columns',
      [...wide, { ...one, column: 9, field: 'quantity', form: 'value' as const, quantity: null }],
      WHOLE,
    ],
    [
      'columns',
      [maker, number, { ...one, unit: 'EUR' }, { ...one, column: 3, quantity: 10, unit: 'USD' }],
      WHOLE,
    ],
  ])('refuses a mapping at %s', (field, mapping, wholeList) => {
    const errors = checkPriceMapping(mapping, 10, wholeList);
    expect(errors.map((error) => error.field)).toContain(field);
  });
});
