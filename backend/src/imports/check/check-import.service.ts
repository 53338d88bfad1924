import type { LibraryPart } from '@roothertz/common/parts';
import { Injectable } from '@nestjs/common';
import type { QueryRunner } from 'typeorm';
import { ConditionsService } from '../../conditions/conditions.service.js';
import { findPartsByKeys, type FoundPart, knownKeys } from '../../library/bulk-parts.js';
import { LibraryService, type ReadableLibrary } from '../../library/library.service.js';
import type { PartTable } from '../../library/part-tables.js';
import type { Caller } from '../../shared/access/caller.js';
import { Import } from '../entities/import.entity.js';
import { ImportPortion } from '../entities/import-portion.entity.js';
import { readRows } from '../file/csv-records.js';
import { ImportFiles } from '../import-files.service.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { MAPPABLE_STATES } from '../import-states.js';
import { tableOf } from '../list-kinds.js';
import { noRows } from '../row-counts.js';
import { type CheckedRow, type ReadRow, RowChecker } from './row-checker.js';
import { toStored, writeRows } from './row-writer.js';

/** Rows that are read, looked up and written together. */
const PORTION = 500;

/** Gives every row of an import its verdict, all in one transaction. */
@Injectable()
export class CheckImport {
  constructor(
    private readonly files: ImportFiles,
    private readonly jobs: ImportJobs,
    private readonly libraries: LibraryService,
    private readonly conditions: ConditionsService,
  ) {}

  async start(caller: Caller, entity: Import): Promise<{ done: Promise<void> }> {
    const ownLibraryId = await this.libraries.editableLibrary(caller);
    const libraries = await this.libraries.readableLibraries(caller);
    const beginning = { from: MAPPABLE_STATES, to: 'checking' as const, total: entity.rowCount };
    return this.jobs.start(entity.id, beginning, (job) => this.check(job, caller, libraries, ownLibraryId));
  }

  private async check(
    job: ImportJob,
    caller: Caller,
    libraries: readonly ReadableLibrary[],
    ownLibraryId: number,
  ): Promise<void> {
    const { runner, importId: id } = job;
    const entity = await runner.manager.findOneByOrFail(Import, { id });
    const table = tableOf(entity.kind);
    const uses = await this.conditions.partsInUse(caller, runner.manager);
    const checker = new RowChecker(table.catalogue, entity, ownLibraryId, uses);
    const counts = noRows();
    let [position, portion] = [0, 1];
    let writing = Promise.resolve();
    await runner.startTransaction();
    try {
      await runner.manager.delete(ImportPortion, { importId: entity.id });
      const known = await knownKeys(
        runner,
        libraries.map(({ id }) => id),
      );
      for await (const rows of this.readRows(entity, checker)) {
        const checked = await checkRows(runner, table, checker, libraries, known, rows);
        await writing;
        const stored = checked.map((row) => toStored(table, row));
        writing = writeRows(runner, { importId: entity.id, portion }, stored, counts);
        writing.catch(() => undefined);
        portion += 1;
        position += rows.length;
        await job.progress(position);
      }
      await writing;
      const checkedRevision = libraries.find(({ id }) => id === ownLibraryId)?.revision ?? null;
      await runner.manager.update(
        Import,
        { id: entity.id },
        { state: 'checked', counts, checkedRevision, rowCount: position },
      );
      await runner.commitTransaction();
    } catch (error) {
      await writing.catch(() => undefined);
      await runner.rollbackTransaction().catch(() => undefined);
      throw error;
    }
  }

  private async *readRows({ storedName, dialect }: Import, checker: RowChecker): AsyncGenerator<ReadRow[]> {
    for await (const records of readRows(this.files.pathOf(storedName!), dialect, PORTION))
      yield records.map((record) => checker.read(record));
  }
}

async function checkRows(
  runner: QueryRunner,
  table: PartTable<LibraryPart>,
  checker: RowChecker,
  libraries: readonly ReadableLibrary[],
  known: ReadonlySet<string> | null,
  rows: readonly ReadRow[],
): Promise<CheckedRow[]> {
  const named = rows.flatMap(({ key }) => (key === null ? [] : [key]));
  const keys = [...new Set(named)].filter((key) => known?.has(key) ?? true);
  const ids = libraries.map(({ id }) => id);
  const found = new Map<string, FoundPart<LibraryPart>[]>();
  for (const part of await findPartsByKeys(runner, table, ids, keys))
    found.set(part.normalisedKey, [...(found.get(part.normalisedKey) ?? []), part]);
  return rows.map((row) => checker.check(row, found.get(row.key ?? '') ?? []));
}
