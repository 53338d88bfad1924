import { PLAN_LIMITS } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { checkedRankingRequest } from '../shared/conditions/ranking-request.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { duplicateAs } from '../shared/errors/duplicate-entry.js';
import { readId } from '../shared/ids/read-id.js';
import type { ListQueryDto } from '../shared/list/list-query.dto.js';
import { parseSort } from '../shared/list/sort.js';
import { TeamsService } from '../teams/teams.service.js';
import { findPartsInUse, findTeamsWithParts, type PartUse, writeParts } from './conditions-parts.js';
import { searchByName, selectConditions } from './conditions-select.js';
import {
  type ConditionsListDto,
  type ConditionsResponseDto,
  toConditionsResponse,
} from './dto/conditions-response.dto.js';
import type { SaveConditionsDto } from './dto/save-conditions.dto.js';
import type { UpdateConditionsDto } from './dto/update-conditions.dto.js';
import { SavedConditions } from './entities/saved-conditions.entity.js';
import { nameKey } from '../shared/text/name-key.js';

const SORTS = ['name', 'updatedAt'] as const;

const refuseDuplicate = duplicateAs(
  'conditions.duplicate',
  'The team has saved conditions of this name already.',
  [{ field: 'name', message: 'name: another one was expected, for this one is taken' }],
);

/** What is done whenever conditions have been saved, in the transaction that saves them. */
export type SavedListener = (manager: EntityManager, caller: Caller) => Promise<void>;

@Injectable()
export class ConditionsService {
  private readonly listeners: SavedListener[] = [];

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly teams: TeamsService,
    private readonly audit: AuditService,
  ) {}

  whenSaved(listener: SavedListener): void {
    this.listeners.push(listener);
  }

  async list(caller: Caller, query: ListQueryDto): Promise<ConditionsListDto> {
    const { key, descending } = parseSort(query.sort ?? 'name', SORTS);
    const [items, total] = await searchByName(selectConditions(this.dataSource.manager, caller), query.search)
      .orderBy(`saved.${key}`, descending ? 'DESC' : 'ASC')
      .addOrderBy('saved.id')
      .take(query.limit)
      .skip(query.offset)
      .getManyAndCount();
    return { items: items.map(toConditionsResponse), total };
  }

  async find(caller: Caller, id: string): Promise<ConditionsResponseDto> {
    return toConditionsResponse(await findSaved(this.dataSource.manager, caller, id));
  }

  save(caller: Caller, { name, partIds, ...dto }: SaveConditionsDto): Promise<ConditionsResponseDto> {
    const request = checkedRankingRequest(dto);
    return this.change(caller, async (manager) => {
      await assertRoom(manager, caller);
      const now = new Date();
      const { identifiers } = await manager.insert(SavedConditions, {
        teamId: caller.teamId,
        name,
        nameKey: nameKey(name),
        ...request,
        createdAt: now,
        createdById: caller.userId,
        updatedAt: now,
        updatedById: caller.userId,
      });
      const id = identifiers[0].id as number;
      await writeParts(manager, caller, id, partIds);
      return this.recorded(manager, caller, null, String(id));
    });
  }

  update(
    caller: Caller,
    id: string,
    { version, partIds, ...changes }: UpdateConditionsDto,
  ): Promise<ConditionsResponseDto> {
    return this.change(caller, async (manager) => {
      const saved = await findChangeable(manager, caller, id, version);
      const { name = saved.name, ...request } = changes;
      await manager.update(
        SavedConditions,
        { id: saved.id },
        {
          name,
          nameKey: nameKey(name),
          ...checkedRankingRequest({ ...saved, ...request }),
          version: saved.version + 1,
          updatedAt: new Date(),
          updatedById: caller.userId,
        },
      );
      if (partIds) await writeParts(manager, caller, saved.id, partIds);
      return this.recorded(manager, caller, saved, id);
    });
  }

  remove(caller: Caller, id: string, version: number): Promise<void> {
    return this.change(caller, async (manager) => {
      const saved = await findChangeable(manager, caller, id, version);
      await manager.delete(SavedConditions, { id: saved.id });
      await this.audit.record(manager, caller, [
        { action: 'conditions.deleted', object: objectOf(saved), from: toTrail(saved), to: null },
      ]);
    });
  }

  /** The parts that a team has chosen at its saved conditions, by the part's id; one that isn't in it is in no use. */
  partsInUse(
    team: Pick<Caller, 'teamId'>,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<ReadonlyMap<number, PartUse[]>> {
    return findPartsInUse(manager, team);
  }

  teamsWithParts(): Promise<number[]> {
    return findTeamsWithParts(this.dataSource.manager);
  }

  /** Tells and notes what has been saved, and answers it. */
  private async recorded(
    manager: EntityManager,
    caller: Caller,
    before: SavedConditions | null,
    id: string,
  ): Promise<ConditionsResponseDto> {
    for (const listener of this.listeners) await listener(manager, caller);
    const after = await findSaved(manager, caller, id);
    const action = before === null ? 'conditions.saved' : 'conditions.changed';
    await this.audit.record(manager, caller, [
      { action, object: objectOf(after), from: before && toTrail(before), to: toTrail(after) },
    ]);
    return toConditionsResponse(after);
  }

  private change<Result>(
    { teamId }: Caller,
    change: (manager: EntityManager) => Promise<Result>,
  ): Promise<Result> {
    return this.dataSource
      .transaction(async (manager) => {
        await this.teams.lockTeam(manager, teamId);
        return change(manager);
      })
      .catch(refuseDuplicate);
  }
}

function objectOf({ id, name }: SavedConditions) {
  return { kind: 'conditions' as const, id, label: name };
}

function toTrail({ name, conditions, filter, target, quantity, parts }: SavedConditions): object {
  const partIds = parts.map(({ partId }) => String(partId));
  return { name, ...conditions, filter, target, quantity, partIds };
}

async function findSaved(manager: EntityManager, caller: Caller, id: string): Promise<SavedConditions> {
  const number = readId(id);
  const saved = number && (await selectConditions(manager, caller).andWhere({ id: number }).getOne());
  if (!saved) throw new DomainError('conditions.not-found', 'Your team has no such saved conditions.');
  return saved;
}

async function findChangeable(
  manager: EntityManager,
  caller: Caller,
  id: string,
  version: number,
): Promise<SavedConditions> {
  const saved = await findSaved(manager, caller, id);
  if (saved.version === version) return saved;
  throw new DomainError(
    'conditions.stale',
    'Somebody has changed these conditions meanwhile: load them again.',
  );
}

async function assertRoom(manager: EntityManager, { teamId, plan }: Caller): Promise<void> {
  const { savedConditions: limit } = PLAN_LIMITS[plan];
  if (limit !== null && (await manager.countBy(SavedConditions, { teamId })) >= limit)
    throw new DomainError('plan.saved-conditions', `The team’s plan holds ${limit} saved conditions.`);
}
