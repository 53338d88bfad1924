import { declined } from './api-error.js';
import { monthAfter } from './calendar.js';
import { cardPays, chargeInvoice, draftInvoice, issueInvoice, openInvoices } from './invoices.js';
import type { InvoiceLine, Subscription } from './objects.js';
import { newId, PRICE, type State } from './state.js';

export interface Started {
  customer: string;
  quantity: number;
  metadata: Record<string, string>;
  at: number;
  id?: string;
}

/** A paid subscription of a customer whose card pays. */
export function startSubscription(
  state: State,
  { customer, quantity, metadata, at, id = newId('sub') }: Started,
): Subscription {
  const subscription: Subscription = {
    id,
    object: 'subscription',
    created: at,
    livemode: false,
    customer,
    status: 'active',
    currency: PRICE.currency,
    items: {
      object: 'list',
      url: `/v1/subscription_items?subscription=${id}`,
      has_more: false,
      data: [
        {
          id: newId('si'),
          object: 'subscription_item',
          subscription: id,
          price: PRICE,
          quantity,
          current_period_start: at,
          current_period_end: monthAfter(at),
        },
      ],
    },
    cancel_at: null,
    cancel_at_period_end: false,
    canceled_at: null,
    ended_at: null,
    latest_invoice: null,
    metadata,
  };
  state.data.subscriptions[id] = subscription;
  issueInvoice(state, {
    subscription,
    reason: 'subscription_create',
    lines: [periodLine(subscription)],
    at,
  });
  state.emit('customer.subscription.created', subscription, at);
  return subscription;
}

/** What a period with the subscription's quantity costs. */
export function periodLine(subscription: Subscription, months = 0): InvoiceLine {
  const { quantity, current_period_start, current_period_end } = subscription.items.data[0];
  const start = months === 0 ? current_period_start : current_period_end;
  const end = months === 0 ? current_period_end : monthAfter(current_period_end);
  return lineOf(subscription, PRICE.unit_amount * quantity, `${quantity} × seat`, quantity, { start, end });
}

/** What a change of the quantity costs for the rest of the period: the old one is credited, the new one charged. */
export function prorationLines(subscription: Subscription, quantity: number, at: number): InvoiceLine[] {
  const { quantity: old, current_period_start, current_period_end: end } = subscription.items.data[0];
  const left = (end - at) / (end - current_period_start);
  const amount = (seats: number) => Math.round(PRICE.unit_amount * seats * left);
  const period = { start: at, end };
  return [
    lineOf(subscription, -amount(old), `Unused time on ${old} × seat`, old, period, true),
    lineOf(subscription, amount(quantity), `Remaining time on ${quantity} × seat`, quantity, period, true),
  ];
}

function lineOf(
  { id, currency, items }: Subscription,
  amount: number,
  description: string,
  quantity: number,
  period: InvoiceLine['period'],
  proration = false,
): InvoiceLine {
  return {
    id: newId('il'),
    object: 'line_item',
    amount,
    currency,
    description,
    quantity,
    period,
    parent: {
      type: 'subscription_item_details',
      subscription_item_details: { subscription: id, subscription_item: items.data[0].id, proration },
    },
  };
}

/** Changes the quantity and charges the difference at once; a card that fails leaves everything as it was. */
export function changeQuantity(
  state: State,
  subscription: Subscription,
  change: { quantity: number; prorationDate: number },
): void {
  const { quantity, prorationDate } = change;
  const [item] = subscription.items.data;
  if (item.quantity === quantity) return;
  const lines = prorationLines(subscription, quantity, prorationDate);
  const draft = { subscription, reason: 'subscription_update' as const, lines, at: state.now, prorationDate };
  if (draftInvoice(state, draft).amount_due > 0 && !cardPays(state, subscription.customer)) throw declined();
  item.quantity = quantity;
  issueInvoice(state, draft);
  state.emit('customer.subscription.updated', subscription);
}

/** Sets when the subscription ends, or with null that it goes on. */
export function setEnd(state: State, subscription: Subscription, cancelAt: number | null): void {
  subscription.cancel_at = cancelAt;
  subscription.canceled_at = cancelAt === null ? null : state.now;
  state.emit('customer.subscription.updated', subscription);
}

export function endSubscription(state: State, subscription: Subscription, at: number): void {
  subscription.status = 'canceled';
  subscription.canceled_at ??= at;
  subscription.ended_at = at;
  state.emit('customer.subscription.deleted', subscription, at);
}

/** Pays what is open with the customer's card as it is now. */
export function payOpenInvoices(state: State, subscription: Subscription, at: number): void {
  const unpaid = openInvoices(state, subscription.id).filter((invoice) => !chargeInvoice(state, invoice, at));
  setPaid(state, subscription, unpaid.length === 0, at);
}

export function setPaid(state: State, subscription: Subscription, paid: boolean, at: number): void {
  const status = paid ? 'active' : 'past_due';
  if (subscription.status === status) return;
  subscription.status = status;
  state.emit('customer.subscription.updated', subscription, at);
}
