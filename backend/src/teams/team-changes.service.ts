import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService, type Recorded } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { isAdmin, readRoster, type Roster } from './roster.js';
import { SeatsService } from './seats.service.js';
import { TeamsService } from './teams.service.js';

type Change = (manager: EntityManager, roster: Roster) => Promise<Recorded | null>;

/** Lets one after the other change who is in a team, each with the roles that are left by the one before. */
@Injectable()
export class TeamChanges {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly teams: TeamsService,
    private readonly seats: SeatsService,
    private readonly audit: AuditService,
  ) {}

  /** A change that only an admin may make; what it answers is noted in the trail. */
  asAdmin(caller: Caller, change: Change, { givesSeat = false } = {}): Promise<void> {
    const asAdmin: Change = (manager, roster) => {
      if (!isAdmin(roster.member(caller.userId)))
        throw new DomainError('access.role', 'This needs one of the roles: admin.');
      return change(manager, roster);
    };
    return this.run(caller, asAdmin, givesSeat);
  }

  asMember(caller: Caller, change: Change): Promise<void> {
    return this.run(caller, change, false);
  }

  /** Seats are held before the team, as wherever both are. */
  private run(caller: Caller, change: Change, givesSeat: boolean): Promise<void> {
    return this.dataSource.transaction(async (manager) => {
      if (givesSeat) await this.seats.hold(manager, caller.teamId);
      await this.teams.lockTeam(manager, caller.teamId);
      const done = await change(manager, await readRoster(manager, caller.teamId));
      if (done !== null) await this.audit.record(manager, caller, [done]);
    });
  }
}
