import { type Role, ROLES } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { type TeamMemberDto, type TeamMemberListDto, toTeamMember } from './dto/team-member.dto.js';
import { Membership } from './entities/membership.entity.js';
import { readRoster, type Roster } from './roster.js';
import { TeamChanges } from './team-changes.service.js';

/** Who is in a team, and with which roles. */
@Injectable()
export class MembersService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly changes: TeamChanges,
  ) {}

  async list({ teamId }: Caller): Promise<TeamMemberListDto> {
    const { members, ownerId } = await readRoster(this.dataSource.manager, teamId);
    return { items: members.map((member) => toTeamMember(member, ownerId)), total: members.length };
  }

  async changeRoles(caller: Caller, id: string, chosen: readonly Role[]): Promise<TeamMemberDto> {
    const roles = ROLES.filter((role) => chosen.includes(role));
    await this.changes.asAdmin(caller, async (manager, roster) => {
      const member = roster.member(id);
      if (!roles.includes('admin')) roster.assertReplaceable(member);
      const { userId, teamId, roles: before } = member;
      if (String(before) === String(roles)) return null;
      await manager.update(Membership, { userId, teamId }, { roles });
      const [from, to] = [{ roles: before }, { roles }];
      return { action: 'member.roles-changed', object: objectOf(member), from, to };
    });
    const roster = await readRoster(this.dataSource.manager, caller.teamId);
    return toTeamMember(roster.member(id), roster.ownerId);
  }

  /** What the member has made stays; an open session ends with its next request. */
  remove(caller: Caller, id: string): Promise<void> {
    return this.changes.asAdmin(caller, async (manager, roster) => {
      const member = await takeOut(manager, roster, id);
      return { action: 'member.removed', object: objectOf(member), from: { roles: member.roles }, to: null };
    });
  }

  leave(caller: Caller): Promise<void> {
    return this.changes.asMember(caller, async (manager, roster) => {
      const { roles } = await takeOut(manager, roster, caller.userId);
      return { action: 'member.left', object: roster.object, from: { roles }, to: null };
    });
  }
}

async function takeOut(manager: EntityManager, roster: Roster, id: string | number): Promise<Membership> {
  const member = roster.member(id);
  roster.assertReplaceable(member);
  await manager.delete(Membership, { userId: member.userId, teamId: member.teamId });
  return member;
}

/** A member as the trail names them. */
function objectOf({ user: { id, name } }: Membership) {
  return { kind: 'member' as const, id, label: name };
}
