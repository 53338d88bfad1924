import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { PlansService } from '../plans/plans.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { TeamsService } from '../teams/teams.service.js';
import { BillingSync } from './billing-sync.service.js';
import { Payments } from './payments.js';
import { SeatChanges } from './seat-changes.service.js';

const PLAN_PATH = '/team/plan';

/** Sends an admin to the payment service's own pages: what happens there comes back as an event. */
@Injectable()
export class Checkouts {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly payments: Payments,
    private readonly plans: PlansService,
    private readonly teams: TeamsService,
    private readonly seatChanges: SeatChanges,
    private readonly syncs: BillingSync,
  ) {}

  /** The address where the plan is paid; one that was opened before can be paid no more. */
  async open(caller: Caller, seats: number, origin: string): Promise<string> {
    await this.syncs.sync(caller);
    await this.plans.ensure(caller.teamId);
    const { id: price } = await this.payments.price();
    return this.dataSource.transaction(async (manager) => {
      const customer = await this.ensureCustomer(manager, caller);
      await this.seatChanges.assertEnough(manager, caller.teamId, seats);
      await this.expireOpen(customer);
      const { url } = await this.payments.ask((service) =>
        service.checkout.sessions.create({
          mode: 'subscription',
          customer,
          client_reference_id: String(caller.teamId),
          line_items: [{ price, quantity: seats }],
          success_url: `${origin}${PLAN_PATH}?from=checkout`,
          cancel_url: `${origin}${PLAN_PATH}`,
        }),
      );
      return url ?? `${origin}${PLAN_PATH}`;
    });
  }

  /** The address where card and cancellation are seen to. */
  async openPortal({ teamId }: Caller, origin: string): Promise<string> {
    const customer = (await this.plans.find(teamId))?.customerId;
    if (!customer) throw new DomainError('billing.not-subscribed', 'The team has paid for no plan yet.');
    const { url } = await this.payments.ask((service) =>
      service.billingPortal.sessions.create({ customer, return_url: `${origin}${PLAN_PATH}?from=portal` }),
    );
    return url;
  }

  private async ensureCustomer(manager: EntityManager, { teamId, userId }: Caller): Promise<string> {
    const kept = await this.plans.lock(manager, teamId);
    if (kept?.status === 'active' || kept?.status === 'past-due')
      throw new DomainError('billing.subscribed', 'The team has a plan already: change its seats instead.');
    if (kept?.customerId) return kept.customerId;
    const member = await this.teams.findMember(userId, teamId);
    const { id } = await this.payments.ask((service) =>
      service.customers.create({
        name: member?.team.name,
        email: member?.account.email,
        metadata: { team: String(teamId) },
      }),
    );
    await this.plans.change(manager, teamId, { customerId: id });
    return id;
  }

  private async expireOpen(customer: string): Promise<void> {
    const { data } = await this.payments.ask((service) =>
      service.checkout.sessions.list({ customer, status: 'open', limit: 100 }),
    );
    for (const { id } of data) await this.payments.ask((service) => service.checkout.sessions.expire(id));
  }
}
