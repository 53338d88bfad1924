import { isReadOnly, type Plan, PLAN_LIMITS, type Standing } from './plans.js';
import type { Role } from './roles.js';

interface ActionRule {
  /** Who may do it, by role. */
  roles: readonly Role[] | 'every member';
  /** What the team's plan must include. */
  needs?: 'ownLibrary' | 'prices';
  /** Changes what the team keeps: refused while the plan is read-only. */
  writes?: true;
}

/** Every action that a route or a button stands for: who may do it and what the plan must include. */
export const ACTIONS = {
  'session.own': { roles: 'every member' },
  'parts.read': { roles: 'every member' },
  'parts.edit': { roles: ['admin', 'librarian'], needs: 'ownLibrary', writes: true },
  'rankings.run': { roles: 'every member' },
  'conditions.read': { roles: 'every member' },
  'conditions.save': { roles: ['admin', 'librarian', 'engineer'], writes: true },
  'prices.read': { roles: 'every member' },
  'prices.edit': { roles: ['admin', 'purchasing'], needs: 'prices', writes: true },
  /** Lists of parts or of prices: which of them a member brings in, the action of that kind says besides. */
  'lists.import': { roles: ['admin', 'librarian', 'purchasing'], needs: 'ownLibrary', writes: true },
  'team.read': { roles: 'every member' },
  'team.manage': { roles: ['admin'] },
  'audit.read': { roles: ['admin'] },
  'billing.read': { roles: ['admin'] },
  'billing.manage': { roles: ['admin'] },
} as const satisfies Record<string, ActionRule>;

export type Action = keyof typeof ACTIONS;

/** Whether one of the member's roles allows the action; what the plan includes is asked of {@link planIncludes}. */
export function mayDo(memberRoles: readonly Role[], action: Action): boolean {
  const { roles }: ActionRule = ACTIONS[action];
  return roles === 'every member' || memberRoles.some((role) => roles.includes(role));
}

/** Whether the team's plan includes what the action needs. */
export function planIncludes(plan: Plan, action: Action): boolean {
  const { needs }: ActionRule = ACTIONS[action];
  return needs === undefined || PLAN_LIMITS[plan][needs];
}

/** Whether the action changes what a team keeps. */
export function isWrite(action: Action): boolean {
  const { writes }: ActionRule = ACTIONS[action];
  return writes === true;
}

export interface MemberAccess {
  roles: readonly Role[];
  plan: Plan;
  standing: Standing;
}

/**
 * Why a member can't do something now: the `role`, the `plan`, or that the plan is `read-only`; null = nothing
 * stands against it. The guards and the screens ask the same.
 */
export function refusalOf(
  { roles, plan, standing }: MemberAccess,
  action: Action,
): 'role' | 'plan' | 'read-only' | null {
  if (!mayDo(roles, action)) return 'role';
  if (!planIncludes(plan, action)) return 'plan';
  return isWrite(action) && isReadOnly(standing) ? 'read-only' : null;
}
