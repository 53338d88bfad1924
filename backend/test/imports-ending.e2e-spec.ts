import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import supertest from 'supertest';
import { checkedList, ended } from './factories/imports.js';
import { createResistor } from './factories/resistors.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { Import } from '../src/imports/entities/import.entity.js';
import { ImportJobs } from '../src/imports/import-jobs.service.js';

/** The built server: the tests are run after a build. */
const MAIN = join(__dirname, '..', 'dist', 'main.js');
const SHARED = {
  IMPORT_DIR: join(tmpdir(), `roothertz-imports-ending-${process.pid}`),
  JWT_SECRET: 'a secret that both servers know of',
};
const HALF = 3000;
const rowsOf = (letter: string) =>
  Array.from({ length: HALF }, (_, n) => `Vireo,${letter}-${n},${n + 1},new\n`).join('');
const LIST = `maker,mpn,value,remark\n${rowsOf('A')}${rowsOf('Z')}`;

describe('an import whose server ends', () => {
  let app: TestApp;
  let librarian: TestMember;
  let server: ChildProcess | undefined;

  beforeAll(async () => {
    app = await startTestApp(SHARED);
  });
  beforeEach(async () => {
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
    await createResistor(librarian, { manufacturer: 'Vireo', partNumber: 'M-0' });
  });
  afterEach(() => void server?.kill('SIGKILL'));
  afterAll(async () => {
    await app.close();
    await rm(SHARED.IMPORT_DIR, { recursive: true });
  });

  const libraryOf = async () => {
    const [library] = await app.dataSource.query(
      `SELECT id, revision, (SELECT COUNT(*) FROM parts WHERE library_id = libraries.id) AS parts
       FROM libraries WHERE team_id = ?`,
      [librarian.caller.teamId],
    );
    return { ...library, parts: Number(library.parts) } as { id: number; revision: number; parts: number };
  };
  const stateOf = async (id: string) =>
    (await app.dataSource.getRepository(Import).findOneByOrFail({ id: Number(id) })).state;

  it('leaves the library as before when it is killed in the middle, and can be run again', async () => {
    const { id } = await checkedList(librarian, 'resistors', LIST);
    const before = await libraryOf();
    const elsewhere = supertest.agent(await startServer()).set('Cookie', librarian.cookie);
    const letGo = await holdSecondHalf(before.id);
    await elsewhere.post(`/api/imports/${id}/apply`).expect(202);
    await until(async () => (await writtenOf(before.id)) === 1 + HALF);
    expect(await stateOf(id)).toBe('applying');
    server!.kill('SIGKILL');
    await once(server!, 'exit');
    await letGo();
    await until(async () => {
      await app.nest.get(ImportJobs).onApplicationBootstrap();
      return (await stateOf(id)) === 'interrupted';
    });
    expect(await libraryOf()).toEqual(before);
    await librarian.agent.post(`/api/imports/${id}/apply`).expect(202);
    expect(await ended(librarian, { id })).toMatchObject({ state: 'applied', failure: null });
    const after = { ...before, revision: before.revision + 1, parts: before.parts + 2 * HALF };
    expect(await libraryOf()).toEqual(after);
  }, 120_000);

  it('is interrupted, with the library as before, when it loses its connection', async () => {
    const { id } = await checkedList(librarian, 'resistors', LIST);
    const before = await libraryOf();
    const letGo = await holdSecondHalf(before.id);
    await librarian.agent.post(`/api/imports/${id}/apply`).expect(202);
    await until(async () => (await writtenOf(before.id)) === 1 + HALF);
    const [{ owner }] = await app.dataSource.query(
      `SELECT IS_USED_LOCK(CONCAT(LEFT(DATABASE(), 40), ' import ', ?)) AS owner`,
      [id],
    );
    await app.dataSource.query(`KILL ${Number(owner)}`);
    expect(await ended(librarian, { id })).toMatchObject({ state: 'interrupted' });
    await letGo();
    expect(await libraryOf()).toEqual(before);
  }, 60_000);

  /** Another server on the same database; answers its address. */
  async function startServer(): Promise<string> {
    const { DB_NAME, DB_HOST, DB_PORT, DB_USER, DB_PASSWORD } = app.config;
    const database = { DB_NAME, DB_HOST, DB_PORT: String(DB_PORT), DB_USER, DB_PASSWORD };
    server = spawn(process.execPath, [MAIN], {
      env: { ...process.env, ...SHARED, ...database, NODE_ENV: 'test', HOST: '127.0.0.1', PORT: '0' },
      stdio: ['ignore', 'pipe', 'inherit'],
    });
    let said = '';
    for await (const piece of server.stdout!) {
      said += String(piece);
      const [url] = /http:\/\/\S+/.exec(said) ?? [];
      if (url !== undefined) return url;
    }
    throw new Error(`The server ended: ${said}`);
  }

  /** Keeps the place of the second half of the rows in the index, so that writing them waits. */
  async function holdSecondHalf(libraryId: number): Promise<() => Promise<void>> {
    const holder = app.dataSource.createQueryRunner();
    await holder.startTransaction();
    await holder.query(
      `SELECT id FROM parts WHERE library_id = ? AND normalised_key > 'vireo|m0' ORDER BY normalised_key FOR UPDATE`,
      [libraryId],
    );
    return async () => {
      await holder.rollbackTransaction();
      await holder.release();
    };
  }

  /** How many parts the library has, those among them that aren't committed. */
  async function writtenOf(libraryId: number): Promise<number> {
    const reader = app.dataSource.createQueryRunner();
    await reader.startTransaction('READ UNCOMMITTED');
    const [{ parts }] = await reader.query('SELECT COUNT(*) AS parts FROM parts WHERE library_id = ?', [
      libraryId,
    ]);
    await reader.commitTransaction();
    await reader.release();
    return Number(parts);
  }
});

async function until(condition: () => Promise<boolean>): Promise<void> {
  while (!(await condition())) await new Promise((resolve) => setTimeout(resolve, 50));
}
