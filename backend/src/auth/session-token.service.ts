import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';

/** What a session's token says. */
export interface SessionClaims {
  /** The user's id. */
  sub: string;
  /** The session's id. */
  sid: number;
}

@Injectable()
export class SessionTokenService {
  constructor(private readonly jwt: JwtService) {}

  issue(userId: number, sessionId: number): Promise<string> {
    const claims: SessionClaims = { sub: String(userId), sid: sessionId };
    return this.jwt.signAsync(claims);
  }

  /** What a token says that this server signed, even where its time is over; null = it didn't. */
  async read(token: string): Promise<SessionClaims | null> {
    const options = { algorithms: ['HS256' as const], ignoreExpiration: true };
    return this.jwt.verifyAsync<SessionClaims>(token, options).catch(() => null);
  }
}
