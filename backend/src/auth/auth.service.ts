import { Injectable } from '@nestjs/common';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import type { Member } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import type { Account } from '../users/account.js';
import { UsersService } from '../users/users.service.js';
import { passwordMatches } from './passwords.js';
import { SignInAttempts } from './sign-in-attempts.js';

export interface Credentials {
  email: string;
  password: string;
}

@Injectable()
export class AuthService {
  constructor(
    private readonly users: UsersService,
    private readonly teams: TeamsService,
    private readonly attempts: SignInAttempts,
  ) {}

  /**
   * The member whose credentials these are, as given from one network address. An attempt counts as
   * failed until it succeeds, so that many at once gain nothing.
   */
  async signIn({ email, password }: Credentials, address: string): Promise<Member> {
    const key = `${email}|${address}`;
    const account = await this.users.findByEmail(email);
    this.refuseWhileSlowed(key);
    this.attempts.recordFailure(key);
    if (!(await passwordMatches(password, account?.passwordHash ?? null)))
      throw new DomainError('session.wrong-credentials', 'E-mail address or password is wrong.');
    this.attempts.recordSuccess(key);
    return this.memberOf(account as Account);
  }

  async findSession({ userId, teamId }: Caller): Promise<Member> {
    const member = await this.teams.findMember(userId, teamId);
    if (member === null) throw new DomainError('session.missing', 'Sign in first.');
    return member;
  }

  private refuseWhileSlowed(key: string): void {
    const retryAfter = this.attempts.waitSeconds(key);
    if (retryAfter > 0)
      throw new DomainError('request.too-many', `Too many failures: try again in ${retryAfter} s.`, {
        retryAfter,
      });
  }

  private async memberOf(account: Account): Promise<Member> {
    const member = await this.teams.findFirstMember(account.id);
    if (member === null) throw new DomainError('session.no-team', 'This account belongs to no team.');
    return member;
  }
}
