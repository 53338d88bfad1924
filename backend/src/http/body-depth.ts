import type { NextFunction, Request, Response } from 'express';
import { DomainError } from '../shared/errors/domain-error.js';

const DEEPEST = 20;

/** Refuses bodies that nest deeper than anything that the API takes, before something recurses into them. */
export function refuseDeepBodies(request: Request, _: Response, next: NextFunction): void {
  let level = [request.body as unknown].filter(isNested);
  for (let depth = 0; level.length > 0; depth++) {
    if (depth > DEEPEST) throw new DomainError('request.invalid', 'The body is nested too deep.');
    level = level.flatMap((value) => Object.values(value)).filter(isNested);
  }
  next();
}

function isNested(value: unknown): value is object {
  return typeof value === 'object' && value !== null && !Buffer.isBuffer(value);
}
