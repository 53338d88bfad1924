import { createHmac } from 'node:crypto';
import { setTimeout as delay } from 'node:timers/promises';
import type { Event } from './objects.js';
import type { Switches } from './switches.js';

const RETRIES = 6;

/** The header that proves who sent a body and when: the signature covers both. */
function signatureHeader(body: string, secret: string, timestamp: number): string {
  const signature = createHmac('sha256', secret).update(`${timestamp}.${body}`).digest('hex');
  return `t=${timestamp},v1=${signature}`;
}

/** Sends events to the application, again and again until it takes them. */
export class Delivery {
  private readonly running = new Set<Promise<void>>();
  private stopped = false;
  url?: string;

  constructor(
    private readonly secret: string,
    private readonly switches: Switches,
    private readonly firstWaitMs = 500,
  ) {}

  /** Sends the events of one act one after the other. */
  send(events: Event[]): void {
    const ordered = this.switches.reverse ? [...events].reverse() : events;
    const sent = this.switches.duplicate ? ordered.flatMap((event) => [event, event]) : ordered;
    if (sent.length === 0 || this.url === undefined) return;
    const run = this.sendAll(sent).finally(() => this.running.delete(run));
    this.running.add(run);
  }

  /** Ends when nothing is on its way any more. */
  async settled(): Promise<void> {
    while (this.running.size > 0) await Promise.all(this.running);
  }

  async stop(): Promise<void> {
    this.stopped = true;
    await this.settled();
  }

  private async sendAll(events: Event[]): Promise<void> {
    for (const event of events) await this.sendOne(event);
  }

  private async sendOne(event: Event): Promise<void> {
    for (let retry = 0; retry <= RETRIES && !this.stopped; retry++) {
      if (await this.isTaken(event)) {
        event.pending_webhooks = 0;
        return;
      }
      await delay(this.firstWaitMs * 2 ** retry);
    }
  }

  private async isTaken(event: Event): Promise<boolean> {
    const body = JSON.stringify(event);
    const signature = signatureHeader(body, this.secret, Math.floor(Date.now() / 1000));
    try {
      const { ok } = await fetch(this.url as string, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', 'Stripe-Signature': signature },
        body,
      });
      return ok;
    } catch {
      return false;
    }
  }
}
