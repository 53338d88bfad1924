import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { Strategy } from 'passport-jwt';
import { AppConfig } from '../config/app-config.js';
import type { Caller } from '../shared/access/caller.js';
import { toCaller } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import { readSessionCookie } from './session-cookie.js';
import { fingerprint, type SessionClaims } from './session-token.service.js';

/** Makes the caller of a session's token, as the member stands in the database now. */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy) {
  constructor(
    config: AppConfig,
    private readonly teams: TeamsService,
  ) {
    super({
      jwtFromRequest: readSessionCookie,
      secretOrKey: config.JWT_SECRET,
      algorithms: ['HS256'],
    });
  }

  async validate({ sub, team, key }: SessionClaims): Promise<Caller | null> {
    const member = await this.teams.findMember(Number(sub), team);
    if (member === null || fingerprint(member.account.passwordHash) !== key) return null;
    return toCaller(member);
  }
}
