import type { ImportJob } from '../import-jobs.service.js';
import type { ImportState } from '../import-states.js';
import { changeAlone } from './change-alone.js';

/**
 * Changes a library in one transaction when no other import does; the bump of its revision keeps single edits
 * away until the end. `change` is given the revision that was there before.
 */
export function changeLibraryAlone(
  job: ImportJob,
  libraryId: number,
  state: ImportState,
  change: (revisionBefore: number) => Promise<void>,
): Promise<void> {
  const { runner } = job;
  return changeAlone(job, `library ${libraryId}`, state, async () => {
    await runner.startTransaction();
    try {
      await runner.query('UPDATE libraries SET revision = revision + 1 WHERE id = ?', [libraryId]);
      const [{ revision }] = await runner.query('SELECT revision FROM libraries WHERE id = ?', [libraryId]);
      await change(revision - 1);
      await runner.commitTransaction();
    } catch (error) {
      if (runner.isTransactionActive) await runner.rollbackTransaction().catch(() => undefined);
      throw error;
    }
  });
}
