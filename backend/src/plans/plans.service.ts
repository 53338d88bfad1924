import { type PlanState, planState } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { Subscription } from './entities/subscription.entity.js';

type SubscriptionChanges = Partial<Omit<Subscription, 'teamId' | 'team'>>;

@Injectable()
export class PlansService {
  constructor(@InjectRepository(Subscription) private readonly subscriptions: Repository<Subscription>) {}

  find(teamId: number): Promise<Subscription | null> {
    return this.subscriptions.findOneBy({ teamId });
  }

  /** The subscription of a customer at the payment service. */
  findByCustomer(customerId: string): Promise<Subscription | null> {
    return this.subscriptions.findOneBy({ customerId });
  }

  /** The team's plan now. */
  async stateOf(teamId: number): Promise<PlanState> {
    return planState(await this.find(teamId), new Date());
  }

  /**
   * Makes sure that the team has a row to keep its trial or subscription in, so that it can be held. Not within the
   * transaction that holds it: of two that met here, both would wait for each other there.
   */
  async ensure(teamId: number): Promise<void> {
    await this.subscriptions.createQueryBuilder().insert().values({ teamId }).orIgnore().execute();
  }

  /** Holds the team's subscription until the transaction ends, so that seats are counted and changed by one at a time. */
  lock(manager: EntityManager, teamId: number): Promise<Subscription | null> {
    return manager.findOne(Subscription, { where: { teamId }, lock: { mode: 'pessimistic_write' } });
  }

  async change(manager: EntityManager, teamId: number, changes: SubscriptionChanges): Promise<void> {
    await manager.update(Subscription, { teamId }, changes);
  }
}
