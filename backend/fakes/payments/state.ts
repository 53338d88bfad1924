import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { missing } from './api-error.js';
import type {
  Card,
  CheckoutSession,
  Customer,
  Event,
  Invoice,
  PortalSession,
  Price,
  Subscription,
} from './objects.js';

const API_VERSION = '2026-10-28.endive';

export const PRICE: Price = {
  id: 'price_team_seat_month',
  object: 'price',
  active: true,
  livemode: false,
  lookup_key: 'roothertz_team_seat_month',
  currency: 'eur',
  unit_amount: 1900,
  type: 'recurring',
  recurring: { interval: 'month', interval_count: 1, usage_type: 'licensed' },
  product: 'prod_team',
};

export interface Reply {
  request: string;
  status: number;
  body: object;
}

/** Everything that the stand-in keeps. */
export interface Data {
  /** Seconds by which its clock is ahead of the machine's, or below zero behind it. */
  ahead: number;
  customers: Record<string, Customer>;
  cards: Record<string, Card>;
  /** What each open Checkout session sells. */
  carts: Record<string, { quantity: number; metadata: Record<string, string> }>;
  sessions: Record<string, CheckoutSession>;
  subscriptions: Record<string, Subscription>;
  invoices: Record<string, Invoice & { id: string }>;
  portals: Record<string, PortalSession>;
  events: Event[];
  replies: Record<string, Reply>;
}

export function emptyData(): Data {
  return {
    ahead: 0,
    customers: {},
    cards: {},
    carts: {},
    sessions: {},
    subscriptions: {},
    invoices: {},
    portals: {},
    events: [],
    replies: {},
  };
}

/** What the stand-in keeps, its clock, and the events that its last act has caused. */
export class State {
  private readonly fresh: Event[] = [];

  constructor(
    readonly data: Data = emptyData(),
    private readonly file?: string,
  ) {}

  /** Goes on with what a file holds, or begins with `initial`. */
  static load(file: string, initial: () => Data): State {
    return new State(existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as Data) : initial(), file);
  }

  get now(): number {
    return Math.floor(Date.now() / 1000) + this.data.ahead;
  }

  save(): void {
    if (this.file === undefined) return;
    writeFileSync(`${this.file}.new`, JSON.stringify(this.data), { mode: 0o600 });
    renameSync(`${this.file}.new`, this.file);
  }

  emit(type: string, object: object, created = this.now): void {
    const event: Event = {
      id: newId('evt'),
      object: 'event',
      api_version: API_VERSION,
      created,
      livemode: false,
      type,
      data: { object: structuredClone(object) },
      pending_webhooks: 1,
      request: { id: null, idempotency_key: null },
    };
    this.data.events.push(event);
    this.fresh.push(event);
  }

  /** The events since it was last asked. */
  takeFresh(): Event[] {
    return this.fresh.splice(0);
  }
}

export function newId(prefix: string): string {
  return `${prefix}_${randomBytes(12).toString('hex')}`;
}

export function findIn<Kept>(kept: Record<string, Kept>, id: string, what: string): Kept {
  if (!Object.hasOwn(kept, id)) throw missing(what, id);
  return kept[id];
}
