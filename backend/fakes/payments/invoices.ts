import { DAY } from './calendar.js';
import type { Invoice, InvoiceLine, Subscription } from './objects.js';
import { newId, type State } from './state.js';

const ATTEMPTS = 4;
const DAYS_BETWEEN_ATTEMPTS = 5;

export interface Draft {
  subscription: Subscription;
  reason: Invoice['billing_reason'];
  lines: InvoiceLine[];
  at: number;
  prorationDate?: number;
}

/** An invoice as it would be made: a credit of the customer's is taken off, and a negative total becomes one. */
export function draftInvoice(
  state: State,
  { subscription, reason, lines, at, prorationDate }: Draft,
): Invoice {
  const total = lines.reduce((sum, { amount }) => sum + amount, 0);
  const balance = state.data.customers[subscription.customer].balance;
  const due = Math.max(0, total + balance);
  return {
    object: 'invoice',
    created: at,
    livemode: false,
    customer: subscription.customer,
    number: null,
    status: 'draft',
    billing_reason: reason,
    currency: subscription.currency,
    lines: { object: 'list', url: '/v1/invoices/lines', has_more: false, data: lines },
    subtotal: total,
    total,
    starting_balance: balance,
    ending_balance: Math.min(0, total + balance),
    amount_due: due,
    amount_paid: 0,
    amount_remaining: due,
    attempt_count: 0,
    next_payment_attempt: null,
    period_start: lines[0].period.start,
    period_end: lines[0].period.end,
    hosted_invoice_url: null,
    status_transitions: { finalized_at: null, paid_at: null, voided_at: null },
    parent: {
      type: 'subscription_details',
      subscription_details: {
        subscription: subscription.id,
        ...(prorationDate !== undefined && { subscription_proration_date: prorationDate }),
      },
    },
  };
}

/** Makes the invoice and charges it; answers whether it is paid. */
export function issueInvoice(state: State, draft: Draft): boolean {
  const id = newId('in');
  const number = `STANDIN-${String(Object.keys(state.data.invoices).length + 1).padStart(4, '0')}`;
  const invoice = {
    ...draftInvoice(state, draft),
    id,
    number,
    hosted_invoice_url: `/invoice/${id}`,
  };
  invoice.status = 'open';
  invoice.status_transitions.finalized_at = draft.at;
  state.data.invoices[id] = invoice;
  state.data.customers[invoice.customer].balance = invoice.ending_balance ?? 0;
  draft.subscription.latest_invoice = id;
  return chargeInvoice(state, invoice, draft.at);
}

/** Tries to have an open invoice paid by the customer's card. */
export function chargeInvoice(state: State, invoice: Invoice, at: number): boolean {
  if (invoice.amount_due > 0 && !cardPays(state, invoice.customer)) {
    invoice.attempt_count += 1;
    const again = invoice.attempt_count < ATTEMPTS;
    invoice.next_payment_attempt = again ? at + DAYS_BETWEEN_ATTEMPTS * DAY : null;
    state.emit('invoice.payment_failed', invoice, at);
    return false;
  }
  if (invoice.amount_due > 0 && state.data.cards[invoice.customer] === 'later')
    state.data.cards[invoice.customer] = 'declined';
  invoice.status = 'paid';
  invoice.amount_paid = invoice.amount_due;
  invoice.amount_remaining = 0;
  invoice.next_payment_attempt = null;
  invoice.status_transitions.paid_at = at;
  state.emit('invoice.paid', invoice, at);
  return true;
}

/** Whether a charge would go through; a customer without a card pays nothing. */
export function cardPays(state: State, customer: string): boolean {
  return (state.data.cards[customer] ?? 'declined') !== 'declined';
}

export function openInvoices(state: State, subscription: string) {
  return Object.values(state.data.invoices).filter(
    ({ status, parent }) => status === 'open' && parent.subscription_details.subscription === subscription,
  );
}
