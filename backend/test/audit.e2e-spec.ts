import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { createSupplier } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { createDatabaseAccount, type DatabaseAccount } from './support/database.js';
import {
  createTeam,
  signInMember,
  startTestApp,
  type TestApp,
  type TestMember,
  type TestTeam,
} from './support/index.js';

describe('the audit trail', () => {
  let account: DatabaseAccount;
  let app: TestApp;
  let team: TestTeam;
  let admin: TestMember;

  beforeAll(async () => {
    account = await createDatabaseAccount();
    app = await startTestApp(account.environment);
  });
  beforeEach(async () => {
    team = await createTeam(app);
    admin = await signInMember(app, team, ['admin']);
  });
  afterAll(async () => {
    await app.close();
    await account.drop();
  });

  const trail = async (query = '', member = admin) =>
    (await member.agent.get(`/api/audit?${query}`).expect(200)).body as {
      items: { action: string; object: { label: string } }[];
      total: number;
    };

  it('tells who did what to which part, and from what to what', async () => {
    const librarian = await signInMember(app, team, ['librarian']);
    const { id } = await createOpAmp(librarian, { manufacturer: 'Vireo', partNumber: 'VR-1' });
    const change = { version: 1, amplifier: { voltageNoise: 2e-9 } };
    await librarian.agent.patch(`/api/op-amps/${id}`).send(change).expect(200);
    await librarian.agent.delete(`/api/op-amps/${id}?version=2`).expect(204);
    const { items, total } = await trail();
    expect(total).toBe(3);
    expect(items).toMatchObject([
      { action: 'part.deleted', to: null },
      {
        action: 'part.changed',
        by: { id: String(librarian.caller.userId) },
        object: { kind: 'op-amp', id, label: 'Vireo VR-1' },
        to: { amplifier: { voltageNoise: 2e-9 } },
      },
      { action: 'part.created', from: null },
    ]);
    const row = await app.dataSource.manager.findOneByOrFail(AuditEntry, { action: 'part.changed' });
    expect(row).toMatchObject({ teamId: team.id, objectId: id, objectLabel: 'Vireo VR-1' });
  });

  it('is filtered by action, object, member and days, and is the team’s own', async () => {
    const buyer = await signInMember(app, team, ['purchasing']);
    const { id } = await createSupplier(buyer, 'Brook & Weir');
    await createOpAmp(admin);
    const labels = async (query: string) => (await trail(query)).items.map(({ action }) => action);
    const today = new Date().toISOString().slice(0, 10);
    expect(await labels('action=supplier.added,part.deleted')).toEqual(['supplier.added']);
    expect(await labels(`objectKind=supplier&objectId=${id}`)).toEqual(['supplier.added']);
    expect(await labels(`userId=${admin.caller.userId}`)).toEqual(['part.created']);
    expect(await labels(`from=${today}&to=${today}`)).toHaveLength(2);
    expect(await labels('to=2026-01-01')).toEqual([]);
    for (const query of ['action=part.burnt', 'objectKind=moon', 'userId=x', 'from=yesterday'])
      await admin.agent.get(`/api/audit?${query}`).expect(400);
    expect(await trail('', await signInMember(app, await createTeam(app), ['admin']))).toEqual({
      items: [],
      total: 0,
    });
    await buyer.agent.get('/api/audit').expect(403);
    await buyer.agent.get('/api/audit/export.csv').expect(403);
  });

  it('is exported as a list in words in which no cell is a formula', async () => {
    await createSupplier(admin, '=HYPERLINK("http://evil.example")');
    await createSupplier(admin, 'Brook, Weir');
    const { text, headers } = await admin.agent
      .get('/api/audit/export.csv?action=supplier.added')
      .expect(200);
    expect(headers['content-type']).toMatch(/^text\/csv/);
    const [head, ...lines] = text.replace('\uFEFF', '').trimEnd().split('\r\n');
    expect(head).toBe('time (UTC),who,did,kind,object,number,what changed');
    expect(lines).toHaveLength(2);
    expect(lines[0]).toMatch(
      /^\d{4}-\d\d-\d\d [\d:.]+,Person \d+,added the supplier,supplier,"Brook, Weir",\d+,"name: – → Brook, Weir"$/,
    );
    expect(lines[1]).toContain(`"'=HYPERLINK(""http://evil.example"")"`);
  });

  it('only grows: the application’s account can neither change nor remove what stands in it', async () => {
    await createSupplier(admin);
    const before = await app.dataSource.manager.find(AuditEntry);
    expect(before.length).toBeGreaterThan(0);
    for (const sql of [
      'UPDATE audit_entries SET user_id = NULL',
      'DELETE FROM audit_entries',
      'TRUNCATE TABLE audit_entries',
      'DROP TABLE audit_entries',
      'ALTER TABLE audit_entries DROP COLUMN user_id',
      `DELETE FROM teams WHERE id = ${team.id}`,
    ])
      await expect(app.dataSource.query(sql)).rejects.toMatchObject({ errno: 1142 });
    await expect(app.dataSource.query('SELECT * FROM migrations')).rejects.toMatchObject({ errno: 1142 });
    expect(await app.dataSource.manager.find(AuditEntry)).toEqual(before);
  });
});
