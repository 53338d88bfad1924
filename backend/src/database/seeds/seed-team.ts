import type { Role } from '@roothertz/common/access';
import type { EntityManager } from 'typeorm';
import { hashPassword } from '../../auth/passwords.js';
import { Membership } from '../../teams/entities/membership.entity.js';
import { Subscription } from '../../plans/entities/subscription.entity.js';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';
import type { DemoData } from './demo-data.js';

const DEMO_PASSWORD = 'quiet-bench-2026';

export interface SeededTeam {
  teamId: number;
  /** The first member who designs. */
  engineerId: number;
  /** The first member who keeps the prices. */
  buyerId: number;
}

/** Makes the demo team with an account for each of its members. */
export async function seedTeam(
  manager: EntityManager,
  { team, members, subscription }: DemoData,
): Promise<SeededTeam> {
  const { id: teamId } = await manager.save(Team, { ...team });
  await manager.insert(Subscription, { teamId, status: 'active', ...subscription });
  const userIds: number[] = [];
  for (const { email, name, roles } of members) {
    const passwordHash = await hashPassword(DEMO_PASSWORD);
    const { id: userId } = await manager.save(User, { email, name, passwordHash });
    await manager.insert(Membership, { userId, teamId, roles });
    userIds.push(userId);
  }
  await manager.update(Team, { id: teamId }, { ownerId: userIds[0] });
  const firstWho = (role: Role) => userIds[members.findIndex(({ roles }) => roles.includes(role))];
  return { teamId, engineerId: firstWho('engineer'), buyerId: firstWho('purchasing') };
}
