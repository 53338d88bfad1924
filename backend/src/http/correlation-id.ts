import { randomUUID } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';

const HEADER = 'X-Correlation-Id';
const ACCEPTABLE = /^[\w-]{1,64}$/;

/** Gives every request an id, or keeps the one that it brings, for answer and log. */
export function correlationId(request: Request, response: Response, next: NextFunction): void {
  const brought = request.get(HEADER);
  const id = brought !== undefined && ACCEPTABLE.test(brought) ? brought : randomUUID();
  response.locals.correlationId = id;
  response.setHeader(HEADER, id);
  next();
}
