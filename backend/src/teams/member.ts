import type { PlanState, Role } from '@roothertz/common/access';
import type { Caller } from '../shared/access/caller.js';
import { type Account, toAccount } from '../users/account.js';
import type { Membership } from './entities/membership.entity.js';

/** A person in a team: who it is, where, and what they may do there. */
export interface Member extends Pick<PlanState, 'plan' | 'standing' | 'until'> {
  account: Account;
  team: { id: number; name: string };
  roles: Role[];
}

/** The member as the one on whose behalf something is done. */
export function toCaller({ account, team, roles, plan, standing }: Member): Caller {
  return { userId: account.id, teamId: team.id, roles, plan, standing };
}

export function toMember({ user, team, roles }: Membership, { plan, standing, until }: PlanState): Member {
  return { account: toAccount(user), team: { id: team.id, name: team.name }, roles, plan, standing, until };
}
