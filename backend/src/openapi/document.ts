import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { SESSION_COOKIE } from '../auth/session-cookie.js';

/** The API's OpenAPI document, with sorted keys; an operation is named as its controller's method. */
export function createOpenApiDocument(app: INestApplication): OpenAPIObject {
  const base = new DocumentBuilder()
    .setTitle('Roothertz')
    .setDescription(
      'Ranks a team’s op-amps by the noise of the whole amplifier stage. All values are in SI units.',
    )
    .setVersion('1')
    .addCookieAuth(SESSION_COOKIE)
    .build();
  const document = SwaggerModule.createDocument(app, base, { operationIdFactory: (_, method) => method });
  return sortKeys(document) as OpenAPIObject;
}

function sortKeys(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sortKeys);
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).sort(([one], [other]) => (one < other ? -1 : 1));
  return Object.fromEntries(entries.map(([key, item]) => [key, sortKeys(item)]));
}
