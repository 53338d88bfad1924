import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { ConditionsService } from '../conditions/conditions.service.js';
import { findReadableIds } from '../library/readable-parts.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { readId } from '../shared/ids/read-id.js';
import { TeamsService } from '../teams/teams.service.js';
import type { PartUsesDto } from './dto/part-uses.dto.js';

/** Says where a team has chosen a part, which is why it can't be deleted. */
@Injectable()
export class PartUsesService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly conditions: ConditionsService,
    private readonly teams: TeamsService,
  ) {}

  async find(caller: Caller, id: string): Promise<PartUsesDto> {
    const number = readId(id) ?? 0;
    const readable = await findReadableIds(this.dataSource.manager, caller, [number]);
    if (!readable.has(number))
      throw new DomainError('part.not-found', 'There is no such part in your libraries.');
    return this.usesOf(this.dataSource.manager, caller, number);
  }

  /** Refuses where a part is in use; until the transaction ends nobody can choose it. */
  async assertUnused(manager: EntityManager, caller: Caller, id: number): Promise<void> {
    await this.teams.lockTeam(manager, caller.teamId);
    const { conditions } = await this.usesOf(manager, caller, id);
    if (conditions.length === 0) return;
    const names = conditions.map(({ name }) => `“${name}”`).join(', ');
    throw new DomainError(
      'part.in-use',
      `This part is chosen at ${names}. Retire it instead: it can then be read, and isn’t ranked any more.`,
      { errors: conditions.map(({ name }) => ({ field: 'conditions', message: name })) },
    );
  }

  private async usesOf(manager: EntityManager, caller: Caller, id: number): Promise<PartUsesDto> {
    const uses = (await this.conditions.partsInUse(caller, manager)).get(id) ?? [];
    return {
      conditions: uses.map(({ conditionsId, name }) => ({ id: String(conditionsId), name })),
    };
  }
}
