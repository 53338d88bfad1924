import { DataSource } from 'typeorm';
import type { AppConfig } from '../config/app-config.js';
import { ownerOptions } from './data-source-options.js';
import { underDatabaseLock } from './database-lock.js';
import { grantApplication } from './grant-application.js';
import { seed } from './seeds/seed.js';

const LOCK_SECONDS = 120;

/** Brings the database to the newest structure and fills it where it is empty; several at once wait for each other. */
export function prepareDatabase(config: AppConfig, report: (line: string) => void): Promise<void> {
  return alone(config, async (dataSource) => {
    const migrations = await migrate(dataSource, config);
    report(migrations > 0 ? `${migrations} migrations applied` : 'Structure is up to date');
    report(await dataSource.transaction((manager) => seed(manager, !config.isProduction)));
  });
}

/** As {@link prepareDatabase}, but fills in nothing. */
export function prepareStructure(config: AppConfig): Promise<void> {
  return alone(config, async (dataSource) => {
    await migrate(dataSource, config);
  });
}

async function migrate(dataSource: DataSource, config: AppConfig): Promise<number> {
  const migrations = await dataSource.runMigrations();
  if (config.DB_OWNER_USER !== undefined) await grantApplication(dataSource, config);
  return migrations.length;
}

async function alone(config: AppConfig, work: (dataSource: DataSource) => Promise<void>): Promise<void> {
  const dataSource = await new DataSource(ownerOptions(config)).initialize();
  try {
    const done = await underDatabaseLock(dataSource, 'prepare', () => work(dataSource), LOCK_SECONDS);
    if (!done) throw new Error('Another process has been preparing the database for too long.');
  } finally {
    await dataSource.destroy();
  }
}
