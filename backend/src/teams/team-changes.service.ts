import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService, type Recorded } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { isAdmin, readRoster, type Roster } from './roster.js';
import { TeamsService } from './teams.service.js';

/** Lets one after the other change who is in a team, each with the roles that are left by the one before. */
@Injectable()
export class TeamChanges {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly teams: TeamsService,
    private readonly audit: AuditService,
  ) {}

  /** A change that only an admin may make; what it answers is noted in the trail. */
  asAdmin(
    caller: Caller,
    change: (manager: EntityManager, roster: Roster) => Promise<Recorded | null>,
  ): Promise<void> {
    return this.asMember(caller, (manager, roster) => {
      if (!isAdmin(roster.member(caller.userId)))
        throw new DomainError('access.role', 'This needs one of the roles: admin.');
      return change(manager, roster);
    });
  }

  asMember(
    caller: Caller,
    change: (manager: EntityManager, roster: Roster) => Promise<Recorded | null>,
  ): Promise<void> {
    return this.dataSource.transaction(async (manager) => {
      await this.teams.lockTeam(manager, caller.teamId);
      const done = await change(manager, await readRoster(manager, caller.teamId));
      if (done !== null) await this.audit.record(manager, caller, [done]);
    });
  }
}
