import { Injectable } from '@nestjs/common';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import type { Member } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import type { Account } from '../users/account.js';
import { UsersService } from '../users/users.service.js';
import { signInSubjects } from './attempt-limits.js';
import { Attempts } from './attempts.service.js';
import { type SessionResponseDto, toSessionResponse } from './dto/session-response.dto.js';
import { OwnTeams } from './own-teams.service.js';
import { passwordMatches } from './passwords.js';

export interface Credentials {
  email: string;
  password: string;
}

@Injectable()
export class AuthService {
  constructor(
    private readonly users: UsersService,
    private readonly teams: TeamsService,
    private readonly ownTeams: OwnTeams,
    private readonly attempts: Attempts,
  ) {}

  /**
   * The member whose credentials these are, as given from one network address. An attempt counts as
   * failed until it succeeds, so that many at once gain nothing.
   */
  async signIn({ email, password }: Credentials, address: string): Promise<Member> {
    const subjects = signInSubjects(email, address);
    await this.attempts.count(subjects);
    const account = await this.users.findByEmail(email);
    if (!(await passwordMatches(password, account?.passwordHash ?? null)))
      throw new DomainError('session.wrong-credentials', 'E-mail address or password is wrong.');
    await this.attempts.succeed(subjects);
    return this.ownTeams.lastMember(account as Account);
  }

  async findSession({ userId, teamId }: Caller): Promise<SessionResponseDto> {
    const member = await this.teams.findMember(userId, teamId);
    if (member === null) throw new DomainError('session.missing', 'Sign in first.');
    return this.describe(member);
  }

  /** What a member is told of their session. */
  async describe(member: Member): Promise<SessionResponseDto> {
    const teams = await this.teams.teamsOf(member.account.id);
    return toSessionResponse(
      member,
      teams.map(({ team }) => team),
    );
  }
}
