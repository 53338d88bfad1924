import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { shortened } from '../shared/text/shortened.js';
import type { Member } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import type { Account } from '../users/account.js';
import { UsersService } from '../users/users.service.js';

/** The team that a person founds: by signing up, or by signing in after every other team was left. */
@Injectable()
export class OwnTeams {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly teams: TeamsService,
    private readonly users: UsersService,
    private readonly audit: AuditService,
  ) {}

  async found(manager: EntityManager, name: string, userId: number): Promise<void> {
    const teamId = await this.teams.found(manager, name, userId);
    const object = { kind: 'team' as const, id: teamId, label: name };
    const founded = { action: 'team.founded' as const, object, from: null, to: { name } };
    await this.audit.record(manager, { teamId, userId }, [founded]);
  }

  /** The member in the team where the person worked last; one is founded where there is none, so that nobody is shut out. */
  async lastMember(account: Account): Promise<Member> {
    const member = await this.teams.findLastMember(account.id);
    if (member !== null) return member;
    await this.dataSource.transaction(async (manager) => {
      await this.users.lock(manager, account.id);
      if ((await this.teams.findLastMember(account.id)) === null)
        await this.found(manager, shortened(`Team of ${account.name}`, 120), account.id);
    });
    return (await this.teams.findLastMember(account.id)) as Member;
  }
}
