import { describe, expect, it } from 'vitest';
import {
  type Action,
  ACTIONS,
  isWrite,
  mayDo,
  planIncludes,
  refusalOf,
  type Role,
  ROLES,
  type Standing,
  STANDINGS,
} from './index.js';

const actions = Object.keys(ACTIONS) as Action[];
const allowedRoles = (action: Action): Role[] => ROLES.filter((role) => mayDo([role], action));

describe('mayDo', () => {
  it.each(['session.own', 'parts.read', 'rankings.run', 'conditions.read', 'prices.read'] as const)(
    'allows %s to every member, whatever the roles',
    (action) => {
      expect(allowedRoles(action)).toEqual([...ROLES]);
      expect(mayDo([], action)).toBe(true);
    },
  );

  it('keeps the parts to admin and librarian', () => {
    expect(allowedRoles('parts.edit')).toEqual(['admin', 'librarian']);
  });

  it('keeps the prices to admin and purchasing, and the audit trail to the admin', () => {
    expect(allowedRoles('prices.edit')).toEqual(['admin', 'purchasing']);
    expect(allowedRoles('audit.read')).toEqual(['admin']);
  });

  it('lets whoever keeps parts or prices bring in lists', () => {
    expect(allowedRoles('lists.import')).toEqual(['admin', 'librarian', 'purchasing']);
  });

  it('lets admin, librarian and engineer save conditions', () => {
    expect(allowedRoles('conditions.save')).toEqual(['admin', 'librarian', 'engineer']);
  });

  it('needs only one of several roles', () => {
    expect(mayDo(['reviewer', 'librarian'], 'parts.edit')).toBe(true);
    expect(mayDo(['reviewer', 'purchasing'], 'parts.edit')).toBe(false);
    expect(mayDo([], 'conditions.save')).toBe(false);
  });
});

describe('planIncludes', () => {
  it('includes every action in the team plan', () => {
    expect(actions.filter((action) => !planIncludes('team', action))).toEqual([]);
  });

  it('leaves a library of one’s own and prices out of the free plan', () => {
    expect(actions.filter((action) => !planIncludes('free', action))).toEqual([
      'parts.edit',
      'prices.edit',
      'lists.import',
    ]);
  });
});

describe('refusalOf', () => {
  const refusal = (
    standing: Standing,
    action: Action,
    roles: Role[] = ['admin'],
    plan: 'free' | 'team' = 'team',
  ) => refusalOf({ roles, plan, standing }, action);

  it('names the role before the plan, and the plan before its standing', () => {
    expect(refusal('unpaid', 'prices.edit', ['reviewer'], 'free')).toBe('role');
    expect(refusal('unpaid', 'prices.edit', ['admin'], 'free')).toBe('plan');
    expect(refusal('unpaid', 'prices.edit')).toBe('read-only');
    expect(refusal('active', 'prices.edit')).toBe(null);
  });

  it('lets a team read, rank and manage its plan in every standing', () => {
    const reads = actions.filter((action) => !isWrite(action));
    expect(reads).toEqual(
      expect.arrayContaining(['parts.read', 'prices.read', 'billing.manage', 'rankings.run']),
    );
    for (const standing of STANDINGS)
      expect(reads.filter((action) => refusal(standing, action) !== null)).toEqual([]);
  });

  it('stops every change once the plan is unpaid or cancelled, and none before', () => {
    const writes = actions.filter(isWrite);
    expect(writes).toEqual(expect.arrayContaining(['parts.edit', 'conditions.save', 'prices.edit']));
    for (const standing of STANDINGS) {
      const stopped = standing === 'unpaid' || standing === 'cancelled';
      expect(writes.filter((action) => refusal(standing, action) !== null)).toEqual(stopped ? writes : []);
    }
  });
});
