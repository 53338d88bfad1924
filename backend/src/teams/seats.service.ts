import { planState, type Standing } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager, IsNull, MoreThan, Not } from 'typeorm';
import { PlansService } from '../plans/plans.service.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { Invitation } from './invitations/entities/invitation.entity.js';
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

  /** Who is in the team, and who may still come: an invitation keeps its seat. */
  async used(manager: EntityManager, teamId: number, exceptInvitation = 0): Promise<number> {
    const members = await manager.countBy(Membership, { teamId });
    const invited = await manager.countBy(Invitation, {
      teamId,
      id: Not(exceptInvitation),
      openEmail: Not(IsNull()),
      expiresAt: MoreThan(new Date()),
    });
    return members + invited;
  }

  /** Makes others who give or remove seats wait until the transaction ends; call it before anything else in it. */
  async hold(manager: EntityManager, teamId: number): Promise<void> {
    await this.plans.lock(manager, teamId);
  }

  /**
   * Refuses to give away a seat that the team doesn't have, in a transaction that holds the seats.
   *
   * @param exceptInvitation the invitation that the seat is for
   */
  async assertSeat(manager: EntityManager, teamId: number, exceptInvitation?: number): Promise<void> {
    const { seats, standing } = planState(await this.plans.lock(manager, teamId), new Date());
    const used = await this.used(manager, teamId, exceptInvitation);
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
