import type { DataSource } from 'typeorm';

const LOCK = `CONCAT(LEFT(DATABASE(), 40), ' ', ?)`;

/**
 * Does work that only one process at a time may do, holding a lock of the database by a connection of its own, with
 * which the lock goes when the process is killed. Answers whether the work was done: not when another process still
 * held the lock after `waitSeconds`.
 *
 * @param name of the lock, at most 20 characters
 */
export async function underDatabaseLock(
  dataSource: DataSource,
  name: string,
  work: () => Promise<void>,
  waitSeconds = 0,
): Promise<boolean> {
  const runner = dataSource.createQueryRunner();
  try {
    const [{ got }] = await runner.query(`SELECT GET_LOCK(${LOCK}, ?) AS got`, [name, waitSeconds]);
    if (!Number(got)) return false;
    await work();
    return true;
  } finally {
    await runner.query(`SELECT RELEASE_LOCK(${LOCK})`, [name]).catch(() => undefined);
    await runner.release();
  }
}
