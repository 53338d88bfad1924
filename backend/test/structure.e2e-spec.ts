import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../src/database/data-source-options.js';
import { prepareDatabase } from '../src/database/prepare-database.js';
import { Team } from '../src/teams/entities/team.entity.js';
import { User } from '../src/users/entities/user.entity.js';
import { createFreshDatabase, dropDatabase, testConfig } from './support/database.js';

describe('database structure', () => {
  let dataSource: DataSource;

  beforeAll(async () => {
    await createFreshDatabase(testConfig());
    dataSource = await new DataSource(dataSourceOptions(testConfig())).initialize();
  });
  afterAll(async () => {
    await dataSource.destroy();
    await dropDatabase(testConfig());
  });

  it('leaves nothing for a generated migration to do', async () => {
    await dataSource.runMigrations();
    const { upQueries } = await dataSource.driver.createSchemaBuilder().log();
    expect(upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('can be taken down to nothing and built again', async () => {
    for (const migration of dataSource.migrations) {
      expect(migration.name).toBeDefined();
      await dataSource.undoLastMigration();
    }
    const tables: { name: string }[] = await dataSource.query(
      'SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE()',
    );
    expect(tables.map(({ name }) => name)).toEqual(['migrations']);
    await dataSource.runMigrations();
  });

  it('is whole again after a migration that was cut off before it was noted down', async () => {
    await dataSource.query('DELETE FROM migrations');
    const migrations = await dataSource.runMigrations();
    expect(migrations.length).toBe(dataSource.migrations.length);
  });
});

describe('preparing a database', () => {
  const prepare = async (config = testConfig()): Promise<string[]> => {
    const lines: string[] = [];
    await prepareDatabase(config, (line) => lines.push(line));
    return lines;
  };
  const count = async (entity: typeof Team | typeof User): Promise<number> => {
    const dataSource = await new DataSource(dataSourceOptions(testConfig())).initialize();
    const number = await dataSource.getRepository<Team | User>(entity).count();
    await dataSource.destroy();
    return number;
  };

  beforeEach(() => createFreshDatabase(testConfig()));
  afterAll(() => dropDatabase(testConfig()));

  it('fills an empty one and leaves a full one alone', async () => {
    expect((await prepare())[1]).toMatch(/^Seeded: .*team Tarnfield Instruments/);
    expect([await count(Team), await count(User)]).toEqual([1, 5]);
    expect(await prepare()).toEqual(['Structure is up to date', 'Nothing to seed']);
    expect([await count(Team), await count(User)]).toEqual([1, 5]);
  });

  it('can be asked for twice at once', async () => {
    await Promise.all([prepare(), prepare()]);
    expect([await count(Team), await count(User)]).toEqual([1, 5]);
  });

  it('makes no demo accounts in production', async () => {
    await prepare(Object.assign(testConfig(), { NODE_ENV: 'production' }));
    expect([await count(Team), await count(User)]).toEqual([0, 0]);
  });
});
