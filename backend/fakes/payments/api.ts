import express, { type NextFunction, type Request, type Response, Router } from 'express';
import { createHash, randomUUID } from 'node:crypto';
import { ApiError, invalid } from './api-error.js';
import { CHECKOUT_ROUTES, CUSTOMER_ROUTES } from './customer-routes.js';
import type { Route } from './route.js';
import type { State } from './state.js';
import { SUBSCRIPTION_ROUTES } from './subscription-routes.js';
import type { Switches } from './switches.js';

const ROUTES = [...CUSTOMER_ROUTES, ...CHECKOUT_ROUTES, ...SUBSCRIPTION_ROUTES];

/** The part that the SDK talks to. */
export function apiRouter(state: State, switches: Switches, secretKey: string): Router {
  const router = Router();
  router.use((_, response, next) => {
    response.setHeader('Request-Id', `req_${randomUUID()}`);
    next();
  });
  router.use('/v1', (request, _, next) => next(refusalOf(request, switches, secretKey)));
  router.use(express.urlencoded({ extended: true, limit: '1mb' }));
  for (const route of ROUTES)
    router[route.method](route.path, (request, response) => serve(state, route, request, response));
  router.use('/v1', (request) => {
    throw new ApiError(404, {
      type: 'invalid_request_error',
      message: `Unrecognized request URL (${request.method}: ${request.originalUrl.split('?')[0]}).`,
    });
  });
  router.use(answerError);
  return router;
}

function refusalOf(request: Request, switches: Switches, secretKey: string): ApiError | undefined {
  if (request.get('Authorization') !== `Bearer ${secretKey}`)
    return new ApiError(401, { type: 'invalid_request_error', message: 'Invalid API Key provided.' });
  if (request.method === 'POST' && request.get('Content-Type') !== 'application/x-www-form-urlencoded')
    return invalid('Invalid request: the body must be form-encoded.');
  if (switches.failNext === 0) return undefined;
  switches.failNext -= 1;
  return new ApiError(500, { type: 'api_error', message: 'This failure was asked for with a switch.' });
}

function serve(state: State, route: Route, request: Request, response: Response): void {
  const params = request.method === 'POST' ? (request.body as unknown) : request.query;
  const answer = () => route.answer(state, params ?? {}, String(request.params.id));
  const key = request.method === 'POST' ? request.get('Idempotency-Key') : undefined;
  if (key === undefined) {
    response.json(answer());
    return;
  }
  const asked = createHash('sha256')
    .update(`${request.originalUrl} ${JSON.stringify(params)}`)
    .digest('hex');
  const kept = Object.hasOwn(state.data.replies, key) ? state.data.replies[key] : undefined;
  if (kept && kept.request !== asked)
    throw new ApiError(400, {
      type: 'idempotency_error',
      message:
        'Keys for idempotent requests can only be used with the same parameters they were first used with.',
    });
  if (kept) response.setHeader('Idempotent-Replayed', 'true');
  const reply = kept ?? { request: asked, ...outcomeOf(answer) };
  state.data.replies[key] = structuredClone(reply);
  response.status(reply.status).json(reply.body);
}

/** What is kept under an idempotency key: refusals too, for a retry must meet the same. */
function outcomeOf(answer: () => object): { status: number; body: object } {
  try {
    return { status: 200, body: answer() };
  } catch (error) {
    if (error instanceof ApiError) return { status: error.status, body: { error: error.body } };
    throw error;
  }
}

function answerError(error: unknown, _: Request, response: Response, next: NextFunction): void {
  if (!(error instanceof ApiError)) return next(error);
  response.status(error.status).json({ error: error.body });
}
