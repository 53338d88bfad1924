import { createServer, type Server } from 'node:http';
import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import Stripe from 'stripe';
import { DAY } from './calendar.js';
import { demoData } from './demo.js';
import { type PaymentsFake, startPaymentsFake } from './payments-fake.js';
import { PRICE, State } from './state.js';

const SECRET_KEY = 'sk_fake_of_the_spec';
const WEBHOOK_SECRET = 'whsec_fake_of_the_spec';

describe('the stand-in of the payment service, through its official SDK', () => {
  let fake: PaymentsFake;
  let stripe: Stripe;
  let inbox: Server;
  let received: Stripe.Event[];
  let refuseNext = 0;

  beforeEach(async () => {
    received = [];
    fake = await startPaymentsFake({ secretKey: SECRET_KEY, webhookSecret: WEBHOOK_SECRET, firstWaitMs: 5 });
    stripe = clientOf(SECRET_KEY);
    inbox = createServer((request, response) => {
      const chunks: Buffer[] = [];
      request.on('data', (chunk: Buffer) => chunks.push(chunk));
      request.on('end', () => {
        if (refuseNext-- > 0) return response.writeHead(500).end();
        const signature = String(request.headers['stripe-signature']);
        received.push(stripe.webhooks.constructEvent(Buffer.concat(chunks), signature, WEBHOOK_SECRET));
        response.writeHead(204).end();
      });
    }).listen(0, '127.0.0.1');
    await once(inbox, 'listening');
    refuseNext = 0;
    fake.deliverTo(`http://127.0.0.1:${(inbox.address() as AddressInfo).port}/`);
  });
  afterEach(async () => {
    await fake.close();
    inbox.close();
  });

  const clientOf = (key: string) =>
    new Stripe(key, {
      host: '127.0.0.1',
      port: fake.port,
      protocol: 'http',
      telemetry: false,
      maxNetworkRetries: 0,
    });
  const post = (url: string, fields: Record<string, string>) =>
    fetch(url, { method: 'POST', body: new URLSearchParams(fields), redirect: 'manual' });
  const types = () => received.map(({ type }) => type);

  async function checkout(quantity = 3) {
    const customer = await stripe.customers.create({ name: 'Weir & Sons', metadata: { team: '7' } });
    const session = await stripe.checkout.sessions.create({
      mode: 'subscription',
      customer: customer.id,
      line_items: [{ price: PRICE.id, quantity }],
      success_url: 'http://app.example/plan?session={CHECKOUT_SESSION_ID}',
      cancel_url: 'http://app.example/plan',
    });
    return { customer: customer.id, session, url: String(session.url) };
  }

  async function subscribed(card = 'pays') {
    const { customer, url } = await checkout();
    await post(url, { card });
    await fake.settled();
    const { data } = await stripe.subscriptions.list({ customer });
    return { customer, id: data[0].id, item: data[0].items.data[0].id };
  }

  it('sells a subscription, tells of it with signed events, and sends the payer back', async () => {
    const { customer, session, url } = await checkout();
    const { headers, status } = await post(url, { card: 'pays' });
    expect([status, headers.get('location')]).toEqual([303, `http://app.example/plan?session=${session.id}`]);
    await fake.settled();
    expect(types()).toEqual(['invoice.paid', 'customer.subscription.created', 'checkout.session.completed']);
    const { data } = await stripe.subscriptions.list({ customer, status: 'all' });
    expect(data).toMatchObject([
      { status: 'active', items: { data: [{ quantity: 3, price: { unit_amount: 1900 } }] } },
    ]);
    const { data: invoices } = await stripe.invoices.list({ customer });
    expect(invoices).toMatchObject([{ status: 'paid', total: 5700, amount_paid: 5700 }]);
    expect(invoices[0].parent?.subscription_details?.subscription).toBe(data[0].id);
    expect(await (await fetch(String(invoices[0].hosted_invoice_url))).text()).toContain('57.00 EUR');
    expect((await post(url, { card: 'pays' })).status).toBe(400);
  });

  it('takes nothing from a card that is declined, and marks its pages as a stand-in', async () => {
    const { customer, url } = await checkout();
    const text = await (await post(url, { card: 'declined' })).text();
    expect(text).toMatch(/Local stand-in[\s\S]*card was declined/);
    expect((await stripe.subscriptions.list({ customer, status: 'all' })).data).toEqual([]);
    expect(types()).toEqual([]);
  });

  it('previews a change of seats and charges what it said', async () => {
    const { customer, id, item } = await subscribed();
    await fake.letDaysPass(10);
    const items = [{ id: item, quantity: 5 }];
    const preview = await stripe.invoices.createPreview({
      subscription: id,
      subscription_details: { items, proration_behavior: 'always_invoice' },
    });
    const date = preview.parent?.subscription_details?.subscription_proration_date;
    expect(preview.total).toBeGreaterThan(2000);
    expect(preview.total).toBeLessThan(3800);
    await stripe.subscriptions.update(id, {
      items,
      proration_behavior: 'always_invoice',
      proration_date: date,
      payment_behavior: 'error_if_incomplete',
    });
    const { data } = await stripe.invoices.list({ customer, limit: 1 });
    expect(data[0]).toMatchObject({
      total: preview.total,
      status: 'paid',
      billing_reason: 'subscription_update',
    });
    const upcoming = await stripe.invoices.createPreview({ subscription: id });
    expect(upcoming.total).toBe(5 * 1900);
  });

  it('keeps the credit of removed seats for the next invoice', async () => {
    const { customer, id, item } = await subscribed();
    await stripe.subscriptions.update(id, {
      items: [{ id: item, quantity: 1 }],
      proration_behavior: 'always_invoice',
      payment_behavior: 'error_if_incomplete',
    });
    expect(await stripe.customers.retrieve(customer)).toMatchObject({ balance: -3800 });
    expect(await stripe.invoices.createPreview({ subscription: id })).toMatchObject({
      total: 1900,
      amount_due: 0,
    });
  });

  it('renews by its clock, falls past due with the card, and is paid again through the portal', async () => {
    const { customer, id } = await subscribed('later');
    received = [];
    await fake.letDaysPass(32);
    expect(await stripe.subscriptions.retrieve(id)).toMatchObject({ status: 'past_due' });
    expect(types()).toContain('invoice.payment_failed');
    await fake.letDaysPass(15);
    const [open] = (await stripe.invoices.list({ subscription: id, status: 'open' })).data;
    const daysOpen = (Date.now() / 1000 - Number(open.status_transitions.finalized_at)) / DAY;
    expect(daysOpen).toBeGreaterThan(15);
    expect(daysOpen).toBeLessThan(20);
    const { url } = await stripe.billingPortal.sessions.create({ customer });
    expect(await (await fetch(url)).text()).toContain('past due');
    await post(`${url}/card`, { card: 'pays' });
    await fake.settled();
    expect(await stripe.subscriptions.retrieve(id)).toMatchObject({ status: 'active' });
    expect((await stripe.invoices.list({ subscription: id, status: 'open' })).data).toEqual([]);
  });

  it('ends a subscription at its period’s end when the portal cancels it', async () => {
    const { customer, id } = await subscribed();
    const { url } = await stripe.billingPortal.sessions.create({ customer });
    await post(`${url}/cancel`, {});
    const cancelled = await stripe.subscriptions.retrieve(id);
    expect(cancelled).toMatchObject({ cancel_at_period_end: false, status: 'active' });
    expect(cancelled.cancel_at).toBe(cancelled.items.data[0].current_period_end);
    await fake.letDaysPass(32);
    expect(await stripe.subscriptions.retrieve(id)).toMatchObject({
      status: 'canceled',
      ended_at: Number(cancelled.cancel_at) - 32 * DAY,
    });
    expect(types().at(-1)).toBe('customer.subscription.deleted');
  });

  it('is told to end a subscription at its period’s end, not to, and at once', async () => {
    const { id } = await subscribed();
    const ending = await stripe.subscriptions.update(id, { cancel_at_period_end: true });
    expect(ending.cancel_at).toBe(ending.items.data[0].current_period_end);
    await expect(stripe.invoices.createPreview({ subscription: id })).rejects.toMatchObject({
      code: 'invoice_upcoming_none',
    });
    expect(await stripe.subscriptions.update(id, { cancel_at_period_end: false })).toMatchObject({
      cancel_at: null,
    });
    expect(await stripe.subscriptions.cancel(id)).toMatchObject({ status: 'canceled' });
    await expect(stripe.subscriptions.cancel(id)).rejects.toMatchObject({ statusCode: 400 });
  });

  it('refuses what it doesn’t know with the error object of the service', async () => {
    const stray = { name: 'x', colour: 'red' } as Stripe.CustomerCreateParams;
    await expect(stripe.customers.create(stray)).rejects.toMatchObject({
      type: 'StripeInvalidRequestError',
      code: 'parameter_unknown',
      param: 'colour',
      statusCode: 400,
    });
    await expect(stripe.coupons.list()).rejects.toMatchObject({
      statusCode: 404,
      message: /Unrecognized request URL/,
    });
    await expect(stripe.customers.retrieve('cus_none')).rejects.toMatchObject({ code: 'resource_missing' });
    await expect(clientOf('sk_fake_wrong').customers.list()).rejects.toMatchObject({
      type: 'StripeAuthenticationError',
    });
    await expect(
      stripe.billingPortal.sessions.create({} as Stripe.BillingPortal.SessionCreateParams),
    ).rejects.toMatchObject({ code: 'parameter_missing', param: 'customer' });
  });

  it('answers a repeated idempotency key as before, and refuses it for anything else', async () => {
    const create = (name: string) => stripe.customers.create({ name }, { idempotencyKey: 'once' });
    const [first, second] = [await create('Weir'), await create('Weir')];
    expect(second.id).toBe(first.id);
    expect(second.lastResponse.headers['idempotent-replayed']).toBe('true');
    await expect(create('Sons')).rejects.toMatchObject({ type: 'StripeIdempotencyError' });
  });

  it('sends an event until it is taken, and with the switches twice, in reverse and again', async () => {
    refuseNext = 2;
    await subscribed();
    expect(types()).toEqual(['invoice.paid', 'customer.subscription.created', 'checkout.session.completed']);
    received = [];
    await post(`${fake.origin}/control/switches`, { duplicate: 'true', reverse: 'true' });
    await subscribed();
    expect(types()).toEqual([
      'checkout.session.completed',
      'checkout.session.completed',
      'customer.subscription.created',
      'customer.subscription.created',
      'invoice.paid',
      'invoice.paid',
    ]);
    received = [];
    await post(`${fake.origin}/control/switches`, { duplicate: 'false', reverse: 'false' });
    await fake.resend('invoice.paid');
    expect(types()).toEqual(['invoice.paid', 'invoice.paid']);
  });

  it('fails as many requests as the switch says', async () => {
    await post(`${fake.origin}/control/switches`, { failNext: '1' });
    await expect(stripe.customers.create({})).rejects.toMatchObject({
      statusCode: 500,
      type: 'StripeAPIError',
    });
    await stripe.customers.create({});
  });

  it('pages through a list', async () => {
    for (let count = 0; count < 3; count++) await subscribed();
    const all = await stripe.subscriptions.list({ limit: 2 }).autoPagingToArray({ limit: 10 });
    expect(new Set(all.map(({ id }) => id)).size).toBe(3);
  });

  it('begins with the demo team’s paid seats', () => {
    const demo = { seats: 8, customerId: 'cus_demo', subscriptionId: 'sub_demo' };
    const state = new State(demoData({ team: { name: 'Tarnfield' }, subscription: demo }));
    const { items, status } = state.data.subscriptions.sub_demo;
    expect([status, items.data[0].quantity]).toEqual(['active', 8]);
    expect(items.data[0].current_period_start).toBeLessThan(state.now - 9 * DAY);
  });
});
