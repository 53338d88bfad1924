import { Import } from '../entities/import.entity.js';
import { ImportProgress } from '../entities/import-progress.entity.js';
import type { ImportJob } from '../import-jobs.service.js';
import type { ImportState } from '../import-states.js';

const LOCK = `CONCAT(LEFT(DATABASE(), 40), ' ', ?)`;
const WAIT_SECONDS = 1;

/** Does the work of an import when no other one changes the same, such as `prices 7`; until then it waits. */
export async function changeAlone(
  job: ImportJob,
  what: string,
  state: ImportState,
  change: () => Promise<void>,
): Promise<void> {
  const { runner, importId } = job;
  await waitFor(job, what);
  try {
    await runner.manager.update(Import, { id: importId }, { state });
    await runner.manager.update(ImportProgress, { importId }, { since: new Date() });
    await change();
  } finally {
    await runner.query(`SELECT RELEASE_LOCK(${LOCK})`, [what]).catch(() => undefined);
  }
}

async function waitFor(job: ImportJob, what: string): Promise<void> {
  for (;;) {
    await job.progress(0);
    const [{ got }] = await job.runner.query(`SELECT GET_LOCK(${LOCK}, ${WAIT_SECONDS}) AS got`, [what]);
    if (Number(got)) return;
  }
}
