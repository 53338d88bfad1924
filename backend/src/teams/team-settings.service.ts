import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import type { TeamResponseDto } from './dto/team.dto.js';
import { Team } from './entities/team.entity.js';
import { isAdmin } from './roster.js';
import { TeamChanges } from './team-changes.service.js';

/** What goes for a team as a whole: its name, and who holds its plan. */
@Injectable()
export class TeamSettingsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly changes: TeamChanges,
  ) {}

  async read({ teamId }: Caller): Promise<TeamResponseDto> {
    const { id, name } = await this.dataSource.manager.findOneByOrFail(Team, { id: teamId });
    return { id: String(id), name };
  }

  async rename(caller: Caller, name: string): Promise<TeamResponseDto> {
    await this.changes.asAdmin(caller, async (manager, { team, object }) => {
      if (team.name === name) return null;
      await manager.update(Team, { id: team.id }, { name });
      return { action: 'team.renamed', object, from: { name: team.name }, to: { name } };
    });
    return this.read(caller);
  }

  /** Makes another admin the one who holds the plan. */
  handOver(caller: Caller, memberId: string): Promise<void> {
    return this.changes.asAdmin(caller, async (manager, roster) => {
      const { team, ownerId, members, object } = roster;
      const member = roster.member(memberId);
      if (!isAdmin(member)) refuseOwner();
      if (member.userId === ownerId) return null;
      await manager.update(Team, { id: team.id }, { ownerId: member.userId });
      const before = members.find(({ userId }) => userId === ownerId);
      const [from, to] = [{ owner: before?.user.name }, { owner: member.user.name }];
      return { action: 'team.handed-over', object, from, to };
    });
  }
}

function refuseOwner(): never {
  const message = 'an admin of the team was expected: make this member one first';
  throw new DomainError('team.owner-invalid', 'A team is handed over to one of its admins.', {
    errors: [{ field: 'memberId', message }],
  });
}
