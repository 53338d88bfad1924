import { commandLine, endProcess } from './processes.mjs';
import { forget, ownerIsAlive, recallAll } from './records.mjs';
import { say } from './steps.mjs';

/**
 * Ends what killed scripts of this checkout left running: a server would hold the port, a test runner the database.
 * Only what carries its record's mark in its command line is ours. MariaDB carries none: it is taken over instead.
 */
export async function endOrphans() {
  const orphans = recallAll().filter((record) => record.mark && !ownerIsAlive(record));
  for (const { name, pid, mark } of orphans) {
    if (commandLine(pid).includes(mark)) {
      await endProcess(pid, { group: true });
      say(`Ended process ${pid} (${name}), left by a killed script`);
    }
    forget(name);
  }
}
