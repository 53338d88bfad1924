import { checkMapping } from '@roothertz/common/imports';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { wellFormed } from '../shared/text/shortened.js';
import type { MapImportDto } from './dto/map-import.dto.js';
import { Import } from './entities/import.entity.js';
import { ImportProgress } from './entities/import-progress.entity.js';
import { readUpload } from './file/read-upload.js';
import { ImportFiles } from './import-files.service.js';
import { type ImportKind, MAPPABLE_STATES } from './import-states.js';
import { tableOf } from './part-kinds.js';

/** A file that was received. */
export interface ReceivedFile {
  filename: string;
  originalname: string;
}

const LONGEST_NAME = 255;

/** Takes in uploaded lists, and what a member says of their dialect and columns. */
@Injectable()
export class UploadsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly files: ImportFiles,
  ) {}

  /** Answers the id of the import that the file begins. */
  async take({ teamId, userId }: Caller, kind: ImportKind, file: ReceivedFile): Promise<number> {
    const upload = await readUpload(tableOf(kind).catalogue, this.files.pathOf(file.filename));
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

  /** Keeps the mapping, or reads dialect and columns anew where it is overruled; answers whether rows can be checked. */
  async describe(entity: Import, { columns, ...choice }: MapImportDto): Promise<boolean> {
    await this.assertKept(entity);
    const { catalogue } = tableOf(entity.kind);
    const overruled = Object.keys(choice).length > 0;
    const changed = overruled
      ? await readUpload(catalogue, this.files.pathOf(entity.storedName!), { ...entity.dialect, ...choice })
      : {};
    Object.assign(entity, changed, { counts: null });
    if (columns !== undefined) {
      refuse(checkMapping(catalogue, columns, entity.columns.length));
      Object.assign(entity, { mapping: columns.map((column) => ({ ...column })) });
    }
    const { dialect, headerKey, rowCount, mapping } = entity;
    await this.dataSource.manager.update(
      Import,
      { id: entity.id },
      { dialect, columns: entity.columns, headerKey, rowCount, mapping, counts: null, state: 'uploaded' },
    );
    return columns !== undefined;
  }

  private async assertKept({ state, storedName }: Import): Promise<void> {
    if (!MAPPABLE_STATES.some((mappable) => mappable === state))
      throw new DomainError('import.state', 'The columns can’t be mapped in this state of the import.');
    if (storedName === null || !(await this.files.exists(storedName)))
      throw new DomainError('import.state', 'The file isn’t kept any more: upload it again.');
  }
}

function refuse(errors: ReturnType<typeof checkMapping>): void {
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
