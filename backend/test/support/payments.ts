import { createHmac } from 'node:crypto';
import { type PaymentsFake, startPaymentsFake } from '../../fakes/payments/payments-fake.js';
import { emptyData, State } from '../../fakes/payments/state.js';
import { startTestApp, type TestApp } from './test-app.js';

const SECRET_KEY = 'sk_fake_of_the_tests';
export const WEBHOOK_SECRET = 'whsec_fake_of_the_tests';
const DAY = 86_400;

/** The application and a stand-in of the payment service that sends its events to it. */
export async function startPaidApp(): Promise<{ app: TestApp; payments: PaymentsFake }> {
  const payments = await startPaymentsFake({
    secretKey: SECRET_KEY,
    webhookSecret: WEBHOOK_SECRET,
    state: new State(emptyData()),
    firstWaitMs: 20,
  });
  const app = await startTestApp({
    STRIPE_SECRET_KEY: SECRET_KEY,
    STRIPE_WEBHOOK_SECRET: WEBHOOK_SECRET,
    STRIPE_HOST: '127.0.0.1',
    STRIPE_PORT: String(payments.port),
    STRIPE_PROTOCOL: 'http',
  });
  payments.deliverTo(`${await app.nest.getUrl()}/api/billing/webhook`);
  return { app, payments };
}

/** Turns the service's clock, so that what happens next happened so many days ago. */
export function daysAgo(payments: PaymentsFake, days: number): void {
  payments.state.data.ahead = -days * DAY;
}

/** Sends a form of the service's own pages; answers where it leads. */
export async function press(url: string, fields: Record<string, string> = {}): Promise<string | null> {
  const body = new URLSearchParams(fields);
  const { headers } = await fetch(url, { method: 'POST', body, redirect: 'manual' });
  return headers.get('location');
}

/** The header that the service sends with an event. */
export function signed(body: string, at = Math.floor(Date.now() / 1000), secret = WEBHOOK_SECRET): string {
  return `t=${at},v1=${createHmac('sha256', secret).update(`${at}.${body}`).digest('hex')}`;
}
