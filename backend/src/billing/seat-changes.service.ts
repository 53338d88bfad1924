import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type Stripe from 'stripe';
import type { DataSource, EntityManager } from 'typeorm';
import { PlansService } from '../plans/plans.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { SeatsService } from '../teams/seats.service.js';
import { BillingSync } from './billing-sync.service.js';
import { type Money, toMoney } from './money.js';
import { Payments } from './payments.js';

/** Seconds for which what a preview said is kept to. */
const PREVIEW_HOLDS = 15 * 60;

export interface SeatPreview {
  seats: number;
  /** What is charged at once; below zero = credited to the next invoices. */
  dueNow: Money;
  /** What each month costs from then on. */
  monthly: Money;
  /** The moment for which it was worked out: the change is made for the same. */
  prorationDate: number;
}

interface Change {
  subscription: string;
  /** Whose quantity changes. */
  items: [{ id: string; quantity: number }];
  price: Stripe.Price;
}

/** More or fewer seats within a running period: what it costs is said before it is done. */
@Injectable()
export class SeatChanges {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly payments: Payments,
    private readonly plans: PlansService,
    private readonly seats: SeatsService,
    private readonly syncs: BillingSync,
  ) {}

  async preview({ teamId }: Caller, seats: number): Promise<SeatPreview> {
    const { manager } = this.dataSource;
    await this.assertEnough(manager, teamId, seats);
    const change = await this.changeOf((await this.plans.find(teamId))?.customerId, seats);
    const { total, currency, prorationDate } = await this.previewInvoice(change);
    return {
      seats,
      dueNow: toMoney(total, currency),
      monthly: toMoney(seats * (change.price.unit_amount ?? 0), change.price.currency),
      prorationDate,
    };
  }

  /** Holds the team's subscription meanwhile, so that nobody is invited onto a seat that goes. */
  change(caller: Caller, seats: number, prorationDate: number): Promise<void> {
    return this.dataSource.transaction(async (manager) => {
      const kept = await this.plans.lock(manager, caller.teamId);
      await this.assertEnough(manager, caller.teamId, seats);
      const { subscription, ...change } = await this.changeOf(kept?.customerId, seats);
      await this.assertRecent({ subscription, ...change }, prorationDate);
      await this.payments.ask((service) =>
        service.subscriptions.update(subscription, {
          items: change.items,
          proration_behavior: 'always_invoice',
          proration_date: prorationDate,
          payment_behavior: 'error_if_incomplete',
        }),
      );
      await this.syncs.syncWithin(manager, caller);
    });
  }

  /** Refuses fewer seats than are taken. */
  async assertEnough(manager: EntityManager, teamId: number, seats: number): Promise<void> {
    const used = await this.seats.used(manager, teamId);
    if (seats >= used) return;
    const message = `seats: ${used} are taken: remove members or invitations first`;
    throw new DomainError('billing.seats', 'There can’t be fewer seats than are taken.', {
      errors: [{ field: 'seats', message }],
    });
  }

  private async changeOf(customer: string | null | undefined, quantity: number): Promise<Change> {
    const subscription = customer ? await this.syncs.findSubscription(customer) : null;
    if (subscription?.status !== 'active') throw notPaid(subscription?.status === 'past_due');
    const [{ id, price }] = subscription.items.data;
    return { subscription: subscription.id, items: [{ id, quantity }], price };
  }

  private async previewInvoice({ subscription, items }: Change) {
    const invoice = await this.payments.ask((service) =>
      service.invoices.createPreview({
        subscription,
        subscription_details: { items, proration_behavior: 'always_invoice' },
      }),
    );
    const prorationDate = invoice.parent?.subscription_details?.subscription_proration_date;
    return {
      total: invoice.total,
      currency: invoice.currency,
      prorationDate: prorationDate ?? Math.floor(Date.now() / 1000),
    };
  }

  /** A date of one's own choosing would be a discount: only what a preview has just said holds. */
  private async assertRecent(change: Change, prorationDate: number): Promise<void> {
    const { prorationDate: now } = await this.previewInvoice(change);
    if (prorationDate <= now && prorationDate > now - PREVIEW_HOLDS) return;
    throw new DomainError(
      'billing.outdated',
      'What the change costs has changed meanwhile: look at it again.',
    );
  }
}

function notPaid(isPastDue: boolean): DomainError {
  return isPastDue
    ? new DomainError('billing.not-subscribed', 'A payment is missing: pay it first, then change the seats.')
    : new DomainError('billing.not-subscribed', 'The team has no paid plan whose seats could be changed.');
}
