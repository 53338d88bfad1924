import { monthAfter } from './calendar.js';
import { issueInvoice, openInvoices } from './invoices.js';
import type { Subscription } from './objects.js';
import type { State } from './state.js';
import { endSubscription, payOpenInvoices, periodLine, setPaid } from './subscriptions.js';

interface Due {
  at: number;
  act: () => void;
}

/**
 * Lets time pass: everything that falls due until then happens at its own moment, in order. The application goes by the
 * machine's clock, so the stand-in's comes back to it, and what it keeps is so much older instead.
 */
export function advance(state: State, seconds: number): void {
  const until = state.now + seconds;
  for (let due = nextDue(state, until); due; due = nextDue(state, until)) due.act();
  state.data.ahead += seconds;
  if (state.data.ahead > 0) makeOlder(state);
}

/** Everything that says when something was or will be. */
const MOMENTS: ReadonlySet<string> = new Set([
  'created',
  'current_period_start',
  'current_period_end',
  'cancel_at',
  'canceled_at',
  'ended_at',
  'next_payment_attempt',
  'period_start',
  'period_end',
  'start',
  'end',
  'finalized_at',
  'paid_at',
  'subscription_proration_date',
]);

function makeOlder(state: State): void {
  const { ahead, customers, sessions, subscriptions, invoices, portals, events } = state.data;
  moveMoments({ customers, sessions, subscriptions, invoices, portals, events }, -ahead);
  state.data.ahead = 0;
  for (const subscription of Object.values(subscriptions))
    if (subscription.status !== 'canceled') state.emit('customer.subscription.updated', subscription);
}

function moveMoments(kept: object, seconds: number): void {
  for (const [key, value] of Object.entries(kept)) {
    if (typeof value === 'object' && value !== null) moveMoments(value as object, seconds);
    else if (typeof value === 'number' && MOMENTS.has(key)) Object.assign(kept, { [key]: value + seconds });
  }
}

function nextDue(state: State, until: number): Due | undefined {
  const due = Object.values(state.data.subscriptions)
    .filter(({ status }) => status !== 'canceled')
    .flatMap((subscription) => duesOf(state, subscription))
    .filter(({ at }) => at <= until);
  return due.sort((one, other) => one.at - other.at)[0];
}

function duesOf(state: State, subscription: Subscription): Due[] {
  const { current_period_end: periodEnd } = subscription.items.data[0];
  const { cancel_at: cancelAt } = subscription;
  const ends = cancelAt !== null && cancelAt <= periodEnd;
  const turn: Due = ends
    ? { at: cancelAt, act: () => endSubscription(state, subscription, cancelAt) }
    : { at: periodEnd, act: () => renew(state, subscription, periodEnd) };
  const attempts = openInvoices(state, subscription.id).flatMap(({ next_payment_attempt: at }) =>
    at === null ? [] : [{ at, act: () => payOpenInvoices(state, subscription, at) }],
  );
  return [turn, ...attempts];
}

function renew(state: State, subscription: Subscription, at: number): void {
  const [item] = subscription.items.data;
  item.current_period_start = at;
  item.current_period_end = monthAfter(at);
  const paid = issueInvoice(state, {
    subscription,
    reason: 'subscription_cycle',
    lines: [periodLine(subscription)],
    at,
  });
  state.emit('customer.subscription.updated', subscription, at);
  setPaid(state, subscription, paid && openInvoices(state, subscription.id).length === 0, at);
}
