import type { Action } from '@roothertz/common/access';
import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { DomainError } from '../errors/domain-error.js';
import { ACCESS_KEY } from './access.decorator.js';
import { assertMayDo } from './assert-may-do.js';
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
