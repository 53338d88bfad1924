import { planState, type Standing } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { PlansService } from '../plans/plans.service.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { Membership } from './entities/membership.entity.js';

export interface SeatCount {
  /** People that the team's plan allows. */
  seats: number;
  /** Seats that are taken. */
  used: number;
}

/** How many people a team may have, and has. */
@Injectable()
export class SeatsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly plans: PlansService,
  ) {}

  async count(teamId: number): Promise<SeatCount> {
    const { seats } = await this.plans.stateOf(teamId);
    return { seats, used: await this.used(this.dataSource.manager, teamId) };
  }

  used(manager: EntityManager, teamId: number): Promise<number> {
    return manager.countBy(Membership, { teamId });
  }

  /**
   * Refuses to give away a seat that the team doesn't have. Call it before anything else in the transaction that
   * gives the seat away: it makes others who give or remove seats wait until that one ends.
   */
  async assertSeat(manager: EntityManager, teamId: number): Promise<void> {
    const { seats, standing } = planState(await this.plans.lock(manager, teamId), new Date());
    const used = await this.used(manager, teamId);
    if (used >= seats) throw new DomainError('access.seats', noSeat(seats, used, standing));
  }
}

function noSeat(seats: number, used: number, standing: Standing): string {
  const taken =
    seats === 1 ? 'The team’s one seat is taken' : `${used} of the team’s ${seats} seats are taken`;
  return standing === 'active' && seats > 1
    ? `${taken}: add a seat under Plan first, or free one.`
    : `${taken}: the Team plan, under Plan, has a seat for each person.`;
}
