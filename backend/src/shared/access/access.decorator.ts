import type { Action } from '@roothertz/common/access';
import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiCookieAuth } from '@nestjs/swagger';
import { ApiProblem } from '../errors/problem.js';

export const ACCESS_KEY = 'access:action';

/** Says which action a route stands for, and so who may call it and what the plan must include. */
export function Access(action: Action): MethodDecorator {
  return applyDecorators(SetMetadata(ACCESS_KEY, action), ApiCookieAuth(), ApiProblem());
}
