import { readFileSync } from 'node:fs';
import { demoData } from './demo.js';
import { startPaymentsFake } from './payments-fake.js';
import { State } from './state.js';

/** Runs the stand-in by itself, as `npm start` does: everything it needs comes in its environment. */
const { FAKE_PORT, FAKE_SECRET_KEY, FAKE_WEBHOOK_SECRET, FAKE_WEBHOOK_URL, FAKE_STATE, FAKE_DEMO } =
  process.env;
if (!FAKE_PORT || !FAKE_SECRET_KEY || !FAKE_WEBHOOK_SECRET || !FAKE_WEBHOOK_URL || !FAKE_STATE || !FAKE_DEMO)
  throw new Error(
    'The stand-in needs FAKE_PORT, _SECRET_KEY, _WEBHOOK_SECRET, _WEBHOOK_URL, _STATE and _DEMO.',
  );

const demo = JSON.parse(readFileSync(FAKE_DEMO, 'utf8')) as Parameters<typeof demoData>[0];
const fake = await startPaymentsFake({
  secretKey: FAKE_SECRET_KEY,
  webhookSecret: FAKE_WEBHOOK_SECRET,
  port: Number(FAKE_PORT),
  state: State.load(FAKE_STATE, () => demoData(demo)),
});
fake.deliverTo(FAKE_WEBHOOK_URL);
for (const signal of ['SIGINT', 'SIGTERM'] as const)
  process.on(signal, () => void fake.close().then(() => process.exit(0)));
