import { createConnection } from 'mysql2/promise';
import type { DataSource } from 'typeorm';
import type { AppConfig } from '../config/app-config.js';

const ALL = 'SELECT, INSERT, UPDATE, DELETE';

/** What the application may do with a table, where it isn't {@link ALL}: the trail only grows, and its team stays. */
const RIGHTS: Readonly<Record<string, string | null>> = {
  audit_entries: 'SELECT, INSERT',
  migrations: null,
  teams: 'SELECT, INSERT, UPDATE',
};

/** Gives the application's account what it needs on each table, as the owner of all of them. */
export async function grantApplication(dataSource: DataSource, config: AppConfig): Promise<void> {
  const account = await accountOf(config);
  const tables: { name: string }[] = await dataSource.query(
    `SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE()`,
  );
  for (const { name } of tables) {
    const rights = name in RIGHTS ? RIGHTS[name] : ALL;
    if (rights !== null)
      await dataSource.query(`GRANT ${rights} ON \`${config.DB_NAME}\`.\`${name}\` TO ${account}`);
  }
}

/** The account that the server takes the application for, with the hosts that it may come from. */
async function accountOf({ DB_HOST: host, DB_PORT: port, DB_USER: user, DB_PASSWORD: password }: AppConfig) {
  const connection = await createConnection({ host, port, user, password });
  try {
    const [rows] = await connection.query('SELECT CURRENT_USER() AS account');
    const { account } = (rows as { account: string }[])[0];
    return account
      .split(/@(?=[^@]*$)/)
      .map((name) => connection.escape(name))
      .join('@');
  } finally {
    await connection.end();
  }
}
