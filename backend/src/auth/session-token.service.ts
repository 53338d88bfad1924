import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import type { Member } from '../teams/member.js';

/** What a session's token says. */
export interface SessionClaims {
  /** The user's id. */
  sub: string;
  team: number;
  /** Fingerprint of the password hash: a new password ends the sessions that the old one began. */
  key: string;
}

@Injectable()
export class SessionTokenService {
  constructor(private readonly jwt: JwtService) {}

  issue({ account, team }: Member): Promise<string> {
    const claims: SessionClaims = {
      sub: String(account.id),
      team: team.id,
      key: fingerprint(account.passwordHash),
    };
    return this.jwt.signAsync(claims);
  }
}

export function fingerprint(passwordHash: string): string {
  return createHash('sha256').update(passwordHash).digest('base64url').slice(0, 16);
}
