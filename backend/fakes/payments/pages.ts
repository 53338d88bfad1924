import express, { type Response, Router } from 'express';
import { declined } from './api-error.js';
import { assertOpen } from './customer-routes.js';
import { choice, day, form, link, money, page, paragraph, table } from './html.js';
import { type Card, CARDS, type CheckoutSession, type PortalSession, type Subscription } from './objects.js';
import { oneOf, required, shape } from './params.js';
import { findIn, PRICE, type State } from './state.js';
import { endSubscription, payOpenInvoices, setEnd, startSubscription } from './subscriptions.js';

const CARD_LABELS = Object.fromEntries(
  Object.entries(CARDS).map(([card, does]) => [card, `A card that ${does}`]),
);
const cardForm = shape({ card: required(oneOf(...(Object.keys(CARDS) as Card[]))) });

/** What people see: paying, the portal, an invoice. */
export function pagesRouter(state: State): Router {
  const router = Router();
  router.use(express.urlencoded({ extended: true }));
  router.get('/pay/:id', (request, response) => {
    response.send(payPage(state, assertOpen(state, request.params.id)));
  });
  router.post('/pay/:id', (request, response) => {
    const { card } = cardForm(request.body ?? {}, '');
    pay(state, assertOpen(state, request.params.id), card, response);
  });
  router.get('/portal/:id', (request, response) => {
    response.send(portalPage(state, findIn(state.data.portals, request.params.id, 'portal session')));
  });
  router.post('/portal/:id/:act', (request, response) => {
    const portal = findIn(state.data.portals, request.params.id, 'portal session');
    const act = oneOf('cancel', 'keep', 'end', 'card')(request.params.act, 'act');
    changeInPortal(state, portal, act, request.body);
    response.redirect(303, `/portal/${portal.id}`);
  });
  router.get('/invoice/:id', (request, response) => {
    const { number, status, total, currency, created, lines } = findIn(
      state.data.invoices,
      request.params.id,
      'invoice',
    );
    const rows = lines.data.map(({ description, amount }) => [description, money(amount, currency)]);
    const head = `${day(created)}, ${status}: ${money(total, currency)} in all.`;
    response.send(page(`Invoice ${number}`, paragraph(head), table(rows)));
  });
  return router;
}

function payPage(state: State, { id, cancel_url }: CheckoutSession, refused = ''): string {
  const { quantity } = state.data.carts[id];
  const each = money(PRICE.unit_amount, PRICE.currency);
  const sum = money(PRICE.unit_amount * quantity, PRICE.currency);
  return page(
    'Pay for the Team plan',
    paragraph(`${quantity} × seat at ${each} a month: ${sum} today, and every month.`),
    refused && `<p class="refused" role="alert">${refused}</p>`,
    form(`/pay/${id}`, `Pay ${sum}`, choice('card', CARD_LABELS)),
    cancel_url === null ? '' : link(cancel_url, 'Back without paying'),
  );
}

function pay(state: State, session: CheckoutSession, card: Card, response: Response): void {
  if (card === 'declined') {
    response.send(payPage(state, session, `${declined().message} Nothing was charged.`));
    return;
  }
  const { quantity, metadata } = state.data.carts[session.id];
  state.data.cards[session.customer] = card;
  const { id } = startSubscription(state, {
    customer: session.customer,
    quantity,
    metadata,
    at: state.now,
  });
  Object.assign(session, { status: 'complete', payment_status: 'paid', subscription: id, url: null });
  state.emit('checkout.session.completed', session);
  response.redirect(303, session.success_url.replace('{CHECKOUT_SESSION_ID}', session.id));
}

function portalPage(state: State, { id, customer, return_url }: PortalSession): string {
  const running = runningOf(state, customer);
  return page(
    'Your subscription',
    running ? subscriptionPart(id, running) : paragraph('There is no running subscription.'),
    '<h2>Card</h2>',
    form(`/portal/${id}/card`, 'Use this card, and pay what is open', choice('card', CARD_LABELS)),
    return_url === null ? '' : link(return_url, 'Back to the application'),
  );
}

function subscriptionPart(id: string, { status, cancel_at, items }: Subscription): string {
  const [{ quantity, current_period_end: end }] = items.data;
  return [
    paragraph(`${quantity} × seat, ${status.replace('_', ' ')}, paid until ${day(end)}.`),
    cancel_at === null
      ? form(`/portal/${id}/cancel`, 'Cancel at the end of the period')
      : paragraph(`It ends on ${day(cancel_at)}.`) + form(`/portal/${id}/keep`, 'Keep it after all'),
    form(`/portal/${id}/end`, 'Cancel now'),
  ].join('');
}

function changeInPortal(
  state: State,
  { customer }: PortalSession,
  act: 'cancel' | 'keep' | 'end' | 'card',
  body: unknown,
): void {
  const running = runningOf(state, customer);
  if (act === 'card') state.data.cards[customer] = cardForm(body ?? {}, '').card;
  if (running === undefined) return;
  if (act === 'card') payOpenInvoices(state, running, state.now);
  if (act === 'cancel') setEnd(state, running, running.items.data[0].current_period_end);
  if (act === 'keep') setEnd(state, running, null);
  if (act === 'end') endSubscription(state, running, state.now);
}

function runningOf(state: State, customer: string): Subscription | undefined {
  return Object.values(state.data.subscriptions).find(
    (one) => one.customer === customer && one.status !== 'canceled',
  );
}
