import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, QueryRunner } from 'typeorm';
import { replacePartsInBulk } from '../../library/bulk-parts.js';
import { AuditService } from '../../audit/audit.service.js';
import { LibraryService } from '../../library/library.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { Import } from '../entities/import.entity.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { importRecord } from '../import-record.js';
import { tableOf } from '../list-kinds.js';
import { acceptedRows } from '../row-counts.js';
import { acceptedPortions, type AcceptedRow, keysOf } from './accepted-rows.js';
import { type CurrentPart, currentParts } from './current-parts.js';
import { changeLibraryAlone } from './library-lock.js';
import { markKept } from './mark-kept.js';

/** A row of an applied import with the part that it wrote, where nobody has touched it since. */
interface Untouched {
  row: AcceptedRow;
  part: CurrentPart;
}

/** Brings back what stood in the library before an import; parts that were edited since stay and are marked. */
@Injectable()
export class UndoImport {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly jobs: ImportJobs,
    private readonly libraries: LibraryService,
    private readonly audit: AuditService,
  ) {}

  async start(caller: Caller, entity: Import): Promise<void> {
    const libraryId = await this.libraries.editableLibrary(caller);
    const total = entity.counts === null ? 0 : acceptedRows(entity.counts);
    await this.jobs.start(entity.id, { from: ['applied'], to: 'undoing', total }, (job) =>
      this.undo(job, caller, entity, libraryId),
    );
  }

  private undo(job: ImportJob, caller: Caller, entity: Import, libraryId: number): Promise<void> {
    const stamp = { at: new Date(), userId: caller.userId };
    return changeLibraryAlone(job, libraryId, 'undoing', async () => {
      let [done, kept] = [0, 0];
      for await (const { portion, accepted: rows } of acceptedPortions(this.dataSource, entity.id)) {
        if (rows.length === 0) continue;
        const untouched = await untouchedRows(job.runner, libraryId, entity, rows);
        await takeBack(job.runner, untouched);
        await replacePartsInBulk(
          job.runner,
          tableOf(entity.kind),
          libraryId,
          untouched.flatMap(({ row, part }) => restored(row, part)),
          stamp,
        );
        const undone = new Set(untouched.map(({ row }) => row));
        kept += await markKept(
          job.runner,
          portion,
          rows.filter((row) => !undone.has(row)),
        );
        done += rows.length;
        await job.progress(done);
      }
      await job.runner.manager.update(
        Import,
        { id: entity.id },
        { state: 'undone', undoneAt: stamp.at, undoneById: stamp.userId, keptCount: kept },
      );
      await this.audit.record(job.runner.manager, caller, [
        importRecord('import.undone', entity, { takenBack: done - kept, kept }),
      ]);
    });
  }
}

/** A part that is as the import wrote it carries the import's moment and the version after the checked one. */
async function untouchedRows(
  runner: QueryRunner,
  libraryId: number,
  { appliedAt }: Import,
  rows: readonly AcceptedRow[],
): Promise<Untouched[]> {
  const current = await currentParts(runner, libraryId, keysOf(rows));
  const inUse = await partsInUse(
    runner,
    rows.flatMap(({ partId, normalisedKey }) =>
      partId === undefined ? (current.get(normalisedKey)?.id ?? []) : [],
    ),
  );
  return rows.flatMap((row) => {
    const part = current.get(row.normalisedKey);
    const asWritten =
      part?.updatedAt.getTime() === appliedAt?.getTime() && part?.version === (row.baseVersion ?? 0) + 1;
    return part !== undefined && asWritten && !inUse.has(part.id) ? [{ row, part }] : [];
  });
}

/** What was offered or chosen of a new part would go with it. */
async function partsInUse(runner: QueryRunner, ids: readonly number[]): Promise<Set<number>> {
  if (ids.length === 0) return new Set();
  const rows: { id: number }[] = await runner.query(
    `SELECT part_id AS id FROM offers WHERE part_id IN (?)
     UNION SELECT part_id FROM saved_conditions_parts WHERE part_id IN (?)`,
    [ids, ids],
  );
  return new Set(rows.map(({ id }) => id));
}

async function takeBack(runner: QueryRunner, untouched: readonly Untouched[]): Promise<void> {
  const ids = untouched.flatMap(({ row, part }) => (row.partId === undefined ? [part.id] : []));
  if (ids.length > 0) await runner.query('DELETE FROM parts WHERE id IN (?)', [ids]);
}

function restored({ before, normalisedKey }: AcceptedRow, { id, version }: CurrentPart) {
  return before === undefined ? [] : [{ id, version: version + 1, normalisedKey, cells: before }];
}
