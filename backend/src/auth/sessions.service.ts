import { Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager, LessThan, MoreThan, Not } from 'typeorm';
import { DomainError } from '../shared/errors/domain-error.js';
import { logFailure } from '../shared/errors/log-failure.js';
import { readId } from '../shared/ids/read-id.js';
import { shortened } from '../shared/text/shortened.js';
import { PlansService } from '../plans/plans.service.js';
import type { Member } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import { Session } from './entities/session.entity.js';
import type { SessionCaller } from './session-caller.js';
import { SESSION_HOURS } from './session-cookie.js';
import { SessionTokenService, type SessionClaims } from './session-token.service.js';

/** Where a sign-in comes from. */
export interface Origin {
  address: string;
  userAgent: string;
}

const NOTED_EVERY_MS = 60_000;
const TIDY_EVERY_MS = 3_600_000;

/** The sign-ins that aren't over. */
@Injectable()
export class SessionsService {
  private readonly logger = new Logger(SessionsService.name);

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly teams: TeamsService,
    private readonly plans: PlansService,
    private readonly tokens: SessionTokenService,
  ) {}

  /** Begins a session of the member; answers its token. */
  async begin({ account, team }: Member, { address, userAgent }: Origin): Promise<string> {
    const now = new Date();
    await this.teams.noteOpened(account.id, team.id);
    const { identifiers } = await this.dataSource.manager.insert(Session, {
      userId: account.id,
      teamId: team.id,
      createdAt: now,
      lastSeenAt: now,
      userAgent: shortened(userAgent, 300),
      address: address.slice(0, 45),
    });
    return this.tokens.issue(account.id, identifiers[0].id as number);
  }

  /** The member whose session a token belongs to, as they stand in the database now; null = it is over. */
  async callerOf({ sub, sid }: SessionClaims): Promise<SessionCaller | null> {
    const session = await this.dataSource.manager
      .createQueryBuilder(Session, 'session')
      .innerJoinAndSelect('session.membership', 'membership')
      .where({ id: sid, userId: Number(sub) })
      .getOne();
    if (session === null) return null;
    const { userId, teamId, membership } = session;
    const [{ plan, standing }] = await Promise.all([this.plans.stateOf(teamId), this.noteSeen(session)]);
    return { userId, teamId, roles: membership.roles, plan, standing, sessionId: sid };
  }

  list({ userId }: SessionCaller): Promise<Session[]> {
    return this.dataSource.manager.find(Session, {
      where: { userId, createdAt: MoreThan(oldest()) },
      relations: { team: true },
      order: { lastSeenAt: 'DESC', id: 'DESC' },
    });
  }

  /** Ends one session of the caller's own. */
  async end({ userId }: SessionCaller, id: string): Promise<void> {
    const { affected } = await this.dataSource.manager.delete(Session, { id: readId(id) ?? 0, userId });
    if (affected === 0) throw new DomainError('session.not-found', 'This session is over already.');
  }

  /** Ends the caller's sessions but the one by which the request came. */
  endOthersOf({ userId, sessionId }: SessionCaller): Promise<void> {
    return this.endOthers(this.dataSource.manager, userId, sessionId);
  }

  /** Ends all sessions of an account but one; null = all. */
  async endOthers(manager: EntityManager, userId: number, keptId: number | null): Promise<void> {
    await manager.delete(Session, { userId, ...(keptId !== null && { id: Not(keptId) }) });
  }

  /** Ends the session of a token, whatever is left of it. */
  async endByToken(token: string): Promise<void> {
    const claims = await this.tokens.read(token);
    if (claims !== null)
      await this.dataSource.manager.delete(Session, { id: claims.sid, userId: Number(claims.sub) });
  }

  /** Goes on in another of the person's teams. */
  async switchTeam({ userId, sessionId }: SessionCaller, id: string): Promise<Member> {
    const member = await this.teams.findMember(userId, readId(id) ?? 0);
    if (member === null) throw new DomainError('team.not-found', 'You are in no such team.');
    const { id: teamId } = member.team;
    await this.dataSource.manager.update(Session, { id: sessionId, userId }, { teamId });
    await this.teams.noteOpened(userId, teamId);
    return member;
  }

  @Interval(TIDY_EVERY_MS)
  async tidy(): Promise<void> {
    await this.dataSource.manager
      .delete(Session, { createdAt: LessThan(oldest()) })
      .catch((error: unknown) => logFailure(this.logger, error));
  }

  private async noteSeen({ id, lastSeenAt }: Session): Promise<void> {
    const now = new Date();
    if (now.getTime() - lastSeenAt.getTime() > NOTED_EVERY_MS)
      await this.dataSource.manager.update(Session, { id }, { lastSeenAt: now });
  }
}

/** When a session began whose token has just become too old. */
function oldest(): Date {
  return new Date(Date.now() - SESSION_HOURS * 3_600_000);
}
