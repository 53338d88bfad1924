import { readdir, rm, utimes } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Import } from '../src/imports/entities/import.entity.js';
import { ImportPortion } from '../src/imports/entities/import-portion.entity.js';
import { ImportFiles } from '../src/imports/import-files.service.js';
import { applyList, checkedList, ended, proposedMapping, sendList, uploadList } from './factories/imports.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const DIRECTORY = join(tmpdir(), `roothertz-imports-together-test-${process.pid}`);
const LIST = 'maker;mpn;en;remark\nVireo;V-1;1.234;first\nVireo;V-2;2.345;second\n';

describe('imports that several members work on', () => {
  let app: TestApp;
  let librarian: TestMember;
  let admin: TestMember;

  beforeAll(async () => {
    app = await startTestApp({ IMPORT_DIR: DIRECTORY });
  });
  beforeEach(async () => {
    const team = await createTeam(app);
    librarian = await signInMember(app, team, ['librarian']);
    admin = await signInMember(app, team, ['admin']);
  });
  afterAll(async () => {
    await app.close();
    await rm(DIRECTORY, { recursive: true });
  });

  const put = (member: TestMember, id: string, body: object) =>
    member.agent.put(`/api/imports/${id}/mapping`).send(body);
  const contentOf = async (id: string) => {
    const [portion] = await app.dataSource.getRepository(ImportPortion).findBy({ importId: Number(id) });
    return portion.rows[0].content;
  };
  const trail = (id: string) =>
    app.dataSource.getRepository(AuditEntry).findBy({ objectKind: 'import', objectId: id });

  it('keep what both of two members say at the same moment', async () => {
    const { id, ...upload } = await uploadList(librarian, 'op-amps', LIST);
    const holder = app.dataSource.createQueryRunner();
    await holder.startTransaction();
    await holder.query('SELECT id FROM imports WHERE id = ? FOR UPDATE', [id]);
    const said = [
      put(librarian, id, { columns: proposedMapping({ id, ...upload }) }),
      put(admin, id, { decimalMark: 'comma' }),
    ].map((request) => request.then(({ status }) => status));
    await untilTwoWait();
    await holder.commitTransaction();
    await holder.release();
    expect(await Promise.all(said)).toEqual([200, 200]);
    expect(await ended(librarian, { id })).toMatchObject({
      state: 'checked',
      version: 3,
      dialect: { decimalMark: 'comma' },
      mapping: proposedMapping({ id, ...upload }),
    });
    expect(await contentOf(id)).toContain(1.234e-6);
  });

  const untilTwoWait = async () => {
    for (;;) {
      const [{ waiting }] = await app.dataSource.query(
        `SELECT COUNT(*) AS waiting FROM information_schema.processlist
         WHERE db = DATABASE() AND info LIKE '% FOR UPDATE' AND id <> CONNECTION_ID()`,
      );
      if (Number(waiting) >= 2) return;
    }
  };

  it('refuse a mapping that was made before somebody said something else', async () => {
    const upload = await uploadList(librarian, 'op-amps', LIST);
    const columns = proposedMapping(upload);
    const [, , , remark] = columns;
    await put(admin, upload.id, { version: upload.version, columns: columns.slice(0, 3) }).expect(200);
    const { body } = await put(librarian, upload.id, { version: upload.version, columns }).expect(409);
    expect(body.code).toBe('import.stale');
    expect(remark).toMatchObject({ field: 'description' });
    const { body: standing } = await librarian.agent.get(`/api/imports/${upload.id}`).expect(200);
    expect(standing.mapping).toHaveLength(3);
    await put(librarian, upload.id, { version: standing.version, columns }).expect(200);
  });

  it('take another dialect while the rows are being checked', async () => {
    const rows = Array.from({ length: 30_000 }, (_, index) => `Vireo;V-${index};1.234;\n`).join('');
    const upload = await uploadList(librarian, 'op-amps', `maker;mpn;en;remark\n${rows}`);
    const columns = proposedMapping(upload);
    const { body: begun } = await put(librarian, upload.id, { columns }).expect(200);
    expect(begun.state).toBe('checking');
    const { body: changed } = await put(librarian, upload.id, { decimalMark: 'comma', columns }).expect(200);
    expect(changed.dialect.decimalMark).toBe('comma');
    expect(await ended(librarian, upload)).toMatchObject({ state: 'checked', counts: { new: 30_000 } });
    expect(await contentOf(upload.id)).toContain(1.234e-6);
    expect(await trail(upload.id)).toEqual([]);
  });

  it('stand in the trail when they are applied, cancelled and undone, with who did it', async () => {
    const applied = await applyList(librarian, 'op-amps', LIST);
    await admin.agent.post(`/api/imports/${applied.id}/undo`).expect(202);
    await ended(admin, applied);
    expect(await trail(applied.id)).toMatchObject([
      {
        action: 'import.applied',
        userId: librarian.caller.userId,
        objectLabel: 'list.csv',
        to: { kind: 'op-amps', counts: applied.counts },
      },
      { action: 'import.undone', userId: admin.caller.userId },
    ]);
    const other = await checkedList(librarian, 'op-amps', LIST);
    const [{ id }] = await app.dataSource.query('SELECT id FROM libraries WHERE team_id = ?', [
      librarian.caller.teamId,
    ]);
    const holder = app.dataSource.createQueryRunner();
    await holder.query(`SELECT GET_LOCK(CONCAT(LEFT(DATABASE(), 40), ' library ', ?), 5)`, [id]);
    await librarian.agent.post(`/api/imports/${other.id}/apply`).expect(202);
    await admin.agent.post(`/api/imports/${other.id}/cancel`).expect(202);
    expect(await ended(librarian, other)).toMatchObject({ state: 'cancelled' });
    await holder.query(`SELECT RELEASE_LOCK(CONCAT(LEFT(DATABASE(), 40), ' library ', ?))`, [id]);
    await holder.release();
    expect(await trail(other.id)).toMatchObject([
      { action: 'import.cancelled', userId: admin.caller.userId },
    ]);
  });

  it('are at most twenty that aren’t applied, of which one can be discarded', async () => {
    const { id } = await checkedList(librarian, 'op-amps', LIST);
    for (let count = 1; count < 20; count += 1) await uploadList(librarian, 'op-amps', LIST);
    const { body } = await sendList(librarian, 'op-amps', LIST).expect(409);
    expect(body.code).toBe('import.too-many');
    expect(await readdir(DIRECTORY)).toHaveLength(await keptFiles());
    await librarian.agent.delete(`/api/imports/${id}`).expect(204);
    await librarian.agent.get(`/api/imports/${id}`).expect(404);
    expect(await trail(id)).toMatchObject([{ action: 'import.discarded' }]);
    expect(await readdir(DIRECTORY)).toHaveLength(await keptFiles());
    const applied = await applyList(librarian, 'op-amps', LIST);
    await librarian.agent.delete(`/api/imports/${applied.id}`).expect(409);
  });

  const keptFiles = async () => {
    const [{ kept }] = await app.dataSource.query('SELECT COUNT(stored_name) AS kept FROM imports');
    return Number(kept);
  };

  it('are forgotten with their files after a fortnight', async () => {
    const { id } = await uploadList(librarian, 'op-amps', LIST);
    const long = new Date(Date.now() - 15 * 24 * 3600_000);
    const imports = app.dataSource.getRepository(Import);
    const { storedName } = await imports.findOneByOrFail({ id: Number(id) });
    await imports.update({ id: Number(id) }, { createdAt: long });
    await utimes(join(DIRECTORY, storedName!), long, long);
    await app.nest.get(ImportFiles).forgetAbandoned();
    expect(await readdir(DIRECTORY)).not.toContain(storedName);
    const { body } = await put(librarian, id, { decimalMark: 'comma' }).expect(409);
    expect(body.detail).toContain('isn’t kept any more');
  });
});
