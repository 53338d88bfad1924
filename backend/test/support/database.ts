import { randomBytes } from 'node:crypto';
import { createConnection } from 'mysql2/promise';
import type { AppConfig } from '../../src/config/app-config.js';
import { readConfig } from '../../src/config/read-config.js';

/** The configuration of a suite: a database of its own, so that suites never meet. */
export function testConfig(environment: Record<string, string> = {}): AppConfig {
  const database = `${process.env.DB_NAME ?? 'roothertz_test'}_${process.env.JEST_WORKER_ID ?? '1'}`;
  return readConfig({ ...process.env, NODE_ENV: 'test', DB_NAME: database, ...environment });
}

export async function createFreshDatabase(config: AppConfig): Promise<void> {
  await onServer(config, `DROP DATABASE IF EXISTS ${config.DB_NAME}`);
  await onServer(
    config,
    `CREATE DATABASE ${config.DB_NAME} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`,
  );
}

export function dropDatabase(config: AppConfig): Promise<void> {
  return onServer(config, `DROP DATABASE IF EXISTS ${config.DB_NAME}`);
}

export interface DatabaseAccount {
  /** What lets the application run as this account, on tables that the suite's own account owns. */
  environment: Record<string, string>;
  drop(): Promise<void>;
}

/** An account without any right, as an installation has one for the application. */
export async function createDatabaseAccount(): Promise<DatabaseAccount> {
  const config = testConfig();
  const [DB_USER, DB_PASSWORD] = [`${config.DB_NAME}_app`, randomBytes(12).toString('hex')];
  const account = `'${DB_USER}'@'127.0.0.1'`;
  await onServer(config, `CREATE OR REPLACE USER ${account} IDENTIFIED BY '${DB_PASSWORD}'`);
  const { DB_USER: DB_OWNER_USER, DB_PASSWORD: DB_OWNER_PASSWORD } = config;
  return {
    environment: { DB_USER, DB_PASSWORD, DB_OWNER_USER, DB_OWNER_PASSWORD },
    drop: () => onServer(config, `DROP USER ${account}`),
  };
}

async function onServer(config: AppConfig, sql: string): Promise<void> {
  const { DB_HOST: host, DB_PORT: port, DB_USER: user, DB_PASSWORD: password } = config;
  const connection = await createConnection({ host, port, user, password });
  await connection.query(sql);
  await connection.end();
}
