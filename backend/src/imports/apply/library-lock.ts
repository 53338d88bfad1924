import { Import } from '../entities/import.entity.js';
import { ImportProgress } from '../entities/import-progress.entity.js';
import type { ImportJob } from '../import-jobs.service.js';
import type { ImportState } from '../import-states.js';

const LOCK = `CONCAT(LEFT(DATABASE(), 40), ' library ', ?)`;
const WAIT_SECONDS = 1;

/**
 * Changes a library in one transaction when no other import does; the bump of its revision keeps single edits
 * away until the end. `change` is given the revision that was there before.
 */
export async function changeLibraryAlone(
  job: ImportJob,
  libraryId: number,
  state: ImportState,
  change: (revisionBefore: number) => Promise<void>,
): Promise<void> {
  const { runner, importId } = job;
  await waitForLibrary(job, libraryId);
  try {
    await runner.manager.update(Import, { id: importId }, { state });
    await runner.manager.update(ImportProgress, { importId }, { since: new Date() });
    await runner.startTransaction();
    await runner.query('UPDATE libraries SET revision = revision + 1 WHERE id = ?', [libraryId]);
    const [{ revision }] = await runner.query('SELECT revision FROM libraries WHERE id = ?', [libraryId]);
    await change(revision - 1);
    await runner.commitTransaction();
  } catch (error) {
    if (runner.isTransactionActive) await runner.rollbackTransaction().catch(() => undefined);
    throw error;
  } finally {
    await runner.query(`SELECT RELEASE_LOCK(${LOCK})`, [libraryId]).catch(() => undefined);
  }
}

async function waitForLibrary(job: ImportJob, libraryId: number): Promise<void> {
  for (;;) {
    await job.progress(0);
    const [{ got }] = await job.runner.query(`SELECT GET_LOCK(${LOCK}, ${WAIT_SECONDS}) AS got`, [libraryId]);
    if (Number(got)) return;
  }
}
