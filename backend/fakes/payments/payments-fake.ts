import express, { type NextFunction, type Request, type Response } from 'express';
import { once } from 'node:events';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { apiRouter } from './api.js';
import { ApiError } from './api-error.js';
import { DAY } from './calendar.js';
import { controlRouter } from './control.js';
import { Delivery } from './delivery.js';
import { page, paragraph } from './html.js';
import { pagesRouter } from './pages.js';
import { advance } from './passing-time.js';
import { State } from './state.js';
import { ALL_WELL, type Switches } from './switches.js';

export interface FakeOptions {
  secretKey: string;
  webhookSecret: string;
  /** 0 = any free one. */
  port?: number;
  state?: State;
  /** Wait before an event is sent again; it doubles with each try. */
  firstWaitMs?: number;
}

export interface PaymentsFake {
  port: number;
  origin: string;
  state: State;
  switches: Switches;
  /** Where events go. */
  deliverTo(url: string): void;
  /** Lets days pass and waits until their events have arrived. */
  letDaysPass(days: number): Promise<void>;
  /** Sends events of a type once more and waits until they have arrived. */
  resend(type?: string): Promise<void>;
  settled(): Promise<void>;
  close(): Promise<void>;
}

/** Starts a stand-in of the payment service on loopback. */
export async function startPaymentsFake(options: FakeOptions): Promise<PaymentsFake> {
  const { secretKey, webhookSecret, port = 0, state = new State() } = options;
  const switches = { ...ALL_WELL };
  const delivery = new Delivery(webhookSecret, switches, options.firstWaitMs);
  const app = express();
  const server = app.listen(port, '127.0.0.1');
  await once(server, 'listening');
  const { port: actual } = server.address() as AddressInfo;
  const origin = `http://127.0.0.1:${actual}`;
  const keep = () => {
    state.save();
    delivery.send(state.takeFresh());
  };
  configure(app, { origin, state, switches, delivery, secretKey, keep });
  return {
    port: actual,
    origin,
    state,
    switches,
    deliverTo: (url) => (delivery.url = url),
    letDaysPass: async (days) => {
      advance(state, days * DAY);
      keep();
      await delivery.settled();
    },
    resend: async (type) => {
      delivery.send(state.data.events.filter((event) => event.type === (type ?? event.type)));
      await delivery.settled();
    },
    settled: () => delivery.settled(),
    close: () => close(server, delivery),
  };
}

interface Parts {
  origin: string;
  state: State;
  switches: Switches;
  delivery: Delivery;
  secretKey: string;
  /** What follows every request. */
  keep: () => void;
}

function configure(
  app: express.Express,
  { origin, state, switches, delivery, secretKey, keep }: Parts,
): void {
  app.set('query parser', 'extended');
  app.set('json replacer', (_: string, value: unknown) => (isOwnPage(value) ? `${origin}${value}` : value));
  app.use((_, response, next) => {
    advance(state, 0);
    response.on('finish', keep);
    next();
  });
  app.use(pagesRouter(state), controlRouter(state, switches, delivery));
  app.use(apiRouter(state, switches, secretKey));
  app.use(answerError);
}

/** What goes wrong on a page. */
function answerError(error: unknown, _: Request, response: Response, next: NextFunction): void {
  if (!(error instanceof ApiError)) return next(error);
  response.status(error.status).send(page('This can’t be done', paragraph(error.body.message)));
}

async function close(server: Server, delivery: Delivery): Promise<void> {
  server.close();
  server.closeAllConnections();
  await delivery.stop();
}

/** Addresses are kept without the port, which may be another after a restart. */
function isOwnPage(value: unknown): value is string {
  return typeof value === 'string' && /^\/(pay|portal|invoice)\//.test(value);
}
