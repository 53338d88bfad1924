import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import express from 'express';
import cookieParser from 'cookie-parser';
import { AppConfig } from '../config/app-config.js';
import { ProblemFilter } from '../shared/errors/problem-filter.js';
import { createValidationPipe } from '../shared/validation/validation-pipe.js';
import { refuseDeepBodies } from './body-depth.js';
import { correlationId } from './correlation-id.js';
import { originCheck } from './origin-check.js';
import { BUILT_PAGES, pageFallback, pageFiles } from './pages.js';
import { neverStored, securityHeaders } from './security-headers.js';

/** What is sent here is signed byte by byte, and so isn't read as JSON before its signature is. */
const SIGNED_BODIES = '/api/billing/webhook';

/** A pasted price list is saved in one request, and may be longer than any other. */
const LONG_BODIES = '/api/prices';

/** Everything around the routes, in the order in which a request meets it. The app is made without a body parser. */
export function configureApp(app: NestExpressApplication): void {
  const config = app.get(AppConfig);
  const pages = config.FRONTEND_DIST ?? BUILT_PAGES;
  app.set('trust proxy', trustedProxies(config.TRUST_PROXY));
  app.setGlobalPrefix('api');
  app.use(correlationId, securityHeaders(), compression());
  app.use(pageFiles(pages), pageFallback(pages));
  app.use('/api', neverStored);
  app.use(originCheck(config.PUBLIC_ORIGIN, SIGNED_BODIES), cookieParser());
  app.use(SIGNED_BODIES, express.raw({ type: () => true, limit: '1mb' }));
  app.use(LONG_BODIES, express.json({ limit: '4mb' }));
  app.useBodyParser('json', { limit: '1mb' });
  app.use(refuseDeepBodies);
  app.useGlobalPipes(createValidationPipe());
  app.useGlobalFilters(new ProblemFilter());
  app.enableShutdownHooks();
}

function trustedProxies(setting: string | undefined): string | number | false {
  if (setting === undefined) return false;
  return /^\d+$/.test(setting) ? Number(setting) : setting;
}
