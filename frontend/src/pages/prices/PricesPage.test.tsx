import type { Role } from '@roothertz/common/access';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { provideGlobalGridOptions } from 'ag-grid-community';
import { describe, expect, it } from 'vitest';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { offerOf, otherRow, priceRow } from '../../test/prices';
import { renderApp } from '../../test/renderApp';

/** A computed style goes through the rules of grid and controls each time, which takes seconds; none matters here. */
window.getComputedStyle = (element) => (element as HTMLElement).style;

/** Nothing is laid out here, and the grid would draw only the columns for which it finds room. */
provideGlobalGridOptions({ suppressColumnVirtualisation: true });

const AT = '2026-11-30T10:00:00.000Z';
const COUNTS = { offers: 2, stale: 1, expiring: 0, expired: 0, missing: 5, usedInConditions: 1 };

async function open(role: Role, answers: Parameters<typeof fakeServer>[0] = {}, address = '/prices') {
  const asked = fakeServer({
    'GET /api/auth/me': () => json(sessionOf(role)),
    'GET /api/prices': () => json({ items: [priceRow({}, ['River geophone']), otherRow()], total: 2 }),
    'GET /api/prices/counts': () => json(COUNTS),
    'GET /api/prices/settings': () => json({ currency: 'EUR', staleAfterDays: 90 }),
    'GET /api/suppliers': () =>
      json({ items: [{ id: '3', name: 'Brook & Weir', currency: 'GBP' }], total: 1 }),
    ...answers,
  });
  const router = renderApp(address);
  await screen.findByRole('region', { name: 'Offers' });
  await cell(0, 'price:1');
  const bodies = (route: string) => asked.filter((one) => one.route === route).map(({ body }) => body);
  return { asked, router, bodies };
}

async function cell(row: number, column: string): Promise<HTMLElement> {
  return waitFor(() => {
    const found = document.querySelector<HTMLElement>(`[row-index="${row}"] [col-id="${column}"]`);
    if (!found) throw new Error(`no cell ${column} in row ${row}`);
    return found;
  });
}

async function paste(row: number, column: string, text: string) {
  const target = await cell(row, column);
  await userEvent.click(target);
  fireEvent.paste(target, { clipboardData: { getData: () => text } });
}

const save = () => screen.getByRole('button', { name: /^Save/ });

describe('the prices page', () => {
  it('takes a pasted rectangle, has the wrong cell mended and saves all at once', async () => {
    const { bodies } = await open('purchasing', {
      'PUT /api/prices': () => json({ items: [offerOf({ id: '21' })], total: 1 }),
    });
    await paste(0, 'price:1', '4.10\t\n4,00');
    expect(await cell(1, 'price:1')).toHaveTextContent(/4,00, refused: unit price: digits in groups/);
    expect(screen.getByText(/1 cell has to be mended before saving: LQ-12/)).toBeInTheDocument();
    expect(save()).toBeDisabled();
    await userEvent.click(screen.getByRole('button', { name: 'Read the comma as decimal mark in 1' }));
    await userEvent.click(save());
    await waitFor(() => expect(bodies('PUT /api/prices')).toHaveLength(1));
    expect(bodies('PUT /api/prices')[0]).toEqual({
      rows: [
        { id: '11', version: 2, breaks: [{ minimumQuantity: 1, unitPrice: '4.1000' }, offerOf().breaks[1]] },
        { id: '12', version: 1, breaks: [{ minimumQuantity: 1, unitPrice: '4.0000' }, offerOf().breaks[1]] },
      ],
    });
    await waitFor(() => expect(save()).toHaveTextContent(/^Save$/));
  });

  it('undoes a paste as one step and brings it back', async () => {
    await open('purchasing');
    await paste(0, 'price:1', '4.10\n4.00');
    expect(save()).toHaveTextContent('Save 2 changes');
    const target = await cell(0, 'price:1');
    fireEvent.keyDown(target, { key: 'z', ctrlKey: true });
    await waitFor(async () => expect(await cell(1, 'price:1')).toHaveTextContent(/^4\.20$/));
    expect(save()).toBeDisabled();
    fireEvent.keyDown(target, { key: 'z', ctrlKey: true, shiftKey: true });
    await waitFor(() => expect(save()).toHaveTextContent('Save 2 changes'));
  });

  it('loses nothing where somebody else was quicker, and lets mine or theirs be taken', async () => {
    let isChanged = false;
    const theirs = {
      id: '20',
      version: 3,
      stock: 5,
      openedAt: AT,
      openedBy: { id: '9', name: 'Tobias Fenn' },
    };
    const { bodies } = await open('purchasing', {
      'GET /api/prices': () => json({ items: [priceRow(isChanged ? theirs : {}), otherRow()], total: 2 }),
      'GET /api/parts/41/offers': () =>
        json({ current: [offerOf(theirs)], history: [offerOf({ closedAt: AT })] }),
      'PUT /api/prices': (body) => {
        if (isChanged) return json({ items: [offerOf({ id: '21' })], total: 1 });
        isChanged = true;
        expect(body).toMatchObject({ rows: [{ id: '11', version: 2, stock: 8 }] });
        const errors = [{ field: 'rows[0].version', message: 'somebody has changed this offer meanwhile' }];
        return problem(409, 'offer.stale', { errors });
      },
    });
    await paste(0, 'stock', '8');
    await userEvent.click(save());
    expect(
      await screen.findByText(/Tobias Fenn has changed the offer for VR-1108 meanwhile/),
    ).toBeInTheDocument();
    expect(await cell(0, 'stock')).toHaveTextContent('8, not saved yet');
    const table = screen.getByRole('table', { name: 'Theirs and yours for VR-1108' });
    expect(within(table).getByRole('row', { name: 'stock none 5 8' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Keep mine' }));
    await waitFor(() => expect(document.activeElement).toHaveAttribute('role', 'gridcell'));
    await userEvent.keyboard('{Control>}s{/Control}');
    await waitFor(() => expect(bodies('PUT /api/prices')).toHaveLength(2));
    expect(bodies('PUT /api/prices')[1]).toEqual({ rows: [{ id: '20', version: 3, stock: 8 }] });
  });

  it('begins a new offer in its supplier’s cell, in the currency of the supplier’s latest offer', async () => {
    const { bodies } = await open('purchasing', {
      'PUT /api/prices': () => json({ items: [offerOf({ id: '21' })], total: 1 }),
    });
    await userEvent.click(await cell(1, 'price:1'));
    await userEvent.click(screen.getByRole('button', { name: 'New offer for LQ-12' }));
    await waitFor(async () => expect(within(await cell(0, 'supplier')).getByRole('combobox')).toHaveFocus());
    await userEvent.keyboard('Brook & Weir{Enter}');
    expect(await cell(0, 'currency')).toHaveTextContent(/^GBP$/);
    await paste(0, 'supplierNumber', 'BW-9');
    await paste(0, 'price:1', '2.5');
    fireEvent.keyDown(await cell(0, 'price:1'), { key: 's', ctrlKey: true });
    await waitFor(() => expect(bodies('PUT /api/prices')).toHaveLength(1));
    expect(bodies('PUT /api/prices')[0]).toMatchObject({
      rows: [{ partId: '42', supplierId: '3', supplierNumber: 'BW-9', currency: 'GBP' }],
    });
  });

  it('loads the rows that a longer rectangle covers, and pastes into them', async () => {
    const last = (n: number) => priceRow({ id: `${n}`, supplierNumber: `N-${n}` });
    const { asked } = await open('purchasing', {
      'GET /api/prices': (_body, { searchParams }) =>
        json({ items: searchParams.get('offset') === '0' ? [priceRow(), otherRow()] : [last(13)], total: 3 }),
    });
    await paste(1, 'stock', '7\n8\n9');
    await waitFor(async () =>
      expect(await cell(2, 'stock')).toHaveTextContent(/^8, refused: .* 1 row longer/),
    );
    expect(await cell(1, 'stock')).toHaveTextContent('7, not saved yet');
    const offsets = asked
      .filter(({ route }) => route === 'GET /api/prices')
      .map(({ url }) => url.searchParams.get('offset'));
    expect(new Set(offsets)).toEqual(new Set(['0', '2']));
  });

  it('asks before it is left with unsaved changes', async () => {
    const { router } = await open('purchasing');
    await paste(0, 'stock', '8');
    await userEvent.click(screen.getByRole('link', { name: 'Parts' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Stay here' }));
    expect(router.state.location.pathname).toBe('/prices');
  });

  it('confirms an offer in one click and takes it back', async () => {
    const { bodies } = await open('purchasing', {
      'POST /api/offers/confirm': () => json({ items: [offerOf({ states: [] })], total: 1 }),
      'POST /api/offers/confirm/undo': () => json({ items: [offerOf()], total: 1 }),
    });
    await userEvent.click(within(await cell(0, 'confirm')).getByRole('button'));
    expect(await screen.findByText('1 offer is confirmed as still valid')).toBeInTheDocument();
    expect(bodies('POST /api/offers/confirm')).toEqual([{ ids: ['11'] }]);
    const notice = screen.getByText('1 offer is confirmed as still valid').closest('[role="alert"]')!;
    await userEvent.click(within(notice.parentElement!).getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(bodies('POST /api/offers/confirm/undo')).toEqual([{ ids: ['11'] }]));
  });

  it('keeps the team’s exchange rates, and says which can’t be read', async () => {
    const rates = { currency: 'EUR', items: [{ currency: 'USD', rate: '0.91200000', dated: '2026-11-01' }] };
    const { bodies } = await open('purchasing', {
      'GET /api/prices/rates': () => json({ ...rates, missing: ['CHF'] }),
      'PUT /api/prices/rates': () => json({ ...rates, missing: [] }),
    });
    await userEvent.click(screen.getByRole('button', { name: 'Currency and rates' }));
    expect(await screen.findByText(/Offers in CHF don’t count/)).toBeInTheDocument();
    await userEvent.type(screen.getByLabelText('1 CHF ='), '1,07');
    expect(screen.getByText(/another decimal mark can be misread/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Save the rates' })).toBeDisabled();
    await userEvent.click(screen.getByRole('button', { name: 'Take it as 1.07' }));
    expect(screen.getByLabelText('1 CHF =')).toHaveValue('1.07');
    await userEvent.click(screen.getByRole('button', { name: 'Save the rates' }));
    await waitFor(() =>
      expect(bodies('PUT /api/prices/rates')).toEqual([{ rates: [{ currency: 'CHF', rate: '1.07' }] }]),
    );
  });

  it('narrows to what calls for a look, which the address keeps', async () => {
    const { asked, router } = await open('purchasing');
    await userEvent.click(screen.getByRole('button', { name: '5 without a price' }));
    await waitFor(() => expect(router.state.location.search).toBe('?state=missing&library=team'));
    await userEvent.click(screen.getByRole('button', { name: '1 used in saved conditions' }));
    const last = () => asked.filter(({ route }) => route === 'GET /api/prices').at(-1)!.url.searchParams;
    await waitFor(() => expect(last().get('usedInConditions')).toBe('true'));
    expect(last().get('state')).toBe('missing');
  });

  it('shows an engineer everything and lets nothing be changed', async () => {
    await open('engineer');
    await paste(0, 'price:1', '1');
    expect(await cell(0, 'price:1')).toHaveTextContent(/^4\.20$/);
    await userEvent.dblClick(await cell(0, 'price:1'));
    expect(within(await cell(0, 'price:1')).queryByRole('textbox')).not.toBeInTheDocument();
    for (const name of [/^Save/, /^Confirm/, /^New offer/, /^Close/])
      expect(screen.queryByRole('button', { name })).not.toBeInTheDocument();
  });
});
