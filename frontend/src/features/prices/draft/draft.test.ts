import { describe, expect, it } from 'vitest';
import { ApiProblem } from '../../../api/problem';
import { offerOf, otherRow, priceRow, rowWithout } from '../../../test/prices';
import { type CellKey, toGridRow } from './cells';
import { readClipboard } from './clipboard';
import { type Draft, EMPTY_DRAFT, rebased, withAddedRow, withEdits } from './draft';
import { NO_HISTORY, stepHistory } from './history';
import { pasteRectangle } from './pasteRectangle';
import { differences, overrunOf } from './overruns';
import { plainRow, shownRows, shownText } from './shownRows';
import { savedRefusals } from './savedRefusals';

const [first, second, without] = [priceRow(), otherRow(), rowWithout()].map(toGridRow);
const COLUMNS = ['supplier', 'supplierNumber', 'currency', 'price:1', 'price:10', 'price:100', 'state'];
const context = {
  suppliers: [{ id: '3', name: 'Brook & Weir', currency: 'GBP' }],
  currency: 'EUR',
  today: '2026-12-01',
};

const edit = (cell: CellKey, text: string, row = first, draft: Draft = EMPTY_DRAFT) =>
  withEdits(draft, [{ row, cell, text }]);
const shown = (draft: Draft) => shownRows([first, second, without].map(plainRow), draft, context);
const errorsOf = (draft: Draft) =>
  shown(draft).flatMap(({ part, errors }) =>
    [...errors].map(([column, message]) => [part.partNumber, column, message]),
  );
const bodies = (draft: Draft) => shown(draft).flatMap(({ body }) => body ?? []);

describe('an edited cell', () => {
  it('is sent alone, with all prices where one of them changed', () => {
    expect(bodies(edit('leadTimeDays', '14'))).toEqual([{ id: '11', version: 2, leadTimeDays: 14 }]);
    expect(bodies(edit('price:10', '3.9'))).toEqual([
      {
        id: '11',
        version: 2,
        breaks: [
          { minimumQuantity: 1, unitPrice: '4.2000' },
          { minimumQuantity: 10, unitPrice: '3.9000' },
          { minimumQuantity: 100, unitPrice: '3.1000' },
        ],
      },
    ]);
    expect(bodies(edit('price:100', ''))).toMatchObject([{ breaks: [{ minimumQuantity: 1 }] }]);
  });

  it('is no change where it says the same', () => {
    expect(edit('price:1', ' 4.2 ').changes.size).toBe(0);
    expect(edit('currency', 'eur').changes.size).toBe(0);
    const there = edit('stock', '5');
    expect(edit('stock', '', first, there).changes.size).toBe(0);
  });

  it.each<[CellKey, string, RegExp]>([
    ['price:1', '-2', /above 0/],
    ['price:1', '0', /above 0/],
    ['price:1', '1.234,56', /write it as 1234\.56/],
    ['price:1', '1,234.56', /write it as 1234\.56/],
    ['price:1', '4.20 USD', /one currency for all its prices/],
    ['price:1', '€4.20', /one currency for all its prices/],
    ['price:10', '9.99', /not more than the 4\.20 of the break before/],
    ['currency', 'EURO', /ISO 4217/],
    ['minimumOrderQuantity', '1,000', /without groups/],
    ['stock', '-3', /stock/],
    ['validUntil', '2026-11-30', /past/],
    ['validUntil', '31.12.2026', /such as 2026-12-31/],
    ['validFrom', '', /such as 2026-12-31/],
  ])('is refused at %s: “%s”', (cell, text, reason) => {
    const draft = edit(cell, text);
    expect(errorsOf(draft)).toEqual([['VR-1108', cell, expect.stringMatching(reason)]]);
    expect(bodies(draft)).toEqual([]);
  });
});

describe('a part without a price', () => {
  it('gets an offer that is sent whole, and says what it lacks', () => {
    const begun = edit('price:1', '2', without);
    expect(errorsOf(begun).map(([, column]) => column)).toEqual(['supplier']);
    const named = edit('supplier', 'brook & WEIR', without, begun);
    expect(bodies(edit('currency', 'USD', without, named))).toEqual([
      expect.objectContaining({
        partId: '43',
        supplierId: '3',
        currency: 'USD',
        breaks: [{ minimumQuantity: 1, unitPrice: '2.0000' }],
        minimumOrderQuantity: 1,
        validFrom: '2026-12-01',
        validUntil: null,
      }),
    ]);
  });

  it('is in the currency of the supplier’s latest offer, or the team’s, until another is typed', () => {
    const currency = (draft: Draft) => shownText(shown(draft)[2], 'currency');
    const begun = edit('price:1', '2', without);
    expect([currency(EMPTY_DRAFT), currency(begun)]).toEqual(['', 'EUR']);
    const named = edit('supplier', 'Brook & Weir', without, begun);
    expect([currency(named), bodies(named)[0].currency]).toEqual(['GBP', 'GBP']);
    expect(currency(edit('currency', 'USD', without, named))).toBe('USD');
  });

  it('or another one in a row of its own', () => {
    const rows = shown(withAddedRow(EMPTY_DRAFT, first));
    expect(rows.map(({ part, offer }) => [part.partNumber, offer?.id])).toEqual([
      ['VR-1108', undefined],
      ['VR-1108', '11'],
      ['LQ-12', '12'],
      ['SB-7', undefined],
    ]);
  });
});

describe('a pasted rectangle', () => {
  it('is read as spreadsheets write it', () => {
    expect(readClipboard('1\t"a\tb ""c"""\r\n\t2\r\n')).toEqual([
      ['1', 'a\tb "c"'],
      ['', '2'],
    ]);
    expect(readClipboard('7')).toEqual([['7']]);
  });

  it('fills cells right and down, and keeps what is wrong for mending', () => {
    const target = { rows: [first, second, without], columns: COLUMNS.slice(3) };
    const draft = pasteRectangle(EMPTY_DRAFT, target, [
      ['4.10', '3.90', '3'],
      ['x', '', '2.50'],
    ]);
    expect(errorsOf(draft)).toEqual([
      ['LQ-12', 'price:1', expect.stringMatching(/a number such as 1234\.56/)],
    ]);
    expect(bodies(draft).map(({ id }) => id)).toEqual(['11']);
    expect([...draft.changes.get(second.key)!.cells]).toEqual([
      ['price:1', 'x'],
      ['price:100', '2.50'],
    ]);
  });

  it('larger than the grid is refused at the cells where it ends', () => {
    const target = { rows: [second, without], columns: COLUMNS.slice(4) };
    const draft = pasteRectangle(EMPTY_DRAFT, target, [
      ['3', '2', '', '9', '9'],
      ['1', '1', 'missing'],
      ['0.5'],
    ]);
    expect(draft.refusals.map(({ key, column, message }) => [key, column, message])).toEqual([
      [second.key, 'state', expect.stringMatching(/2 columns wider/)],
      [without.key, 'price:10', expect.stringMatching(/1 row longer/)],
    ]);
    expect(draft.changes.get(second.key)!.cells.get('price:10')).toBe('3');
  });

  it('leaves the supplier of an offer that stands', () => {
    const target = { rows: [first], columns: COLUMNS };
    const draft = pasteRectangle(EMPTY_DRAFT, target, [['Somebody', 'BW-9']]);
    expect(errorsOf(draft)).toEqual([
      ['VR-1108', 'supplier', '“Somebody” can’t be pasted here: this can’t be edited'],
    ]);
    expect(pasteRectangle(EMPTY_DRAFT, target, [['Brook & Weir', 'BW-9']]).refusals).toEqual([]);
  });
});

it('undoes and redoes whole steps', () => {
  const steps = [edit('stock', '1'), edit('stock', '2')];
  let history = NO_HISTORY;
  for (const draft of steps) history = stepHistory(history, { type: 'change', to: () => draft });
  history = stepHistory(history, { type: 'undo' });
  expect(history.present).toBe(steps[0]);
  history = stepHistory(history, { type: 'redo' });
  expect(history.present).toBe(steps[1]);
  history = stepHistory(stepHistory(history, { type: 'undo' }), { type: 'undo' });
  expect(history.present).toBe(EMPTY_DRAFT);
  expect(stepHistory(history, { type: 'undo' })).toBe(history);
});

describe('an offer that somebody else has changed', () => {
  const theirs = toGridRow(priceRow({ id: '20', version: 3, leadTimeDays: 7 }));

  it('is shown as such with what was typed, and taken as the new ground where mine is kept', () => {
    const draft = edit('stock', '9');
    const [row] = shownRows([plainRow(theirs)], draft, context);
    expect([row.overrun, row.offer?.leadTimeDays, row.change?.cells.get('stock')]).toEqual([
      'changed',
      7,
      '9',
    ]);
    expect(differences(row, row.change!)).toEqual([
      { cell: 'leadTimeDays', was: '42', theirs: '7', mine: '42' },
      { cell: 'stock', was: '', theirs: '', mine: '9' },
    ]);
    const [mine] = shownRows([plainRow(theirs)], rebased(draft, theirs), context);
    expect([mine.overrun, mine.body]).toEqual([null, { id: '20', version: 3, stock: 9 }]);
  });

  it('stays in sight while the list no longer holds it', () => {
    expect(shownRows([], edit('stock', '9'), context)).toHaveLength(1);
  });

  it('is followed to what it has become', () => {
    const at = '2026-11-30T10:00:00.000Z';
    const before = offerOf({ closedAt: at });
    const after = offerOf({ id: '20', version: 3, openedAt: at });
    const other = offerOf({ id: '21', version: 3, openedAt: at, supplier: { id: '4', name: 'Tidewrack' } });
    const found = overrunOf('11', { current: [other, after], history: [before] });
    expect(found).toEqual({ offer: after, isClosed: false });
    expect(overrunOf('20', { current: [after], history: [before] })).toBeNull();
    expect(overrunOf('11', { current: [], history: [before] })).toEqual({ offer: before, isClosed: true });
  });

  it('can be opened again with what was typed where it was closed', () => {
    const closed = offerOf({
      closedAt: '2026-11-30T10:00:00.000Z',
      closedBy: { id: '9', name: 'Tobias Fenn' },
    });
    const overruns = new Map([[first.key, { offer: closed, isClosed: true }]]);
    const draft = { ...edit('stock', '9'), overruns };
    const [row] = shown(draft);
    expect([row.overrun, row.offer?.closedBy?.name]).toEqual(['closed', 'Tobias Fenn']);
    const again = rebased(draft, row);
    expect(again.overruns.size).toBe(0);
    expect(bodies(again)).toMatchObject([
      { partId: '41', supplierId: '3', supplierNumber: 'BW-1', currency: 'EUR', stock: 9, breaks: [{}, {}] },
    ]);
  });
});

it('puts what the server refuses at the cells that it is about', () => {
  const sent = [
    { row: first, body: { id: '11', version: 1, stock: 2 } },
    { row: second, body: { id: '12', version: 1, breaks: offerOf().breaks } },
  ];
  const errors = ['rows[1].breaks[1].unitPrice', 'rows[0].version', 'rows[0].stock', 'rows'].map((field) => ({
    field,
    message: field,
  }));
  expect(
    savedRefusals(sent, new ApiProblem(409, 'offer.stale', '', errors)).map(({ key, column }) => [
      key,
      column,
    ]),
  ).toEqual([
    [second.key, 'price:100'],
    [first.key, 'part'],
    [first.key, 'stock'],
  ]);
});
