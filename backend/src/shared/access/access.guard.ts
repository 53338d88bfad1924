import { type Action, ACTIONS, refusalOf } from '@roothertz/common/access';
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
  const refusal = refusalOf(caller, action);
  if (refusal !== null) throw new DomainError(`access.${refusal}`, REFUSED[refusal](caller, action));
}

const REFUSED = {
  role: (_: Caller, action: Action) => `This needs one of the roles: ${rolesFor(action)}.`,
  plan: ({ standing }: Caller) =>
    `${standing === 'trial-over' ? 'The trial is over, and the' : 'The'} Free plan doesn’t include this: a team admin can start the Team plan under Plan. What the team has stays readable.`,
  'read-only': ({ standing }: Caller) =>
    `The team’s plan ${standing === 'unpaid' ? 'is unpaid' : 'is cancelled'}: everything can be read and exported, and nothing changed until a team admin ${standing === 'unpaid' ? 'pays what is open' : 'starts the plan again'} under Plan.`,
};

function rolesFor(action: Action): string {
  return [...ACTIONS[action].roles].join(', ');
}
