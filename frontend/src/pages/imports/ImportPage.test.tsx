import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { Import } from '../../api/imports';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { CHANGED_ROW, importOf, REFUSED_ROW } from '../../test/imports';
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
      await screen.findByText('12 000 of 100 000 rows · 8000 rows/s · about 11 s left'),
    ).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(await screen.findByText('Cancelled: the library is as before.')).toBeInTheDocument();
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

  it('says that there is no such import', async () => {
    fakeServer({ ...SESSION, 'GET /api/imports/9': () => problem(404, 'import.not-found') });
    renderApp('/imports/9');
    expect(await screen.findByRole('heading', { name: 'There is no such import' })).toBeInTheDocument();
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
