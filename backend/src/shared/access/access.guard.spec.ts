import type { Plan, Role, Standing } from '@roothertz/common/access';
import type { ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { Access } from './access.decorator.js';
import { AccessGuard } from './access.guard.js';
import { Public } from './public.decorator.js';

class Routes {
  @Public()
  open(): void {}

  @Access('parts.read')
  read(): void {}

  @Access('parts.edit')
  edit(): void {}

  undeclared(): void {}
}

describe('AccessGuard', () => {
  const guard = new AccessGuard(new Reflector());
  const call = (route: keyof Routes, roles?: Role[], plan: Plan = 'team', standing: Standing = 'active') => {
    const user = roles && { userId: 1, teamId: 1, roles, plan, standing };
    const context = {
      getHandler: () => Routes.prototype[route],
      switchToHttp: () => ({ getRequest: () => ({ user }) }),
    };
    return () => guard.canActivate(context as unknown as ExecutionContext);
  };

  it('lets everybody call a public route', () => {
    expect(call('open')()).toBe(true);
  });

  it('refuses everybody at a route that declares nothing', () => {
    expect(call('undeclared', ['admin'])).toThrow('access.undeclared');
  });

  it('refuses a caller without a session', () => {
    expect(call('read')).toThrow('session.missing');
  });

  it('lets every member read and only some roles edit', () => {
    expect(call('read', ['reviewer'])()).toBe(true);
    expect(call('edit', ['reviewer', 'librarian'])()).toBe(true);
    expect(call('edit', ['reviewer'])).toThrow('access.role');
  });

  it('asks the role first and then the plan', () => {
    expect(call('edit', ['reviewer'], 'free')).toThrow('access.role');
    expect(call('edit', ['librarian'], 'free')).toThrow('access.plan');
  });

  it('lets a team whose plan is unpaid or cancelled read, and says what to do about changes', () => {
    expect(call('read', ['librarian'], 'team', 'cancelled')()).toBe(true);
    expect(call('edit', ['librarian'], 'team', 'past-due')()).toBe(true);
    expect(call('edit', ['librarian'], 'team', 'unpaid')).toThrow(/^access.read-only: .*pays what is open/);
    expect(call('edit', ['librarian'], 'team', 'cancelled')).toThrow(
      /^access.read-only: .*starts the plan again/,
    );
  });
});
