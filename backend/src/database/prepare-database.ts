import { DataSource } from 'typeorm';
import type { AppConfig } from '../config/app-config.js';
import { dataSourceOptions } from './data-source-options.js';
import { seed } from './seeds/seed.js';

const LOCK_SECONDS = 120;

/** Brings the database to the newest structure and fills it where it is empty; several at once wait for each other. */
export async function prepareDatabase(config: AppConfig, report: (line: string) => void): Promise<void> {
  const dataSource = await new DataSource(dataSourceOptions(config)).initialize();
  const runner = dataSource.createQueryRunner();
  const lock = `${config.DB_NAME.slice(0, 50)} prepare`;
  try {
    await runner.query('SELECT GET_LOCK(?, ?)', [lock, LOCK_SECONDS]);
    const migrations = await dataSource.runMigrations();
    report(migrations.length > 0 ? `${migrations.length} migrations applied` : 'Structure is up to date');
    report(await dataSource.transaction((manager) => seed(manager, !config.isProduction)));
  } finally {
    await runner.query('SELECT RELEASE_LOCK(?)', [lock]);
    await runner.release();
    await dataSource.destroy();
  }
}
