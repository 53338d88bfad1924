import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type { Caller as CallerOfRequest } from './caller.js';

/** The caller of the request, in a handler's parameters. */
export const Caller = createParamDecorator((_: unknown, context: ExecutionContext) => callerOf(context));

export function callerOf(context: ExecutionContext): CallerOfRequest | undefined {
  return context.switchToHttp().getRequest<Request & { user?: CallerOfRequest }>().user;
}
