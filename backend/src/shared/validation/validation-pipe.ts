import { ValidationPipe } from '@nestjs/common';
import { DomainError } from '../errors/domain-error.js';
import { toFieldErrors } from './field-errors.js';

/** Checks bodies and queries against their DTOs; unknown fields are refused, every fault is named. */
export function createValidationPipe(): ValidationPipe {
  return new ValidationPipe({
    transform: true,
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    exceptionFactory: (errors) =>
      new DomainError('request.invalid', 'Some fields of the request can’t be accepted.', {
        errors: toFieldErrors(errors),
      }),
  });
}
