import { setTimeout as delay } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, IsNull, LessThan, Not } from 'typeorm';
import { assertMayDo } from '../shared/access/assert-may-do.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import type { ListQueryDto } from '../shared/list/list-query.dto.js';
import { likePattern } from '../shared/list/like-pattern.js';
import { parseSort } from '../shared/list/sort.js';
import {
  type ImportListDto,
  type ImportResponseDto,
  toImportResponse,
  toImportSummary,
  toSameFile,
} from './dto/import-response.dto.js';
import type { MapImportDto } from './dto/map-import.dto.js';
import { Import } from './entities/import.entity.js';
import { ImportProgress } from './entities/import-progress.entity.js';
import { ImportJobs } from './import-jobs.service.js';
import { findImport, selectImports } from './import-select.js';
import { type ImportKind, isRunning } from './import-states.js';
import type { ListWork } from './list-work.js';
import { LIST_KINDS } from './list-kinds.js';
import { PartLists } from './part-lists.service.js';
import { PriceLists } from './prices/price-lists.service.js';
import { type ReceivedFile, UploadsService } from './uploads.service.js';

const SORTS = ['createdAt', 'fileName', 'state'] as const;
/** A list up to so many rows is checked while its mapping waits for the answer. */
const CHECKED_AT_ONCE = 5000;
const ASKED_EVERY_MS = 50;
const MOST_WAITED_MS = 10_000;

/** A team's imports, from the upload to the undoing. */
@Injectable()
export class ImportsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly uploads: UploadsService,
    private readonly partLists: PartLists,
    private readonly priceLists: PriceLists,
    private readonly jobs: ImportJobs,
  ) {}

  async list(caller: Caller, query: ListQueryDto): Promise<ImportListDto> {
    const { key, descending } = parseSort(query.sort ?? '-createdAt', SORTS);
    const [items, total] = await selectImports(this.dataSource.manager, caller)
      .andWhere(`import.fileName LIKE :name ESCAPE '!'`, { name: likePattern(query.search ?? '') })
      .orderBy(`import.${key}`, descending ? 'DESC' : 'ASC')
      .addOrderBy('import.id', descending ? 'DESC' : 'ASC')
      .limit(query.limit)
      .offset(query.offset)
      .getManyAndCount();
    const settled = await Promise.all(items.map((entity) => this.settled(caller, entity)));
    return { items: settled.map(toImportSummary), total };
  }

  async find(caller: Caller, id: string): Promise<ImportResponseDto> {
    return this.answer(caller, await this.findSettled(caller, id));
  }

  async upload(caller: Caller, kind: ImportKind, file: ReceivedFile): Promise<ImportResponseDto> {
    assertMayDo(caller, LIST_KINDS[kind].action);
    return this.find(caller, String(await this.uploads.take(caller, kind, file)));
  }

  /** A check that is under way is stopped first. */
  async map(caller: Caller, id: string, dto: MapImportDto): Promise<ImportResponseDto> {
    const entity = await this.stopCheck(caller, await this.findForChange(caller, id));
    if (await this.uploads.describe(entity, dto)) {
      const { done } = await this.check(caller, entity);
      if (entity.rowCount <= CHECKED_AT_ONCE) await done;
    }
    return this.find(caller, id);
  }

  async apply(caller: Caller, id: string): Promise<ImportResponseDto> {
    const entity = await this.findForChange(caller, id);
    await this.workOn(entity).applying.start(caller, entity);
    return this.find(caller, id);
  }

  async undo(caller: Caller, id: string): Promise<ImportResponseDto> {
    const entity = await this.findForChange(caller, id);
    await this.workOn(entity).undoing.start(caller, entity);
    return this.find(caller, id);
  }

  /** Asks whichever server is at work on the import to stop; without work on it nothing happens. */
  async cancel(caller: Caller, id: string): Promise<ImportResponseDto> {
    const entity = await this.findForChange(caller, id);
    if (isRunning(entity.state)) await this.askToStop(caller, entity);
    return this.find(caller, id);
  }

  async discard(caller: Caller, id: string): Promise<void> {
    await this.uploads.discard(caller, await this.findForChange(caller, id));
  }

  private workOn({ kind }: Import): ListWork {
    return kind === 'prices' ? this.priceLists : this.partLists;
  }

  /** Somebody else’s check that has begun since the columns were said is one of the same columns. */
  private async check(caller: Caller, entity: Import): Promise<{ done: Promise<void> }> {
    try {
      return await this.workOn(entity).checking.start(caller, entity);
    } catch (error) {
      const { state } = await findImport(this.dataSource.manager, caller, String(entity.id));
      if (error instanceof DomainError && error.code === 'import.state' && state === 'checking')
        return { done: Promise.resolve() };
      throw error;
    }
  }

  private async stopCheck(caller: Caller, entity: Import): Promise<Import> {
    if (entity.state !== 'checking') return entity;
    await this.askToStop(caller, entity);
    for (let waited = 0; waited < MOST_WAITED_MS; waited += ASKED_EVERY_MS) {
      await delay(ASKED_EVERY_MS);
      const now = await this.findSettled(caller, String(entity.id));
      if (now.state !== 'checking') return now;
    }
    return entity;
  }

  private async askToStop({ userId }: Caller, { id: importId }: Import): Promise<void> {
    await this.dataSource.manager.update(ImportProgress, { importId }, { cancelledById: userId });
  }

  private async findForChange(caller: Caller, id: string): Promise<Import> {
    const entity = await this.findSettled(caller, id);
    assertMayDo(caller, LIST_KINDS[entity.kind].action);
    return entity;
  }

  private async findSettled(caller: Caller, id: string): Promise<Import> {
    return this.settled(caller, await findImport(this.dataSource.manager, caller, id));
  }

  private async settled(caller: Caller, entity: Import): Promise<Import> {
    const changed = isRunning(entity.state) && (await this.jobs.settle(entity));
    return changed ? findImport(this.dataSource.manager, caller, String(entity.id)) : entity;
  }

  private async answer(caller: Caller, entity: Import): Promise<ImportResponseDto> {
    const { id, kind, sha256, headerKey, mapping, columns } = entity;
    const imports = this.dataSource.getRepository(Import);
    const before = { teamId: caller.teamId, kind, id: LessThan(id) };
    const order = { id: 'DESC' as const };
    const same = await imports.findOne({ where: { ...before, sha256 }, order });
    const remembered =
      mapping === null
        ? await imports.findOne({ where: { ...before, headerKey, mapping: Not(IsNull()) }, order })
        : null;
    return toImportResponse(entity, {
      rememberedMapping: remembered?.mapping?.filter(({ column }) => column < columns.length) ?? null,
      sameFile: same && toSameFile(same),
    });
  }
}
