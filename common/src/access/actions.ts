import { PLAN_LIMITS, type Plan } from './plans.js';
import type { Role } from './roles.js';

interface ActionRule {
  /** Who may do it, by role. */
  roles: readonly Role[] | 'every member';
  /** What the team's plan must include. */
  needs?: 'ownLibrary' | 'prices';
}

/** Every action that a route or a button stands for: who may do it and what the plan must include. */
export const ACTIONS = {
  'session.own': { roles: 'every member' },
  'parts.read': { roles: 'every member' },
  'parts.edit': { roles: ['admin', 'librarian'], needs: 'ownLibrary' },
  'rankings.run': { roles: 'every member' },
  'conditions.read': { roles: 'every member' },
  'conditions.save': { roles: ['admin', 'librarian', 'engineer'] },
  'prices.read': { roles: 'every member' },
  'prices.edit': { roles: ['admin', 'purchasing'], needs: 'prices' },
  'audit.read': { roles: ['admin'] },
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
