import type { NextFunction, Request, RequestHandler, Response } from 'express';
import { DomainError } from '../shared/errors/domain-error.js';

const SAFE_METHODS = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses requests that change something when a page of another origin sends them.
 *
 * @param signedPath where the sender is known by a signature, which no page can make
 */
export function originCheck(publicOrigin: string | undefined, signedPath: string): RequestHandler {
  return (request: Request, _: Response, next: NextFunction) => {
    const origin = request.get('Origin');
    const foreign = origin !== undefined && !isOwn(origin, request, publicOrigin);
    const open = SAFE_METHODS.includes(request.method) || request.path === signedPath;
    if (foreign && !open)
      throw new DomainError('access.origin', 'This request comes from a page of another origin.');
    next();
  };
}

function isOwn(origin: string, request: Request, publicOrigin: string | undefined): boolean {
  if (!URL.canParse(origin)) return false;
  const { origin: parsed, host } = new URL(origin);
  return publicOrigin === undefined ? host === request.host : parsed === publicOrigin;
}
