import { randomBytes } from 'node:crypto';
import { rmSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { buildStale } from './builds.mjs';
import { inLocal, inRoot } from './paths.mjs';
import { freePort } from './ports.mjs';
import { endProcess, launch } from './processes.mjs';
import { forget, remember } from './records.mjs';
import { StepError, step } from './steps.mjs';
import { whenEnding } from './supervision.mjs';

const MAIN = inRoot('backend', 'fakes', 'dist', 'payments', 'main.js');
const DEMO = inRoot('data', 'demo', 'tarnfield.json');
const HOST = '127.0.0.1';
const READY_WITHIN = 30_000;

/**
 * Starts a stand-in of the payment service, which sends its events to the application at `address`.
 * Answers `{ url, environment }`: its own pages, and the variables with which the application pays there.
 * @param {{ name: string, preferredPort: number, address: { url: string }, fresh?: boolean }} wanted
 */
export async function startPayments({ name, preferredPort, address, fresh = false }) {
  await buildStale(['fakes']);
  return step('Payment stand-in', async () => {
    const port = await freePort(preferredPort);
    const state = inLocal(`${name}.json`);
    if (fresh) rmSync(state, { force: true });
    const keys = { key: fakeSecret('sk_fake'), events: fakeSecret('whsec_fake') };
    const env = fakeEnvironment(port, keys, address, state);
    const { child, ended } = launch(process.execPath, [MAIN], { cwd: inRoot(), env });
    remember(name, { pid: child.pid, mark: MAIN });
    whenEnding(async () => {
      if (child.pid) await endProcess(child.pid);
      forget(name);
    });
    const url = `http://${HOST}:${port}`;
    await untilReady(url, ended);
    return { url, environment: applicationEnvironment(port, keys), outcome: `started, ${url}` };
  });
}

function fakeSecret(prefix) {
  return `${prefix}_${randomBytes(16).toString('hex')}`;
}

function fakeEnvironment(port, { key, events }, { url }, state) {
  return {
    ...process.env,
    FAKE_PORT: String(port),
    FAKE_SECRET_KEY: key,
    FAKE_WEBHOOK_SECRET: events,
    FAKE_WEBHOOK_URL: `${url}/api/billing/webhook`,
    FAKE_STATE: state,
    FAKE_DEMO: DEMO,
  };
}

function applicationEnvironment(port, { key, events }) {
  return {
    STRIPE_SECRET_KEY: key,
    STRIPE_WEBHOOK_SECRET: events,
    STRIPE_HOST: HOST,
    STRIPE_PORT: String(port),
    STRIPE_PROTOCOL: 'http',
  };
}

async function untilReady(url, ended) {
  let end;
  void ended.then((reason) => (end = reason));
  for (const until = Date.now() + READY_WITHIN; Date.now() < until; await delay(100)) {
    if (end) throw new StepError(`The payment stand-in ended with code ${end.code} before it was ready.`);
    const response = await fetch(url, { signal: AbortSignal.timeout(5_000) }).catch(() => undefined);
    if (response?.ok) return;
  }
  throw new StepError(`The payment stand-in was not ready within ${READY_WITHIN / 1000} s.`);
}
