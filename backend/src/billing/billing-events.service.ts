import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type Stripe from 'stripe';
import type { DataSource } from 'typeorm';
import { PlansService } from '../plans/plans.service.js';
import { isDuplicateEntry } from '../shared/errors/duplicate-entry.js';
import { BillingSync } from './billing-sync.service.js';
import { BillingEvent } from './entities/billing-event.entity.js';
import { FailedPaymentMail } from './failed-payment-mail.service.js';
import { Payments } from './payments.js';

const HANDLED: readonly string[] = [
  'checkout.session.completed',
  'customer.subscription.created',
  'customer.subscription.updated',
  'customer.subscription.deleted',
  'invoice.paid',
  'invoice.payment_failed',
] satisfies Stripe.Event.Type[];

/**
 * Takes what the payment service tells. An event only hints that something has changed for a customer: what has, the
 * service is asked. So events that come twice, late or in another order change nothing.
 */
@Injectable()
export class BillingEvents {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly payments: Payments,
    private readonly plans: PlansService,
    private readonly syncs: BillingSync,
    private readonly mail: FailedPaymentMail,
  ) {}

  async receive(body: unknown, signature: string | undefined): Promise<void> {
    const event = this.payments.readEvent(body, signature);
    const customer = HANDLED.includes(event.type) ? customerOf(event) : null;
    const kept = customer === null ? null : await this.plans.findByCustomer(customer);
    if (kept !== null) await this.act(event, kept.teamId).catch(ignoreRepeated);
  }

  private act({ id, type }: Stripe.Event, teamId: number): Promise<void> {
    return this.dataSource.transaction(async (manager) => {
      await manager.insert(BillingEvent, { id, type, receivedAt: new Date() });
      await this.syncs.syncWithin(manager, { teamId, userId: null });
      if (type === 'invoice.payment_failed') await this.mail.enqueue(manager, teamId);
    });
  }
}

/** Whose event it is: the only thing that is read of what it carries. */
function customerOf({ data }: Pick<Stripe.Event, 'data'>): string | null {
  const { customer } = data.object as { customer?: unknown };
  return typeof customer === 'string' ? customer : null;
}

/** The id is taken: the event was acted upon before. */
function ignoreRepeated(error: unknown): void {
  if (!isDuplicateEntry(error)) throw error;
}
