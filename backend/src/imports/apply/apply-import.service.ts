import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, QueryRunner } from 'typeorm';
import {
  insertPartsInBulk,
  type KeyedPart,
  replacePartsInBulk,
  type Stamp,
} from '../../library/bulk-parts.js';
import { AuditService } from '../../audit/audit.service.js';
import { LibraryService } from '../../library/library.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { DomainError } from '../../shared/errors/domain-error.js';
import { Import } from '../entities/import.entity.js';
import { ImportFiles } from '../import-files.service.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { importRecord } from '../import-record.js';
import { APPLICABLE_STATES } from '../import-states.js';
import { tableOf } from '../list-kinds.js';
import { acceptedRows } from '../row-counts.js';
import { acceptedPortions, type AcceptedRow, keysOf } from './accepted-rows.js';
import { changeLibraryAlone } from './library-lock.js';
import { currentParts } from './current-parts.js';

/** Writes the accepted rows of an import into the team's library: all of them or none. */
@Injectable()
export class ApplyImport {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly files: ImportFiles,
    private readonly jobs: ImportJobs,
    private readonly libraries: LibraryService,
    private readonly audit: AuditService,
  ) {}

  async start(caller: Caller, entity: Import): Promise<void> {
    if (entity.counts === null)
      throw new DomainError('import.state', 'The rows aren’t checked yet: say what the columns are.');
    const libraryId = await this.libraries.editableLibrary(caller);
    const total = acceptedRows(entity.counts);
    await this.jobs.start(entity.id, { from: APPLICABLE_STATES, to: 'waiting', total }, (job) =>
      this.apply(job, caller, entity, libraryId),
    );
  }

  private async apply(job: ImportJob, caller: Caller, entity: Import, libraryId: number): Promise<void> {
    const stamp = { at: new Date(), userId: caller.userId };
    await changeLibraryAlone(job, libraryId, 'applying', async (revisionBefore) => {
      const asChecked = revisionBefore === entity.checkedRevision;
      await this.writePortions(job, entity, libraryId, { stamp, asChecked });
      await job.runner.manager.update(
        Import,
        { id: entity.id },
        { state: 'applied', appliedAt: stamp.at, appliedById: stamp.userId, storedName: null },
      );
      await this.audit.record(job.runner.manager, caller, [importRecord('import.applied', entity)]);
    });
    if (entity.storedName !== null) await this.files.remove(entity.storedName);
  }

  /** While the database writes one portion, the next is made ready. */
  private async writePortions(
    job: ImportJob,
    entity: Import,
    libraryId: number,
    { stamp, asChecked }: { stamp: Stamp; asChecked: boolean },
  ): Promise<void> {
    let writing = Promise.resolve();
    let done = 0;
    try {
      for await (const { accepted } of acceptedPortions(this.dataSource, entity.id)) {
        if (!asChecked && accepted.length > 0) await refuseEdited(job.runner, libraryId, accepted);
        const before = writing;
        writing = writeRows(job.runner, entity, libraryId, accepted, stamp);
        writing.catch(() => undefined);
        await before;
        done += accepted.length;
        await job.progress(done);
      }
      await writing;
    } finally {
      await writing.catch(() => undefined);
    }
  }
}

async function writeRows(
  runner: QueryRunner,
  { kind }: Import,
  libraryId: number,
  rows: readonly AcceptedRow[],
  stamp: Stamp,
): Promise<void> {
  const table = tableOf(kind);
  const added = rows.filter(({ partId }) => partId === undefined);
  await insertPartsInBulk(runner, table, libraryId, added.map(toKeyed), stamp);
  const changed = rows.flatMap((row) =>
    row.partId === undefined ? [] : [{ ...toKeyed(row), id: row.partId, version: row.baseVersion! + 1 }],
  );
  await replacePartsInBulk(runner, table, libraryId, changed, stamp);
}

function toKeyed({ normalisedKey, content }: AcceptedRow): KeyedPart {
  return { normalisedKey, cells: content };
}

/** What the verdicts were given on must still be so: new parts aren't there, changed ones have their version. */
async function refuseEdited(
  runner: QueryRunner,
  libraryId: number,
  rows: readonly AcceptedRow[],
): Promise<void> {
  const current = await currentParts(runner, libraryId, keysOf(rows));
  const edited = rows.find(({ normalisedKey, partId, baseVersion }) => {
    const part = current.get(normalisedKey);
    return partId === undefined ? part !== undefined : part?.id !== partId || part.version !== baseVersion;
  });
  if (edited === undefined) return;
  const { line, partNumber } = edited;
  throw new DomainError(
    'import.outdated',
    `${partNumber} of line ${line} was edited since the check: check the rows again.`,
  );
}
