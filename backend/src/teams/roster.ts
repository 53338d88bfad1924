import type { Role } from '@roothertz/common/access';
import type { EntityManager } from 'typeorm';
import { DomainError } from '../shared/errors/domain-error.js';
import { readId } from '../shared/ids/read-id.js';
import { Membership } from './entities/membership.entity.js';
import { Team } from './entities/team.entity.js';

/** All members of a team, and which of them holds its plan. */
export class Roster {
  constructor(
    readonly team: Team,
    readonly members: readonly Membership[],
  ) {}

  /** The owner; where that account is gone, the admin who has been there longest. */
  get ownerId(): number | null {
    const { ownerId } = this.team;
    const admins = this.members.filter(isAdmin);
    return admins.find(({ userId }) => userId === ownerId)?.userId ?? admins[0]?.userId ?? null;
  }

  /** The team as the trail names it. */
  get object() {
    const { id, name } = this.team;
    return { kind: 'team' as const, id, label: name };
  }

  /** @throws where the team has no such member */
  member(id: string | number): Membership {
    const userId = readId(String(id));
    const member = this.members.find((one) => one.userId === userId);
    if (member === undefined) throw new DomainError('member.not-found', 'Your team has no such member.');
    return member;
  }

  /** Refuses that a member stops being an admin where the team would be left without one, or without its owner. */
  assertReplaceable(member: Membership): void {
    if (!isAdmin(member)) return;
    if (this.members.filter(isAdmin).length === 1)
      throw new DomainError(
        'team.last-admin',
        'A team needs an admin: make somebody else one first, then try again.',
      );
    if (member.userId === this.ownerId)
      throw new DomainError('team.owner', 'This member holds the team’s plan: hand the team over first.');
  }
}

export async function readRoster(manager: EntityManager, teamId: number): Promise<Roster> {
  const team = await manager.findOneByOrFail(Team, { id: teamId });
  const members = await manager.find(Membership, {
    where: { teamId },
    relations: { user: true },
    order: { joinedAt: 'ASC', userId: 'ASC' },
  });
  return new Roster(team, members);
}

export function isAdmin({ roles }: { roles: readonly Role[] }): boolean {
  return roles.includes('admin');
}
