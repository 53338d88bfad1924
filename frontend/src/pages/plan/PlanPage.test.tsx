import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Billing } from '../../api/billing';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const EUR = (amount: string) => ({ amount, currency: 'EUR' });
const inDays = (days: number) => new Date(Date.now() + days * 86_400_000).toISOString();

function billing(changes: Partial<Billing> = {}): Billing {
  return {
    plan: 'team',
    standing: 'active',
    standingUntil: null,
    seats: 8,
    usedSeats: 5,
    mayTry: false,
    granted: false,
    hasCustomer: true,
    periodEndsAt: '2026-12-21T10:00:00.000Z',
    endsAt: null,
    payment: {
      seatPrice: EUR('19.00'),
      next: { ...EUR('152.00'), at: '2026-12-21T10:00:00.000Z' },
      invoices: [
        {
          id: 'in_1',
          number: 'R-0001',
          createdAt: '2026-11-21T10:00:00.000Z',
          status: 'paid',
          url: 'https://pay.example/in_1',
          ...EUR('152.00'),
        },
        {
          id: 'in_2',
          number: 'R-0002',
          createdAt: '2026-11-21T10:00:00.000Z',
          status: 'paid',
          url: null,
          ...EUR('-57.00'),
        },
      ],
    },
    ...changes,
  };
}

const FREE = billing({
  plan: 'free',
  seats: 1,
  usedSeats: 1,
  mayTry: true,
  hasCustomer: false,
  payment: { seatPrice: EUR('19.00'), next: null, invoices: [] },
});

function open(state: Billing, answers: Parameters<typeof fakeServer>[0] = {}, address = '/team/plan') {
  const { plan, standing, standingUntil } = state;
  const asked = fakeServer({
    'GET /api/auth/me': () => json({ ...sessionOf('admin', plan), standing, standingUntil }),
    'GET /api/billing': () => json(state),
    ...answers,
  });
  renderApp(address);
  return asked;
}

const leaveFor = vi.fn();
afterEach(() => leaveFor.mockReset());

/** What the page does when it leaves for the payment service. */
function watchLeaving() {
  vi.stubGlobal('location', { ...window.location, origin: window.location.origin, assign: leaveFor });
}

describe('the plan page', () => {
  it('states the seats, the price, the next invoice and those before', async () => {
    open(billing());
    expect(await screen.findByRole('heading', { name: 'Team plan, 8 seats' })).toBeInTheDocument();
    const facts = screen.getByLabelText('Plan');
    for (const text of ['5 of 8 taken', '€19.00 a seat and month', '€152.00 on 21 Dec 2026'])
      expect(within(facts).getByText(text)).toBeInTheDocument();
    expect(screen.getByRole('cell', { name: '−€57.00' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'R-0001' })).toHaveAttribute('href', 'https://pay.example/in_1');
  });

  it('says what other seats cost before it changes them', async () => {
    const preview = { seats: 9, dueNow: EUR('12.67'), monthly: EUR('171.00'), prorationDate: 1_796_000_000 };
    const asked = open(billing(), {
      'POST /api/billing/seats/preview': () => json(preview),
      'PUT /api/billing/seats': () => json(billing({ seats: 9 })),
    });
    const seats = await screen.findByLabelText('Seats');
    await userEvent.clear(seats);
    await userEvent.type(seats, '9');
    expect(
      await screen.findByText(/€12.67 now.*€171.00 a month from the next invoice on/),
    ).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Change to 9 seats' }));
    expect(await screen.findByRole('heading', { name: 'Team plan, 9 seats' })).toHaveFocus();
    expect(asked.find(({ route }) => route.startsWith('PUT'))?.body).toEqual({
      seats: 9,
      prorationDate: 1_796_000_000,
    });
  });

  it('keeps the seats where the card is declined, and says so', async () => {
    const preview = { seats: 9, dueNow: EUR('12.67'), monthly: EUR('171.00'), prorationDate: 1_796_000_000 };
    open(billing(), {
      'POST /api/billing/seats/preview': () => json(preview),
      'PUT /api/billing/seats': () => problem(402, 'billing.declined', { detail: 'The card was declined.' }),
    });
    await userEvent.type(await screen.findByLabelText('Seats'), '{Backspace}9');
    await screen.findByText(/€12.67 now/);
    await userEvent.click(screen.getByRole('button', { name: 'Change to 9 seats' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('The card was declined.');
    expect(screen.getByRole('heading', { name: 'Team plan, 8 seats' })).toBeInTheDocument();
  });

  it('offers a free team the trial and the plan, and starts the trial', async () => {
    const trial = billing({
      ...FREE,
      plan: 'team',
      standing: 'trial',
      standingUntil: inDays(14),
      seats: 5,
      mayTry: false,
    });
    open(FREE, { 'POST /api/billing/trial': () => json(trial, 201) });
    await userEvent.click(await screen.findByRole('button', { name: 'Start the trial' }));
    expect(
      await screen.findByRole('heading', { name: 'Team plan on trial: 14 days left' }),
    ).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Start the trial' })).not.toBeInTheDocument();
  });

  it('leads to the payment for the seats that were chosen', async () => {
    const asked = open(FREE, {
      'POST /api/billing/checkout': () => json({ url: 'https://pay.example/cs_1' }, 201),
    });
    await userEvent.type(await screen.findByLabelText('Seats'), '{Backspace}4');
    expect(await screen.findByText('€76.00 a month')).toBeInTheDocument();
    watchLeaving();
    await userEvent.click(screen.getByRole('button', { name: 'Go to payment' }));
    await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('https://pay.example/cs_1'));
    expect(asked.at(-1)?.body).toEqual({ seats: 4 });
  });

  it('can lead to the payment again after the browser’s way back', async () => {
    const asked = open(FREE, {
      'POST /api/billing/checkout': () => json({ url: 'https://pay.example/cs_1' }, 201),
    });
    const button = await screen.findByRole('button', { name: 'Go to payment' });
    watchLeaving();
    await userEvent.click(button);
    await waitFor(() => expect(button).toHaveClass('ant-btn-loading'));
    window.dispatchEvent(new PageTransitionEvent('pageshow', { persisted: true }));
    await waitFor(() => expect(button).not.toHaveClass('ant-btn-loading'));
    await userEvent.click(button);
    await waitFor(() => expect(leaveFor).toHaveBeenCalledTimes(2));
    expect(asked.filter(({ route }) => route === 'POST /api/billing/checkout')).toHaveLength(2);
  });

  it('asks what has become of the payment when the payer comes back', async () => {
    const asked = open(FREE, { 'POST /api/billing/sync': () => json(billing()) }, '/team/plan?from=checkout');
    expect(await screen.findByRole('heading', { name: 'Team plan, 8 seats' })).toBeInTheDocument();
    expect(asked.filter(({ route }) => route === 'POST /api/billing/sync')).toHaveLength(1);
  });

  it.each([
    {
      changes: { standing: 'past-due', standingUntil: inDays(9) },
      headline: 'Team plan: a payment is missing',
      act: 'Card and cancellation',
    },
    {
      changes: { standing: 'unpaid' },
      headline: 'Read-only: a payment is missing',
      act: 'Card and cancellation',
    },
    {
      changes: { standing: 'cancelled', seats: 0 },
      headline: 'Read-only: the plan is cancelled',
      act: 'Go to payment',
    },
    {
      changes: { plan: 'free', standing: 'trial-over' },
      headline: 'Free plan: the trial is over',
      act: 'Go to payment',
    },
  ] as const)('has the headline $headline, and what to do', async ({ changes, headline, act }) => {
    open(billing(changes));
    expect(await screen.findByRole('heading', { name: headline })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: act })).toBeEnabled();
    expect(screen.queryByText('More or fewer seats')).not.toBeInTheDocument();
  });

  it('shows what is known while the payment service doesn’t answer', async () => {
    open(billing({ payment: null }));
    expect(await screen.findByRole('alert')).toHaveTextContent('The payment service doesn’t answer');
    expect(screen.getByText('5 of 8 taken')).toBeInTheDocument();
  });

  it('tells other roles who sees to it, and asks for no invoices', async () => {
    const asked = fakeServer({ 'GET /api/auth/me': () => json(sessionOf('engineer')) });
    renderApp('/team/plan');
    expect(await screen.findByText(/seen to by your team’s admins/)).toBeInTheDocument();
    expect(screen.getByRole('rowheader', { name: 'Library of your own, with imports' })).toBeInTheDocument();
    expect(asked.map(({ route }) => route)).toEqual(['GET /api/auth/me']);
  });
});

describe('the notice on every page', () => {
  const openAccount = (changes: object, role: 'admin' | 'engineer' = 'admin') => {
    fakeServer({ 'GET /api/auth/me': () => json({ ...sessionOf(role), ...changes }) });
    renderApp('/account');
  };

  it.each([
    ['past-due', inDays(8.5), /the team is read-only in 9 days/],
    ['trial', inDays(0.5), /trial of the Team plan ends in 1 day\./],
    ['unpaid', null, /Read-only, for a payment is missing/],
    ['cancelled', null, /Read-only, for the plan is cancelled/],
  ])(
    'says what is the matter with a plan that is %s, and leads an admin there',
    async (standing, standingUntil, text) => {
      openAccount({ standing, standingUntil });
      expect(await screen.findByText(text)).toBeInTheDocument();
      expect(screen.getByRole('link', { name: 'See to the plan' })).toHaveAttribute('href', '/team/plan');
    },
  );

  it('sends other roles to an admin', async () => {
    openAccount({ standing: 'unpaid' }, 'engineer');
    expect(await screen.findByText(/A team admin can see to it/)).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'See to the plan' })).not.toBeInTheDocument();
  });

  it('is silent while all is well and while a trial has days left', async () => {
    openAccount({ standing: 'trial', standingUntil: inDays(10) });
    expect(await screen.findByRole('heading', { name: 'Ada Merrow' })).toBeInTheDocument();
    expect(screen.queryByText(/trial of the Team plan/)).not.toBeInTheDocument();
  });
});
