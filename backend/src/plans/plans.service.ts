import { type PlanState, planState } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { Subscription } from './entities/subscription.entity.js';

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

  /** Holds the team's subscription until the transaction ends, so that seats are counted and changed by one at a time. */
  lock(manager: EntityManager, teamId: number): Promise<Subscription | null> {
    return manager.findOne(Subscription, { where: { teamId }, lock: { mode: 'pessimistic_write' } });
  }
}
