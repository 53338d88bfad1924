import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { Offer } from '../../api/prices';
import type { OpAmp } from '../../api/opAmps';
import { offerOf } from '../../test/prices';
import { opAmp, sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const RATES = {
  currency: 'EUR',
  items: [{ currency: 'USD', rate: '0.50000000', dated: '2026-01-01' }],
  missing: [],
};

function open(
  role: Parameters<typeof sessionOf>[0],
  part: OpAmp,
  plan?: 'free' | 'team',
  conditions: { id: string; name: string }[] = [],
  offers: Offer[] = [],
) {
  const asked = fakeServer({
    [`GET /api/parts/${part.id}/uses`]: () => json({ conditions }),
    'GET /api/auth/me': () => json(sessionOf(role, plan)),
    [`GET /api/op-amps/${part.id}`]: () => json(part),
    [`GET /api/parts/${part.id}/offers`]: () => json({ current: offers, history: [] }),
    'GET /api/prices/rates': () => json(RATES),
  });
  renderApp(`/parts/${part.id}`);
  return asked;
}

function entry(list: HTMLElement, term: string): HTMLElement {
  return within(list).getByText(term).closest('div')!;
}

describe('a part’s page', () => {
  it('shows each figure with where it comes from', async () => {
    open('engineer', opAmp());
    const parameters = await screen.findByLabelText('Parameters');
    expect(entry(parameters, 'voltage noise e_n')).toHaveTextContent('1.1 nV/√Hzmeasured');
    expect(entry(parameters, 'current noise i_n')).toHaveTextContent('1.7 pA/√Hzdata sheet, typical');
  });

  it('says what a quantity costs, and where more pieces cost less in all', async () => {
    const dollars = offerOf({
      id: '12',
      supplier: { id: '4', name: 'Tidewrack Trading' },
      currency: 'USD',
      minimumOrderQuantity: 1,
      orderMultiple: 1,
      breaks: [
        { minimumQuantity: 1, unitPrice: '8.0000' },
        { minimumQuantity: 120, unitPrice: '4.0000' },
      ],
    });
    open('engineer', opAmp(), 'team', [], [offerOf(), dollars]);
    const prices = await screen.findByRole('region', { name: 'Prices' });
    expect(await within(prices).findByRole('status')).toHaveTextContent(
      '100 pieces cost €3.10 each from Brook & Weir, €310.00 in all, delivered in 42 days. ' +
        '120 from Tidewrack Trading cost less in all: €240.00.',
    );
    expect(within(prices).getByRole('row', { name: /Tidewrack Trading.*US\$8\.00/ })).toBeInTheDocument();
    expect(within(prices).getByRole('link', { name: 'See its prices' })).toHaveAttribute(
      'href',
      '/prices?partId=41',
    );
  });

  it('says where the team has no price', async () => {
    open('purchasing', opAmp());
    const prices = await screen.findByRole('region', { name: 'Prices' });
    expect(await within(prices).findByText(/has no price for this part/)).toBeInTheDocument();
    expect(within(prices).getByRole('link', { name: 'Enter one' })).toBeInTheDocument();
  });

  it('derives the source resistance at which the amplifier adds least', async () => {
    open('engineer', opAmp());
    const derived = await screen.findByLabelText('Derived figures');
    expect(entry(derived, 'optimum source resistance')).toHaveTextContent(/647\sΩ/);
    expect(entry(derived, 'equivalent noise resistance')).toHaveTextContent(/73\.5\sΩ/);
  });

  it('shows an unknown figure as unknown and says what that means', async () => {
    const part = opAmp();
    open('engineer', { ...part, amplifier: { ...part.amplifier, currentNoise: null } });
    const parameters = await screen.findByLabelText('Parameters');
    expect(entry(parameters, 'current noise i_n')).toHaveTextContent(/unknown$/);
    expect(screen.getByLabelText('Cautions')).toHaveTextContent('The current noise is unknown');
  });

  it('lets a librarian edit and delete a part of the own library', async () => {
    open('librarian', opAmp());
    expect(await screen.findByRole('link', { name: 'Edit' })).toHaveAttribute('href', '/parts/41/edit');
    expect(await screen.findByRole('button', { name: 'Delete' })).toBeInTheDocument();
  });

  it('offers to retire, and not to delete, a part that is chosen somewhere', async () => {
    open('librarian', opAmp(), 'team', [{ id: '5', name: 'River geophone' }]);
    expect(await screen.findByText(/Chosen at “River geophone”: it can be retired/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Retire' })).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Delete' })).not.toBeInTheDocument();
  });

  it('offers to bring a retired part back', async () => {
    open('librarian', opAmp({ lifecycle: 'obsolete', approval: 'not-approved' }));
    expect(await screen.findByRole('button', { name: 'Bring back' })).toBeInTheDocument();
  });

  it.each([
    ['an engineer', 'engineer', opAmp(), 'team'],
    ['a librarian, where the part is curated', 'librarian', opAmp({ library: 'curated' }), 'team'],
    ['a librarian, where the plan has no own library', 'librarian', opAmp(), 'free'],
  ] as const)('offers neither to %s', async (_who, role, part, plan) => {
    open(role, part, plan);
    await screen.findByLabelText('Parameters');
    expect(screen.queryByRole('link', { name: 'Edit' })).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Delete' })).not.toBeInTheDocument();
  });

  it('shows no form to who may not edit', async () => {
    fakeServer({ 'GET /api/auth/me': () => json(sessionOf('engineer')) });
    renderApp('/parts/new');
    expect(await screen.findByRole('heading', { name: 'This can’t be changed here' })).toBeInTheDocument();
  });

  it('says so where there is no such part', async () => {
    fakeServer({
      'GET /api/auth/me': () => json(sessionOf('engineer')),
      'GET /api/op-amps/99': () => problem(404, 'part.not-found'),
    });
    renderApp('/parts/99');
    expect(await screen.findByRole('heading', { name: 'There is no such part' })).toBeInTheDocument();
  });

  it('says why a part can’t be deleted', async () => {
    const part = opAmp();
    fakeServer({
      'GET /api/auth/me': () => json(sessionOf('librarian')),
      'GET /api/op-amps/41': () => json(part),
      'GET /api/parts/41/uses': () => json({ conditions: [] }),
      'GET /api/parts/41/offers': () => json({ current: [], history: [] }),
      'DELETE /api/op-amps/41': () =>
        problem(409, 'part.stale', { detail: 'Somebody changed it meanwhile.' }),
    });
    renderApp('/parts/41');
    await userEvent.click(await screen.findByRole('button', { name: 'Delete' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Somebody changed it meanwhile.');
  });
});
