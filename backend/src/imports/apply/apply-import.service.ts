import { Injectable } from '@nestjs/common';
import type { LibraryPart } from '@roothertz/common/parts';
import type { QueryRunner } from 'typeorm';
import { insertPartsInBulk, replacePartsInBulk } from '../../library/bulk-parts.js';
import { LibraryService } from '../../library/library.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { DomainError } from '../../shared/errors/domain-error.js';
import { Import } from '../entities/import.entity.js';
import { ImportFiles } from '../import-files.service.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { APPLICABLE_STATES } from '../import-states.js';
import { tableOf } from '../part-kinds.js';
import { acceptedRows } from '../row-counts.js';
import { acceptedPortion, type AcceptedRow, keysOf } from './accepted-rows.js';
import { changeLibraryAlone } from './library-lock.js';
import { currentParts } from './current-parts.js';

/** Writes the accepted rows of an import into the team's library: all of them or none. */
@Injectable()
export class ApplyImport {
  constructor(
    private readonly files: ImportFiles,
    private readonly jobs: ImportJobs,
    private readonly libraries: LibraryService,
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
      let [done, last] = [0, 0];
      for (;;) {
        const rows = await acceptedPortion(job.runner, entity.id, last);
        if (rows.length === 0) break;
        if (!asChecked) await refuseEdited(job.runner, libraryId, rows);
        await writeRows(job.runner, entity, libraryId, rows, stamp);
        last = rows.at(-1)!.position;
        done += rows.length;
        await job.progress(done);
      }
      await job.runner.manager.update(
        Import,
        { id: entity.id },
        { state: 'applied', appliedAt: stamp.at, appliedById: stamp.userId, storedName: null },
      );
    });
    if (entity.storedName !== null) await this.files.remove(entity.storedName);
  }
}

async function writeRows(
  runner: QueryRunner,
  { kind }: Import,
  libraryId: number,
  rows: readonly AcceptedRow[],
  stamp: { at: Date; userId: number },
): Promise<void> {
  const table = tableOf(kind);
  const added = rows.filter(({ partId }) => partId === null);
  await insertPartsInBulk(runner, table, libraryId, added.map(toKeyed), stamp);
  const changed = rows.flatMap((row) =>
    row.partId === null ? [] : [{ ...toKeyed(row), id: row.partId, version: row.baseVersion! + 1 }],
  );
  await replacePartsInBulk(runner, table, libraryId, changed, stamp);
}

function toKeyed({ normalisedKey, content }: AcceptedRow): { normalisedKey: string; part: LibraryPart } {
  return { normalisedKey, part: content };
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
    return partId === null ? part !== undefined : part?.id !== partId || part.version !== baseVersion;
  });
  if (edited === undefined) return;
  const { line, partNumber } = edited;
  throw new DomainError(
    'import.outdated',
    `${partNumber} of line ${line} was edited since the check: check the rows again.`,
  );
}
