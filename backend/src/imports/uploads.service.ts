import { NOT_STATED } from '@roothertz/common/imports';
import type { FieldError } from '@roothertz/common/parts';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, In, IsNull, Not, type QueryDeepPartialEntity } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { wellFormed } from '../shared/text/shortened.js';
import type { MapImportDto } from './dto/map-import.dto.js';
import { Import } from './entities/import.entity.js';
import { ImportProgress } from './entities/import-progress.entity.js';
import { readUpload } from './file/read-upload.js';
import { ImportFiles } from './import-files.service.js';
import { importRecord } from './import-record.js';
import { type ImportKind, MAPPABLE_STATES } from './import-states.js';
import { LIST_KINDS } from './list-kinds.js';

/** A file that was received. */
export interface ReceivedFile {
  filename: string;
  originalname: string;
}

const LONGEST_NAME = 255;
const MOST_PENDING = 20;

/** Takes in uploaded lists, and what a member says of their dialect and columns. */
@Injectable()
export class UploadsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly files: ImportFiles,
    private readonly audit: AuditService,
  ) {}

  /** Answers the id of the import that the file begins. */
  async take({ teamId, userId }: Caller, kind: ImportKind, file: ReceivedFile): Promise<number> {
    await this.files.forgetAbandoned();
    await this.assertRoom(teamId);
    const upload = await readUpload(kind, this.files.pathOf(file.filename));
    return this.dataSource.transaction(async (manager) => {
      const { identifiers } = await manager.insert(Import, {
        ...upload,
        teamId,
        kind,
        state: 'uploaded',
        fileName: displayName(file.originalname),
        storedName: file.filename,
        createdAt: new Date(),
        createdById: userId,
      });
      const importId = identifiers[0].id as number;
      await manager.insert(ImportProgress, { importId });
      return importId;
    });
  }

  /**
   * Keeps what a member says of the columns, or reads dialect and columns anew where the dialect is overruled; one
   * after the other, each on what the one before has left. Answers whether rows can be checked.
   */
  describe({ id }: Pick<Import, 'id'>, dto: MapImportDto): Promise<boolean> {
    return this.dataSource.transaction(async (manager) => {
      const lock = { mode: 'pessimistic_write' as const };
      const entity = await manager.findOneOrFail(Import, { where: { id }, lock });
      await this.assertKept(entity, dto.version);
      await manager.update(Import, { id }, await this.described(entity, dto));
      return dto.columns !== undefined;
    });
  }

  /** Takes back a list that isn't applied, and all that was read of it. */
  async discard(caller: Caller, entity: Import): Promise<void> {
    const { id, storedName } = entity;
    await this.dataSource.transaction(async (manager) => {
      const { affected } = await manager.delete(Import, { id, state: In(MAPPABLE_STATES) });
      if (affected !== 1)
        throw new DomainError('import.state', 'Only a list that isn’t applied can be discarded.');
      await this.audit.record(manager, caller, [importRecord('import.discarded', entity)]);
    });
    if (storedName !== null) await this.files.remove(storedName);
  }

  private async described(
    entity: Import,
    { columns, wholeList, version: _, ...choice }: MapImportDto,
  ): Promise<QueryDeepPartialEntity<Import>> {
    const overruled = Object.keys(choice).length > 0;
    const path = this.files.pathOf(entity.storedName!);
    const read = overruled ? await readUpload(entity.kind, path, { ...entity.dialect, ...choice }) : entity;
    const stated = wholeList === undefined ? entity.wholeList : { ...NOT_STATED, ...wholeList };
    if (columns !== undefined)
      refuse(LIST_KINDS[entity.kind].columns.check(columns, read.columns.length, stated ?? NOT_STATED));
    return {
      dialect: read.dialect,
      columns: read.columns,
      headerKey: read.headerKey,
      rowCount: read.rowCount,
      mapping: columns?.map((column) => ({ ...column })) ?? entity.mapping,
      wholeList: stated,
      version: entity.version + 1,
      counts: null,
      state: 'uploaded',
    };
  }

  /** A team has only so many lists that aren't applied. */
  private async assertRoom(teamId: number): Promise<void> {
    const pending = await this.dataSource.manager.countBy(Import, { teamId, storedName: Not(IsNull()) });
    if (pending >= MOST_PENDING)
      throw new DomainError(
        'import.too-many',
        `Your team has ${pending} lists that aren’t applied: apply or discard some of them first.`,
      );
  }

  private async assertKept({ state, storedName, version }: Import, asked?: number): Promise<void> {
    if (asked !== undefined && asked !== version)
      throw new DomainError('import.stale', 'Somebody has said something else of the list meanwhile.');
    if (!MAPPABLE_STATES.some((mappable) => mappable === state))
      throw new DomainError('import.state', 'The columns can’t be mapped in this state of the import.');
    if (storedName === null || !(await this.files.exists(storedName)))
      throw new DomainError('import.state', 'The file isn’t kept any more: upload it again.');
  }
}

function refuse(errors: FieldError[]): void {
  if (errors.length > 0)
    throw new DomainError('import.mapping', 'The columns can’t be mapped like this.', { errors });
}

/** The last part of the name that the browser sent, without what can't be shown. */
function displayName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? '';
  const shown = wellFormed(last)
    .replace(/[\p{Cc}\p{Zl}\p{Zp}]/gu, ' ')
    .trim();
  return wellFormed(shown.slice(-LONGEST_NAME)) || 'list.csv';
}
