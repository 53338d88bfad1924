import { DataSource, type QueryRunner } from 'typeorm';
import type { AppConfig } from '../config/app-config.js';
import { ownerOptions } from './data-source-options.js';
import { grantApplication } from './grant-application.js';
import { seed } from './seeds/seed.js';

const LOCK_SECONDS = 120;

/** Brings the database to the newest structure and fills it where it is empty; several at once wait for each other. */
export function prepareDatabase(config: AppConfig, report: (line: string) => void): Promise<void> {
  return alone(config, async (dataSource, runner) => {
    const migrations = await migrate(dataSource, runner, config);
    report(migrations > 0 ? `${migrations} migrations applied` : 'Structure is up to date');
    report(await dataSource.transaction((manager) => seed(manager, !config.isProduction)));
  });
}

/** As {@link prepareDatabase}, but fills in nothing. */
export function prepareStructure(config: AppConfig): Promise<void> {
  return alone(config, async (dataSource, runner) => {
    await migrate(dataSource, runner, config);
  });
}

async function migrate(dataSource: DataSource, runner: QueryRunner, config: AppConfig): Promise<number> {
  const migrations = await dataSource.runMigrations();
  if (config.DB_OWNER_USER !== undefined) await grantApplication(runner, config);
  return migrations.length;
}

async function alone(
  config: AppConfig,
  work: (dataSource: DataSource, runner: QueryRunner) => Promise<void>,
): Promise<void> {
  const dataSource = await new DataSource(ownerOptions(config)).initialize();
  const runner = dataSource.createQueryRunner();
  const lock = `${config.DB_NAME.slice(0, 50)} prepare`;
  try {
    await runner.query('SELECT GET_LOCK(?, ?)', [lock, LOCK_SECONDS]);
    await work(dataSource, runner);
  } finally {
    await runner.query('SELECT RELEASE_LOCK(?)', [lock]);
    await runner.release();
    await dataSource.destroy();
  }
}
