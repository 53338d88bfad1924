import { BadRequestException, ForbiddenException, NotFoundException } from '@nestjs/common';
import { QueryFailedError } from 'typeorm';
import { DomainError } from './domain-error.js';
import { toDomainError } from './to-domain-error.js';

const withCode = (code: string) => Object.assign(new Error(code), { code });

describe('toDomainError', () => {
  it('keeps a domain error as it is', () => {
    const error = new DomainError('part.stale', 'Somebody changed it.');
    expect(toDomainError(error)).toBe(error);
  });

  it.each([
    [new BadRequestException('internals'), 'request.invalid'],
    [new ForbiddenException('internals'), 'access.role'],
    [new NotFoundException('internals'), 'request.unknown-path'],
    [{ status: 413, message: 'internals' }, 'request.too-large'],
    [{ status: 418, message: 'internals' }, 'request.invalid'],
  ])('makes a known error of %s', (error, code) => {
    expect(toDomainError(error)).toMatchObject({ code, detail: expect.not.stringContaining('internals') });
  });

  it.each(['ECONNREFUSED', 'PROTOCOL_CONNECTION_LOST', 'ER_SERVER_SHUTDOWN', 'PROTOCOL_SEQUENCE_TIMEOUT'])(
    'takes %s for a lost database, from the driver or in a failed query',
    (code) => {
      const query = new QueryFailedError('SELECT 1', [], withCode(code));
      expect(toDomainError(withCode(code)).code).toBe('database.unavailable');
      expect(toDomainError(query)).toMatchObject({ code: 'database.unavailable', retryAfter: 5 });
    },
  );

  it.each(['Queue limit reached.', 'Pool is closed.'])('takes “%s” for a lost database', (message) => {
    expect(toDomainError(new Error(message)).code).toBe('database.unavailable');
  });

  it.each([
    new QueryFailedError('SELECT secret', [], withCode('ER_PARSE_ERROR')),
    new Error('secret'),
    'secret',
    null,
    undefined,
    { status: 503 },
  ])('says nothing of an error that nobody foresaw: %s', (error) => {
    expect(toDomainError(error)).toMatchObject({
      code: 'server.failed',
      detail: 'Something went wrong on our side.',
    });
  });
});
