import { readConfig } from '../config/read-config.js';
import { prepareDatabase } from './prepare-database.js';

try {
  await prepareDatabase(readConfig(), (line) => console.log(line));
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
