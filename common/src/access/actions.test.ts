import { describe, expect, it } from 'vitest';
import { type Action, ACTIONS, mayDo, planIncludes, type Role, ROLES } from './index.js';

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
    expect(actions.filter((action) => !planIncludes('free', action))).toEqual(['parts.edit', 'prices.edit']);
  });
});
