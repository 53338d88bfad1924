import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiProblem } from '../errors/problem.js';

export const PUBLIC_KEY = 'access:public';

/** Opens a route to everybody, signed in or not. */
export function Public(): MethodDecorator {
  return applyDecorators(SetMetadata(PUBLIC_KEY, true), ApiProblem());
}
