import { createSecretKey } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { Strategy } from 'passport-jwt';
import { AppConfig } from '../config/app-config.js';
import type { SessionCaller } from './session-caller.js';
import { readSessionCookie } from './session-cookie.js';
import type { SessionClaims } from './session-token.service.js';
import { SessionsService } from './sessions.service.js';

/**
 * A text would be tried as a public key at each verification before it is taken for a secret; a key is taken as it is,
 * though the strategy's types name none.
 */
function keyOf(secret: string): Buffer {
  return createSecretKey(secret, 'utf8') as unknown as Buffer;
}

/** Makes the caller of a session's token, where the session isn't over. */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy) {
  constructor(
    config: AppConfig,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: readSessionCookie,
      secretOrKey: keyOf(config.JWT_SECRET),
      algorithms: ['HS256'],
    });
  }

  validate(claims: SessionClaims): Promise<SessionCaller | null> {
    return this.sessions.callerOf(claims);
  }
}
