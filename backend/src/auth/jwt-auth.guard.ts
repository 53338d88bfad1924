import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { PUBLIC_KEY } from '../shared/access/public.decorator.js';
import { DomainError } from '../shared/errors/domain-error.js';

/** Asks every route for a session but those that are open to everybody. */
@Injectable()
export class JwtAuthGuard extends AuthGuard('jwt') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    if (this.reflector.get<boolean>(PUBLIC_KEY, context.getHandler())) return true;
    return (await super.canActivate(context)) as boolean;
  }

  override handleRequest<Caller>(error: unknown, caller: Caller | false): Caller {
    if (error) throw error;
    if (!caller) throw new DomainError('session.missing', 'Sign in first.');
    return caller;
  }
}
