import { sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import express, { type NextFunction, type Request, type RequestHandler, type Response } from 'express';

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
    const isPage = ['GET', 'HEAD'].includes(request.method) && !/^\/(api|assets)(\/|$)/.test(request.path);
    if (!isPage || !request.accepts('html')) return next();
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile('index.html', { root }, (error) => error && next(error));
  };
}
