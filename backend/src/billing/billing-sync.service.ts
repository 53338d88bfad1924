import { PLAN_LABELS } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type Stripe from 'stripe';
import type { DataSource, EntityManager } from 'typeorm';
import { type Actor, AuditService } from '../audit/audit.service.js';
import type { Subscription } from '../plans/entities/subscription.entity.js';
import { PlansService } from '../plans/plans.service.js';
import { Payments } from './payments.js';
import { chooseSubscription, type PaidFacts, statusOf, subscriptionFacts } from './subscription-facts.js';

const MOST_SUBSCRIPTIONS = 100;

/** Brings what is kept of a team's subscription to what the payment service says now. */
@Injectable()
export class BillingSync {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly payments: Payments,
    private readonly plans: PlansService,
    private readonly audit: AuditService,
  ) {}

  sync(actor: Actor): Promise<void> {
    return this.dataSource.transaction((manager) => this.syncWithin(manager, actor));
  }

  /**
   * The service is asked while the team's subscription is held: whoever is second asks later, and so never writes
   * what is older than what stands.
   */
  async syncWithin(manager: EntityManager, actor: Actor): Promise<void> {
    const kept = await this.plans.lock(manager, actor.teamId);
    const facts = kept?.customerId ? await this.ask(kept.customerId, kept.pastDueSince) : null;
    if (kept === null || facts === null || isSame(kept, facts, KEPT)) return;
    await this.plans.change(manager, actor.teamId, facts);
    if (!isSame(kept, facts, TOLD)) await this.record(manager, actor, kept, facts);
  }

  /** The customer's subscription that counts, as the service has it now. */
  async findSubscription(customer: string): Promise<Stripe.Subscription | null> {
    const { data } = await this.payments.ask((service) =>
      service.subscriptions.list({ customer, status: 'all', limit: MOST_SUBSCRIPTIONS }),
    );
    return chooseSubscription(data);
  }

  private async ask(customer: string, known: Date | null): Promise<PaidFacts | null> {
    const subscription = await this.findSubscription(customer);
    if (subscription === null) return null;
    const open = statusOf(subscription) === 'past-due' ? await this.openInvoices(subscription.id) : [];
    return subscriptionFacts(subscription, open, known, new Date());
  }

  private async openInvoices(subscription: string): Promise<Stripe.Invoice[]> {
    const { data } = await this.payments.ask((service) =>
      service.invoices.list({ subscription, status: 'open', limit: 100 }),
    );
    return data;
  }

  private record(manager: EntityManager, actor: Actor, kept: Subscription, facts: PaidFacts): Promise<void> {
    const object = { kind: 'plan' as const, id: actor.teamId, label: PLAN_LABELS.team };
    const change = { action: 'plan.changed' as const, object, from: told(kept), to: told(facts) };
    return this.audit.record(manager, actor, [change]);
  }
}

/** What the trail tells of: a new period alone is no change of the plan. */
const TOLD = ['status', 'seats', 'endsAt', 'pastDueSince'] as const;
const KEPT = [...TOLD, 'subscriptionId', 'currentPeriodEnd'] as const;

type Facts = Pick<Subscription, (typeof KEPT)[number]>;

function isSame(one: Facts, other: Facts, names: readonly (keyof Facts)[]): boolean {
  return names.every((name) => one[name]?.valueOf() === other[name]?.valueOf());
}

function told(facts: Facts): object {
  return Object.fromEntries(TOLD.map((name) => [name, facts[name]]));
}
