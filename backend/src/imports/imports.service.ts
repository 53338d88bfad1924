import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, IsNull, LessThan, Not } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import type { ListQueryDto } from '../shared/list/list-query.dto.js';
import { likePattern } from '../shared/list/like-pattern.js';
import { parseSort } from '../shared/list/sort.js';
import { ApplyImport } from './apply/apply-import.service.js';
import { UndoImport } from './apply/undo-import.service.js';
import { CheckImport } from './check/check-import.service.js';
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
import { type ReceivedFile, UploadsService } from './uploads.service.js';

const SORTS = ['createdAt', 'fileName', 'state'] as const;
/** A list up to so many rows is checked while its mapping waits for the answer. */
const CHECKED_AT_ONCE = 5000;

/** A team's imports, from the upload to the undoing. */
@Injectable()
export class ImportsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly uploads: UploadsService,
    private readonly checks: CheckImport,
    private readonly applying: ApplyImport,
    private readonly undoing: UndoImport,
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
    return this.find(caller, String(await this.uploads.take(caller, kind, file)));
  }

  async map(caller: Caller, id: string, dto: MapImportDto): Promise<ImportResponseDto> {
    const entity = await this.findSettled(caller, id);
    if (await this.uploads.describe(entity, dto)) {
      const { done } = await this.checks.start(caller, entity);
      if (entity.rowCount <= CHECKED_AT_ONCE) await done;
    }
    return this.find(caller, id);
  }

  async apply(caller: Caller, id: string): Promise<ImportResponseDto> {
    await this.applying.start(caller, await this.findSettled(caller, id));
    return this.find(caller, id);
  }

  async undo(caller: Caller, id: string): Promise<ImportResponseDto> {
    await this.undoing.start(caller, await this.findSettled(caller, id));
    return this.find(caller, id);
  }

  /** Asks whichever server is at work on the import to stop; without work on it nothing happens. */
  async cancel(caller: Caller, id: string): Promise<ImportResponseDto> {
    const { id: importId, state } = await this.findSettled(caller, id);
    if (isRunning(state))
      await this.dataSource.manager.update(ImportProgress, { importId }, { cancelRequested: 1 });
    return this.find(caller, id);
  }

  private async findSettled(caller: Caller, id: string): Promise<Import> {
    return this.settled(caller, await findImport(this.dataSource.manager, caller, id));
  }

  private async settled(caller: Caller, entity: Import): Promise<Import> {
    const changed = isRunning(entity.state) && (await this.jobs.settle(entity));
    return changed ? findImport(this.dataSource.manager, caller, String(entity.id)) : entity;
  }

  private async answer(caller: Caller, entity: Import): Promise<ImportResponseDto> {
    const { id, kind, sha256, headerKey, mapping } = entity;
    const imports = this.dataSource.getRepository(Import);
    const before = { teamId: caller.teamId, kind, id: LessThan(id) };
    const order = { id: 'DESC' as const };
    const same = await imports.findOne({ where: { ...before, sha256 }, order });
    const remembered =
      mapping === null
        ? await imports.findOne({ where: { ...before, headerKey, mapping: Not(IsNull()) }, order })
        : null;
    return toImportResponse(entity, {
      rememberedMapping: remembered?.mapping ?? null,
      sameFile: same && toSameFile(same),
    });
  }
}
