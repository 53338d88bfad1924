import { DomainError } from './domain-error.js';
import { isDatabaseLoss } from './database-loss.js';
import type { ErrorCode } from './error-codes.js';

const BY_STATUS: Record<number, [ErrorCode, string]> = {
  401: ['session.missing', 'Sign in first.'],
  403: ['access.role', 'This isn’t allowed.'],
  404: ['request.unknown-path', 'There is nothing at this address.'],
  413: ['request.too-large', 'The request is larger than this address takes.'],
  415: ['request.unsupported', 'The body’s encoding or character set isn’t supported.'],
  429: ['request.too-many', 'Too many requests: wait a moment.'],
};

interface HttpError {
  status?: unknown;
}

/** The domain error that stands for whatever was thrown; what nobody foresaw becomes `server.failed`. */
export function toDomainError(error: unknown): DomainError {
  if (error instanceof DomainError) return error;
  const { status } = (error ?? {}) as HttpError;
  if (typeof status === 'number' && status >= 400 && status < 500) {
    const [code, detail] = BY_STATUS[status] ?? [
      'request.invalid',
      'The body isn’t valid JSON, or the address is malformed.',
    ];
    return new DomainError(code, detail);
  }
  if (isDatabaseLoss(error))
    return new DomainError('database.unavailable', 'The database can’t be reached: try again in a moment.', {
      retryAfter: 5,
    });
  return new DomainError('server.failed', 'Something went wrong on our side.');
}
