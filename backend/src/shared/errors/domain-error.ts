import type { FieldError } from '@roothertz/common/parts';
import type { ErrorCode } from './error-codes.js';

export interface DomainErrorDetails {
  errors?: FieldError[];
  /** Seconds after which the same request may be tried again. */
  retryAfter?: number;
}

/** What a service throws when a request can't be served: the filter makes problem details of it. */
export class DomainError extends Error {
  readonly errors?: FieldError[];
  readonly retryAfter?: number;

  constructor(
    readonly code: ErrorCode,
    readonly detail: string,
    { errors, retryAfter }: DomainErrorDetails = {},
  ) {
    super(`${code}: ${detail}`);
    this.name = 'DomainError';
    this.errors = errors;
    this.retryAfter = retryAfter;
  }
}
