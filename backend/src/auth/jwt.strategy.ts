import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { Strategy } from 'passport-jwt';
import { AppConfig } from '../config/app-config.js';
import type { SessionCaller } from './session-caller.js';
import { readSessionCookie } from './session-cookie.js';
import type { SessionClaims } from './session-token.service.js';
import { SessionsService } from './sessions.service.js';

/** Makes the caller of a session's token, where the session isn't over. */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy) {
  constructor(
    config: AppConfig,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: readSessionCookie,
      secretOrKey: config.JWT_SECRET,
      algorithms: ['HS256'],
    });
  }

  validate(claims: SessionClaims): Promise<SessionCaller | null> {
    return this.sessions.callerOf(claims);
  }
}
