import { type Action, ACTIONS, mayDo, planIncludes } from '@roothertz/common/access';
import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { DomainError } from '../errors/domain-error.js';
import { ACCESS_KEY } from './access.decorator.js';
import type { Caller } from './caller.js';
import { callerOf } from './caller.decorator.js';
import { PUBLIC_KEY } from './public.decorator.js';

/** Closed by default: lets a request through only where its route says that this caller may call it. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const handler = context.getHandler();
    if (this.reflector.get<boolean>(PUBLIC_KEY, handler)) return true;
    const action = this.reflector.get<Action | undefined>(ACCESS_KEY, handler);
    if (action === undefined) throw new DomainError('access.undeclared', 'Nobody may call this address.');
    assertMayDo(callerOf(context), action);
    return true;
  }
}

function assertMayDo(caller: Caller | undefined, action: Action): void {
  if (caller === undefined) throw new DomainError('session.missing', 'Sign in first.');
  if (!mayDo(caller.roles, action))
    throw new DomainError('access.role', `This needs one of the roles: ${rolesFor(action)}.`);
  if (!planIncludes(caller.plan, action))
    throw new DomainError('access.plan', 'The team’s plan doesn’t include this.');
}

function rolesFor(action: Action): string {
  return [...ACTIONS[action].roles].join(', ');
}
