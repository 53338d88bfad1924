import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { Import } from '../../api/imports';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { CHANGED_ROW, importOf, PRICE_ROW, pricesOf, REFUSED_ROW } from '../../test/imports';
import { renderApp } from '../../test/renderApp';

const SESSION = { 'GET /api/auth/me': () => json(sessionOf('librarian')) };
const ROWS = {
  'GET /api/imports/5/rows': (_body: unknown, url: URL) => {
    const row = url.searchParams.get('state') === 'refused' ? REFUSED_ROW : CHANGED_ROW;
    return json({ items: [row], total: 1 });
  },
};

/** A server that keeps one import, whose mapping and state change as it is told. */
function keeps(first: Import) {
  let kept = first;
  const change = (changes: Partial<Import>) => json((kept = { ...kept, ...changes }));
  const asked = fakeServer({
    ...SESSION,
    ...ROWS,
    'GET /api/imports/5': () => json(kept),
    'PUT /api/imports/5/mapping': (body) =>
      change({
        mapping: (body as { columns: Import['mapping'] }).columns,
        counts: importOf().counts,
        state: 'checked',
      }),
    'POST /api/imports/5/apply': () =>
      change({
        state: 'applied',
        appliedAt: '2026-12-01T10:00:00.000Z',
        appliedBy: { id: '7', name: 'Ada Merrow' },
      }),
    'POST /api/imports/5/cancel': () => change({ state: 'cancelled', progress: null }),
  });
  return { asked, told: (route: string) => asked.filter((one) => one.route === route) };
}

describe('the page of an import', () => {
  it('shows facts, verdicts with old and new values, and the refused rows with their reasons', async () => {
    keeps(importOf());
    renderApp('/imports/5');
    expect(await screen.findByRole('heading', { name: 'op-amp-liste.csv' })).toBeInTheDocument();
    expect(screen.getByText('Holds').nextElementSibling).toHaveTextContent('op-amps');
    expect(screen.getByLabelText('header line')).toHaveValue('3');
    expect(screen.getByRole('tab', { name: '1 changed' })).toHaveAttribute('aria-selected', 'true');
    const panel = within(screen.getByRole('tabpanel'));
    expect((await panel.findByText(/voltage noise/)).textContent).toBe('voltage noise 1.1 1.15\u2009nV/√Hz');
    await userEvent.click(screen.getByRole('tab', { name: '1 refused' }));
    expect(await panel.findByText('a number was expected')).toBeInTheDocument();
    expect(panel.getByText('n.a.')).toBeInTheDocument();
    expect(screen.getByText('Nothing has changed yet. It can be undone afterwards.')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Download the 1 refused row' })).toHaveAttribute(
      'href',
      '/api/imports/5/refused.csv',
    );
  });

  it('has a new list checked by what is proposed', async () => {
    const { told } = keeps(importOf({ state: 'uploaded', mapping: null, counts: null }));
    renderApp('/imports/5');
    expect(await screen.findByRole('tab', { name: '1 changed' })).toBeInTheDocument();
    const [{ body }] = told('PUT /api/imports/5/mapping');
    expect((body as { columns: { field: string }[] }).columns.map(({ field }) => field)).toEqual([
      'manufacturer',
      'partNumber',
      'voltageNoise',
    ]);
  });

  it('has the rows checked again when a column becomes something else, and greys the old verdicts meanwhile', async () => {
    const { told } = keeps(importOf());
    renderApp('/imports/5');
    const verdicts = (await screen.findByRole('tablist', { name: 'Verdicts' })).parentElement!;
    expect(verdicts).toHaveAttribute('aria-busy', 'false');
    await userEvent.click(screen.getByLabelText('Bauform becomes'));
    await userEvent.click(await screen.findByTitle('package'));
    expect(verdicts).toHaveAttribute('aria-busy', 'true');
    expect(screen.getByRole('button', { name: 'Apply 1 row' })).toBeDisabled();
    await waitFor(() => expect(told('PUT /api/imports/5/mapping')).toHaveLength(1));
    expect(told('PUT /api/imports/5/mapping')[0].body).toMatchObject({
      columns: [{}, {}, {}, { column: 3, field: 'package' }],
    });
    await waitFor(() => expect(verdicts).toHaveAttribute('aria-busy', 'false'));
  });

  it('applies, and offers to undo', async () => {
    keeps(importOf());
    renderApp('/imports/5');
    await userEvent.click(await screen.findByRole('button', { name: 'Apply 1 row' }));
    expect(await screen.findByRole('button', { name: 'Undo this import' })).toBeInTheDocument();
    expect(screen.getByText(/^1 row applied by Ada Merrow/)).toBeInTheDocument();
    expect(screen.queryByLabelText('Bauform becomes')).not.toBeInTheDocument();
  });

  it('shows how far the work is, and cancels it', async () => {
    const progress = { done: 12_000, total: 100_000, rowsPerSecond: 8000.4, secondsLeft: 11 };
    keeps(importOf({ state: 'applying', progress }));
    renderApp('/imports/5');
    expect(
      await screen.findByText(/^12\s000 of 100\s000 rows · 8\s000 rows\/s · about 11 s left$/),
    ).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(await screen.findByText('Cancelled: the library is as it was before.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Apply 1 row' })).toBeEnabled();
  });

  it('says what to do after an interruption', async () => {
    keeps(
      importOf({ state: 'interrupted', failure: 'The server ended meanwhile: the library is as before.' }),
    );
    renderApp('/imports/5');
    expect(await screen.findByText(/The server ended meanwhile/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Apply 1 row again' })).toBeEnabled();
  });

  it('says that somebody was quicker, and shows what they said', async () => {
    const theirs = importOf({ version: 2, mapping: importOf().mapping!.slice(0, 2) });
    let answers = 0;
    fakeServer({
      ...SESSION,
      ...ROWS,
      'GET /api/imports/5': () => json((answers += 1) === 1 ? importOf() : theirs),
      'PUT /api/imports/5/mapping': () =>
        problem(409, 'import.stale', { detail: 'Somebody has said something else.' }),
    });
    renderApp('/imports/5');
    await userEvent.click(await screen.findByLabelText('Bauform becomes'));
    await userEvent.click(await screen.findByTitle('package'));
    expect(await screen.findByText('Somebody has said something else.')).toBeInTheDocument();
    const row = within(await screen.findByRole('row', { name: /^en/ }));
    expect(await row.findByText('left out')).toBeInTheDocument();
  });

  it('discards a list that isn’t applied', async () => {
    const asked = fakeServer({
      ...SESSION,
      ...ROWS,
      'GET /api/imports/5': () => json(importOf()),
      'GET /api/imports': () => json({ items: [], total: 0 }),
      'DELETE /api/imports/5': () => new Response(null, { status: 204 }),
    });
    renderApp('/imports/5');
    await userEvent.click(await screen.findByRole('button', { name: 'Discard' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Discard the list' }));
    expect(await screen.findByText(/Your team has imported no list yet/)).toBeInTheDocument();
    expect(asked.some(({ route }) => route === 'DELETE /api/imports/5')).toBe(true);
  });

  it('says that there is no such import', async () => {
    fakeServer({ ...SESSION, 'GET /api/imports/9': () => problem(404, 'import.not-found') });
    renderApp('/imports/9');
    expect(await screen.findByRole('heading', { name: 'There is no such import' })).toBeInTheDocument();
  });
});

describe('the page of a price list', () => {
  it('asks once for supplier and currency, has the rows checked by them, and shows old and new prices', async () => {
    let kept = pricesOf();
    const asked = fakeServer({
      'GET /api/auth/me': () => json(sessionOf('purchasing')),
      'GET /api/suppliers': () => json({ items: [{ id: '1', name: 'Larkholm Components' }], total: 1 }),
      'GET /api/imports/6': () => json(kept),
      'GET /api/imports/6/rows': () => json({ items: [PRICE_ROW], total: 1 }),
      'PUT /api/imports/6/mapping': (body) => {
        const { columns, wholeList } = body as { columns: Import['mapping']; wholeList: Import['wholeList'] };
        kept = {
          ...kept,
          mapping: columns,
          wholeList,
          version: 2,
          state: 'checked',
          counts: importOf().counts,
        };
        return json(kept);
      },
    });
    renderApp('/imports/6');
    expect(await screen.findByText(/supplier: a column is needed/)).toBeInTheDocument();
    expect(screen.getByLabelText('Quantity of ab 100')).toHaveValue('100');
    await userEvent.type(screen.getByLabelText('Supplier of all rows'), 'Larkholm Components{Enter}');
    await userEvent.click(screen.getByLabelText('Currency of all rows'));
    await userEvent.click(await screen.findByTitle('EUR'));
    const panel = within(await screen.findByRole('tabpanel'));
    expect((await panel.findByText(/from 100/)).textContent).toBe('from 100 3.10 2.95');
    expect(panel.getByText('Larkholm Components')).toBeInTheDocument();
    const [{ body }] = asked.filter(({ route }) => route === 'PUT /api/imports/6/mapping');
    expect(body).toMatchObject({
      version: 1,
      wholeList: { supplier: 'Larkholm Components', currency: 'EUR' },
      columns: [{ field: 'manufacturer' }, { field: 'partNumber' }, { form: 'break', quantity: 100 }],
    });
    expect(screen.getByRole('button', { name: 'Apply 1 row' })).toBeEnabled();
  });

  it('can’t be changed by a librarian', async () => {
    fakeServer({
      ...SESSION,
      'GET /api/imports/6': () => json(pricesOf({ state: 'checked', counts: importOf().counts })),
      'GET /api/imports/6/rows': () => json({ items: [PRICE_ROW], total: 1 }),
    });
    renderApp('/imports/6');
    expect(await screen.findByText('left out')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Apply|Discard/ })).not.toBeInTheDocument();
    expect(screen.queryByLabelText('Supplier of all rows')).not.toBeInTheDocument();
  });
});

describe('the history', () => {
  it('tells members who can’t import why, and shows them what came in', async () => {
    fakeServer({
      'GET /api/auth/me': () => json(sessionOf('librarian', 'free')),
      'GET /api/imports': () =>
        json({ items: [importOf({ state: 'applied', appliedAt: '2026-12-01T10:00:00Z' })], total: 1 }),
    });
    renderApp('/imports');
    expect(await screen.findByText(/Your team’s plan has no library of its own/)).toBeInTheDocument();
    expect(await screen.findByRole('link', { name: 'op-amp-liste.csv' })).toHaveAttribute(
      'href',
      '/imports/5',
    );
    expect(screen.queryByText('Drop the list here, or choose a file')).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Undo/ })).not.toBeInTheDocument();
  });
});
