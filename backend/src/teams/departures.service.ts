import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { PlansService } from '../plans/plans.service.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { Membership } from './entities/membership.entity.js';
import { readRoster, type Roster } from './roster.js';
import { TeamsService } from './teams.service.js';

/** What becomes of a team when a person closes their account. */
export interface Departure {
  team: { id: number; name: string };
  /** Nobody else is in the team: it is closed, and what it has kept where nobody can open it. */
  closes: boolean;
  /** Why the person can't go yet; null = they can. */
  obstacle: string | null;
}

/** Takes a person out of all their teams at once. */
@Injectable()
export class Departures {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly teams: TeamsService,
    private readonly plans: PlansService,
    private readonly audit: AuditService,
  ) {}

  async foresee(userId: number): Promise<Departure[]> {
    const { manager } = this.dataSource;
    const teamIds = await teamIdsOf(manager, userId);
    return Promise.all(teamIds.map(async (id) => this.departure(await readRoster(manager, id), userId)));
  }

  /** What the person has made stays. @throws where a team would be left without an admin, or with a plan that is paid */
  async leaveAll(manager: EntityManager, userId: number): Promise<void> {
    for (const teamId of await teamIdsOf(manager, userId)) {
      await this.teams.lockTeam(manager, teamId);
      const roster = await readRoster(manager, teamId);
      const { obstacle } = await this.departure(roster, userId);
      if (obstacle !== null) throw new DomainError('account.needed', `${roster.team.name}: ${obstacle}`);
      const { user, roles } = roster.member(userId);
      await manager.delete(Membership, { userId, teamId });
      const object = { kind: 'member' as const, id: userId, label: user.name };
      await this.audit.record(manager, { teamId, userId }, [
        { action: 'member.account-closed', object, from: { roles }, to: null },
      ]);
    }
  }

  private async departure(roster: Roster, userId: number): Promise<Departure> {
    const { id, name } = roster.team;
    const closes = roster.members.length === 1;
    const obstacle = closes ? await this.paidPlan(id) : replaceableFault(roster, userId);
    return { team: { id, name }, closes, obstacle };
  }

  private async paidPlan(teamId: number): Promise<string | null> {
    const plan = await this.plans.find(teamId);
    const runs = plan?.subscriptionId != null && ['active', 'past-due'].includes(plan.status ?? '');
    const isPaid = runs && plan.endsAt === null;
    return isPaid ? 'The team’s plan is being paid for: end it under Plan first.' : null;
  }
}

function replaceableFault(roster: Roster, userId: number): string | null {
  try {
    roster.assertReplaceable(roster.member(userId));
    return null;
  } catch (error) {
    if (error instanceof DomainError) return error.detail;
    throw error;
  }
}

async function teamIdsOf(manager: EntityManager, userId: number): Promise<number[]> {
  const memberships = await manager.find(Membership, { where: { userId }, order: { teamId: 'ASC' } });
  return memberships.map(({ teamId }) => teamId);
}
