import type { DataSourceOptions } from 'typeorm';
import type { AppConfig } from '../config/app-config.js';
import { ENTITIES } from './entities.js';
import { MIGRATIONS } from './migrations/index.js';

const CONNECTIONS = 10;
const WAITING_REQUESTS = 200;
const CONNECT_TIMEOUT_MS = 5_000;

/** How the tools that change the structure reach MariaDB: as its owner, where there is one. */
export function ownerOptions(config: AppConfig): DataSourceOptions {
  const { DB_OWNER_USER: username, DB_OWNER_PASSWORD: password } = config;
  const options = dataSourceOptions(config);
  return username === undefined ? options : ({ ...options, username, password } as DataSourceOptions);
}

/** How the application reaches MariaDB. */
export function dataSourceOptions(config: AppConfig): DataSourceOptions {
  return {
    type: 'mariadb',
    host: config.DB_HOST,
    port: config.DB_PORT,
    username: config.DB_USER,
    password: config.DB_PASSWORD,
    database: config.DB_NAME,
    charset: 'utf8mb4',
    timezone: 'Z',
    entities: ENTITIES,
    migrations: MIGRATIONS,
    migrationsTransactionMode: 'each',
    synchronize: false,
    poolSize: CONNECTIONS,
    connectTimeout: CONNECT_TIMEOUT_MS,
    extra: { queueLimit: WAITING_REQUESTS },
  };
}
