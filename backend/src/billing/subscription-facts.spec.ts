import type Stripe from 'stripe';
import { toMoney } from './money.js';
import { chooseSubscription, subscriptionFacts } from './subscription-facts.js';

const NOW = new Date('2026-06-15T12:00:00Z');
const END = NOW.getTime() / 1000 + 86_400;

function subscription(changes: object = {}): Stripe.Subscription {
  return {
    id: 'sub_1',
    status: 'active',
    created: 1,
    cancel_at: null,
    cancel_at_period_end: false,
    ended_at: null,
    items: { data: [{ quantity: 3, current_period_end: END }] },
    ...changes,
  } as unknown as Stripe.Subscription;
}

function openInvoice(finalized_at: number | null, created = 1): Stripe.Invoice {
  return { created, status_transitions: { finalized_at } } as unknown as Stripe.Invoice;
}

const factsOf = (changes: object, open: Stripe.Invoice[] = [], known: Date | null = null) =>
  subscriptionFacts(subscription(changes), open, known, NOW);

describe('what is kept of a subscription', () => {
  it('takes the end of the period from its item', () => {
    expect(factsOf({})).toEqual({
      subscriptionId: 'sub_1',
      status: 'active',
      seats: 3,
      currentPeriodEnd: new Date(END * 1000),
      endsAt: null,
      pastDueSince: null,
    });
  });

  it.each([
    ['trialing', 'active'],
    ['past_due', 'past-due'],
    ['unpaid', 'past-due'],
    ['paused', 'past-due'],
    ['canceled', 'cancelled'],
  ])('takes %s for %s', (status, ours) => {
    expect(factsOf({ status })?.status).toBe(ours);
  });

  it.each(['incomplete', 'incomplete_expired', 'a word of tomorrow'])('takes nothing for %s', (status) => {
    expect(factsOf({ status })).toBe(null);
    expect(chooseSubscription([subscription({ status })])).toBe(null);
  });

  it('knows every way in which it is set to end', () => {
    expect(factsOf({ cancel_at: 77 })?.endsAt).toEqual(new Date(77_000));
    expect(factsOf({ cancel_at_period_end: true })?.endsAt).toEqual(new Date(END * 1000));
    expect(factsOf({ status: 'canceled', cancel_at: 77, ended_at: 55 })?.endsAt).toEqual(new Date(55_000));
  });

  it('counts the missing payment from the oldest open invoice, never from later than now', () => {
    const since = (open: Stripe.Invoice[], known: Date | null = null) =>
      factsOf({ status: 'past_due' }, open, known)?.pastDueSince;
    expect(since([openInvoice(500), openInvoice(300), openInvoice(null, 400)])).toEqual(new Date(300_000));
    expect(since([openInvoice(END + 900)])).toEqual(NOW);
    expect(since([], new Date(5000))).toEqual(new Date(5000));
    expect(since([])).toEqual(NOW);
  });

  it('prefers a paid one to any other, then the newest', () => {
    const of = (id: string, status: string, created: number) => subscription({ id, status, created });
    const all = [of('a', 'canceled', 9), of('b', 'active', 2), of('c', 'active', 3), of('d', 'past_due', 8)];
    expect(chooseSubscription(all)?.id).toBe('c');
    expect(chooseSubscription([all[0], all[3]])?.id).toBe('d');
    expect(chooseSubscription([])).toBe(null);
  });
});

describe('toMoney', () => {
  it.each([
    [1900, 'eur', { amount: '19.00', currency: 'EUR' }],
    [-5, 'usd', { amount: '-0.05', currency: 'USD' }],
    [1900, 'jpy', { amount: '1900', currency: 'JPY' }],
    [1900, 'kwd', { amount: '1.900', currency: 'KWD' }],
  ])('writes %d of %s in the currency’s own unit', (smallest, currency, money) => {
    expect(toMoney(smallest, currency)).toEqual(money);
  });
});
