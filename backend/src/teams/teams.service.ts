import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, Raw, type Repository } from 'typeorm';
import { PlansService } from '../plans/plans.service.js';
import { Membership } from './entities/membership.entity.js';
import { Team } from './entities/team.entity.js';
import { type Member, toMember } from './member.js';

@Injectable()
export class TeamsService {
  constructor(
    @InjectRepository(Membership) private readonly memberships: Repository<Membership>,
    private readonly plans: PlansService,
  ) {}

  async findMember(userId: number, teamId: number): Promise<Member | null> {
    const membership = await this.memberships.findOne({
      where: { userId, teamId },
      relations: { user: true, team: true },
    });
    return membership && this.toMember(membership);
  }

  /** The member in the team that the person opened last, or in the first of them where none was. */
  async findLastMember(userId: number): Promise<Member | null> {
    const membership = await this.memberships.findOne({
      where: { userId },
      order: { openedAt: 'DESC', teamId: 'ASC' },
      relations: { user: true, team: true },
    });
    return membership && this.toMember(membership);
  }

  /** Notes that the person goes to work in a team: the next sign-in opens it. */
  async noteOpened(userId: number, teamId: number): Promise<void> {
    await this.memberships.update({ userId, teamId }, { openedAt: new Date() });
  }

  /** The team's admins, as they stand in the transaction. */
  async findAdmins(manager: EntityManager, teamId: number): Promise<Member[]> {
    const memberships = await manager.find(Membership, {
      where: { teamId, roles: Raw((roles) => `FIND_IN_SET('admin', ${roles})`) },
      relations: { user: true, team: true },
    });
    return Promise.all(memberships.map((membership) => this.toMember(membership)));
  }

  /** All members of a team, in the order of their accounts. */
  async listMembers(teamId: number): Promise<Member[]> {
    const plan = await this.plans.stateOf(teamId);
    const memberships = await this.memberships.find({
      where: { teamId },
      order: { userId: 'ASC' },
      relations: { user: true, team: true },
    });
    return memberships.map((membership) => toMember(membership, plan));
  }

  /** All teams of a person, each with the roles that they have there. */
  async teamsOf(userId: number): Promise<Pick<Member, 'team' | 'roles'>[]> {
    return this.memberships.find({ where: { userId }, order: { teamId: 'ASC' }, relations: { team: true } });
  }

  /** Makes a team, on Free, with its first member as admin and owner; answers its id. */
  async found(manager: EntityManager, name: string, userId: number): Promise<number> {
    const { identifiers } = await manager.insert(Team, { name, ownerId: userId });
    const teamId = identifiers[0].id as number;
    await manager.insert(Membership, { userId, teamId, roles: ['admin'] });
    return teamId;
  }

  /** Holds the team until the transaction ends, so that what its plan limits is counted by one at a time. */
  async lockTeam(manager: EntityManager, teamId: number): Promise<void> {
    await manager.findOneOrFail(Team, { where: { id: teamId }, lock: { mode: 'pessimistic_write' } });
  }

  private async toMember(membership: Membership): Promise<Member> {
    return toMember(membership, await this.plans.stateOf(membership.teamId));
  }
}
