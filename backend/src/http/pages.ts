import { sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import express, { type NextFunction, type Request, type RequestHandler, type Response } from 'express';
import { DomainError } from '../shared/errors/domain-error.js';

export const BUILT_PAGES = fileURLToPath(new URL('../../../frontend/dist', import.meta.url));

const HASHED_FILES = `${sep}assets${sep}`;

/** Serves the front end's files; those with a hash in their name are kept for ever. */
export function pageFiles(root: string): RequestHandler {
  return express.static(root, {
    index: false,
    setHeaders: (response, path) => {
      const kept = path.includes(HASHED_FILES);
      response.setHeader('Cache-Control', kept ? 'public, max-age=31536000, immutable' : 'no-cache');
    },
  });
}

/** Answers every other address outside /api with the page, which knows its own routes. */
export function pageFallback(root: string): RequestHandler {
  return (request: Request, response: Response, next: NextFunction) => {
    if (/^\/api(\/|$)/.test(request.path)) return next();
    if (!isPage(request)) throw new DomainError('request.unknown-path', 'There is nothing at this address.');
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile('index.html', { root }, (error) => error && next(error));
  };
}

function isPage(request: Request): boolean {
  const isRead = ['GET', 'HEAD'].includes(request.method);
  return isRead && !request.path.startsWith('/assets/') && request.accepts('html') !== false;
}
