import { invalid } from './api-error.js';
import { draftInvoice } from './invoices.js';
import type { Subscription } from './objects.js';
import {
  flag,
  integer,
  list,
  metadata,
  oneOf,
  type Params,
  required,
  shape,
  text,
  timestampOrNone,
} from './params.js';
import { listRoute, listShape, post, remove, retrieve, type Route } from './route.js';
import { findIn, type State } from './state.js';
import { changeQuantity, endSubscription, periodLine, prorationLines, setEnd } from './subscriptions.js';

const STATUSES = ['active', 'past_due', 'canceled'] as const;
const items = list(shape({ id: required(text), quantity: required(integer(1, 999_999)) }), 1);
const behavior = oneOf('always_invoice');

const update = shape({
  items,
  proration_behavior: behavior,
  proration_date: integer(0),
  payment_behavior: oneOf('error_if_incomplete'),
  cancel_at: timestampOrNone,
  cancel_at_period_end: flag,
  metadata,
});

const preview = shape({
  customer: text,
  subscription: required(text),
  subscription_details: shape({ items, proration_behavior: behavior, proration_date: integer(0) }),
});

export const SUBSCRIPTION_ROUTES: Route[] = [
  listRoute(
    '/v1/subscriptions',
    shape({ ...listShape, customer: text, status: oneOf(...STATUSES, 'all') }),
    ({ data }, { customer, status }) =>
      Object.values(data.subscriptions).filter(
        (one) => one.customer === (customer ?? one.customer) && hasStatus(one, status),
      ),
  ),
  retrieve('/v1/subscriptions/:id', 'subscription', ({ data }) => data.subscriptions),
  post('/v1/subscriptions/:id', update, (state, params, id) => {
    const subscription = runningSubscription(state, id);
    const { items, proration_behavior, payment_behavior, metadata, cancel_at, cancel_at_period_end } = params;
    if (items) {
      if (!proration_behavior || !payment_behavior)
        throw invalid('This stand-in changes items with always_invoice and error_if_incomplete only.');
      const quantity = quantityOf(subscription, items);
      changeQuantity(state, subscription, {
        quantity,
        prorationDate: prorationDate(state, subscription, params),
      });
    }
    if (metadata) Object.assign(subscription.metadata, metadata);
    if (cancel_at !== undefined) setEnd(state, subscription, cancel_at);
    if (cancel_at_period_end !== undefined) setPeriodEnd(state, subscription, cancel_at_period_end);
    return subscription;
  }),
  remove('/v1/subscriptions/:id', shape({}), (state, _, id) => {
    const subscription = runningSubscription(state, id);
    endSubscription(state, subscription, state.now);
    return subscription;
  }),
  listRoute(
    '/v1/invoices',
    shape({
      ...listShape,
      customer: text,
      subscription: text,
      status: oneOf('draft', 'open', 'paid', 'void'),
    }),
    ({ data }, { customer, subscription, status }) =>
      Object.values(data.invoices).filter(
        (invoice) =>
          invoice.customer === (customer ?? invoice.customer) &&
          invoice.status === (status ?? invoice.status) &&
          invoice.parent.subscription_details.subscription ===
            (subscription ?? invoice.parent.subscription_details.subscription),
      ),
  ),
  post('/v1/invoices/create_preview', preview, (state, params) => previewInvoice(state, params)),
  retrieve('/v1/invoices/:id', 'invoice', ({ data }) => data.invoices),
  listRoute('/v1/events', shape({ ...listShape, type: text }), ({ data }, { type }) =>
    data.events.filter((event) => event.type === (type ?? event.type)),
  ),
  retrieve('/v1/events/:id', 'event', ({ data }) =>
    Object.fromEntries(data.events.map((event) => [event.id, event])),
  ),
];

function hasStatus({ status }: Subscription, wanted: (typeof STATUSES)[number] | 'all' | undefined): boolean {
  if (wanted === undefined) return status !== 'canceled';
  return wanted === 'all' || status === wanted;
}

function runningSubscription(state: State, id: string): Subscription {
  const subscription = findIn(state.data.subscriptions, id, 'subscription');
  if (subscription.status === 'canceled')
    throw invalid('A canceled subscription can only update its metadata.');
  return subscription;
}

function quantityOf(subscription: Subscription, [item]: { id: string; quantity: number }[]): number {
  if (item.id !== subscription.items.data[0].id) throw invalid(`No such subscription item: '${item.id}'`);
  return item.quantity;
}

function prorationDate(
  state: State,
  subscription: Subscription,
  { proration_date }: { proration_date?: number },
): number {
  const { current_period_start, current_period_end } = subscription.items.data[0];
  const date = proration_date ?? state.now;
  if (date >= current_period_start && date <= current_period_end) return date;
  throw invalid('Cannot specify a proration_date outside of the current period.', {
    param: 'proration_date',
  });
}

function setPeriodEnd(state: State, subscription: Subscription, ends: boolean): void {
  subscription.cancel_at_period_end = ends;
  setEnd(state, subscription, ends ? subscription.items.data[0].current_period_end : null);
}

type PreviewParams = Params<{
  customer: typeof text;
  subscription: ReturnType<typeof required<string>>;
  subscription_details: ReturnType<
    typeof shape<{
      items: typeof items;
      proration_behavior: typeof behavior;
      proration_date: ReturnType<typeof integer>;
    }>
  >;
}>;

/** The invoice of the next period, or with changed items the one that the change would make at once. */
function previewInvoice(
  state: State,
  { customer, subscription: id, subscription_details: details }: PreviewParams,
): object {
  const subscription = runningSubscription(state, id);
  if (customer !== undefined && customer !== subscription.customer)
    throw invalid('The customer doesn’t match.');
  if (!details?.items) {
    if (subscription.cancel_at !== null)
      throw invalid('No upcoming invoices for customer', { code: 'invoice_upcoming_none' });
    const at = subscription.items.data[0].current_period_end;
    return draftInvoice(state, {
      subscription,
      reason: 'upcoming',
      lines: [periodLine(subscription, 1)],
      at,
    });
  }
  if (!details.proration_behavior) throw invalid('This stand-in previews items with always_invoice only.');
  const date = prorationDate(state, subscription, details);
  const lines = prorationLines(subscription, quantityOf(subscription, details.items), date);
  return draftInvoice(state, { subscription, reason: 'upcoming', lines, at: date, prorationDate: date });
}
