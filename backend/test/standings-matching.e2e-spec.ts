import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { seedCuratedLibrary } from '../src/database/seeds/library-seed.js';
import { StandingChange } from '../src/library/entities/standing-change.entity.js';
import { applyList } from './factories/imports.js';
import { createResistor } from './factories/resistors.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const MANY = 1200;
const LIST = `maker,mpn,value\n${Array.from({ length: MANY }, (_, row) => `Weir,W-${row},${row + 1}`).join('\n')}\n`;
const RETIRED = 'toLifecycle=obsolete&toApproval=not-approved';

describe('changing all parts of a filter', () => {
  let app: TestApp;
  let librarian: TestMember;
  let engineer: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    await seedCuratedLibrary(app.dataSource.manager);
    const team = await createTeam(app);
    librarian = await signInMember(app, team, ['librarian']);
    engineer = await signInMember(app, team, ['engineer']);
    await applyList(librarian, 'resistors', LIST);
  });
  afterAll(() => app.close());

  const outcome = async (query: string) =>
    (await librarian.agent.get(`/api/resistors/standings?${query}`).expect(200)).body;
  const change = (filter: string, body: object, member = librarian) =>
    member.agent.post(`/api/resistors/standings?${filter}`).send(body);
  const counted = async (filter: string) =>
    (await librarian.agent.get(`/api/resistors?library=team&limit=1&${filter}`).expect(200)).body.total;

  it('says its outcome, does all of it beyond the longest page, and brings it back', async () => {
    const said = await outcome(`library=team&${RETIRED}`);
    expect(said).toMatchObject({ chosen: MANY, changed: MANY, unchanged: 0, curated: 0 });
    const { libraryRevision } = said;
    const retire = { libraryRevision, lifecycle: 'obsolete', approval: 'not-approved' };
    const { body } = await change('library=team', retire).expect(200);
    expect(body).toEqual({ id: expect.any(String), changed: MANY });
    expect(await counted('lifecycle=obsolete&approval=not-approved')).toBe(MANY);
    expect(await outcome(`library=team&${RETIRED}`)).toMatchObject({ changed: 0, unchanged: MANY });
    const [edited] = (await librarian.agent.get('/api/resistors?library=team&limit=1')).body.items;
    await librarian.agent
      .patch(`/api/resistors/${edited.id}`)
      .send({ version: edited.version, description: 'kept for repairs' })
      .expect(200);
    const back = await librarian.agent.post(`/api/resistors/standings/${body.id}/undo`).expect(200);
    expect(back.body).toEqual({ takenBack: MANY - 1, kept: 1 });
    expect(await counted('lifecycle=active&approval=approved')).toBe(MANY - 1);
    await librarian.agent.post(`/api/resistors/standings/${body.id}/undo`).expect(404);
    const trail = await app.dataSource.manager.find(AuditEntry, {
      where: { objectKind: 'standings' },
      order: { id: 'ASC' },
    });
    expect(trail).toMatchObject([
      { action: 'standings.changed', objectLabel: `${MANY} resistors`, to: { lifecycle: 'obsolete' } },
      { action: 'standings.undone', to: { takenBack: MANY - 1, kept: 1 } },
    ]);
  });

  it('touches neither curated parts nor those that the filter leaves out', async () => {
    const { id } = await createResistor(librarian, { manufacturer: 'Sluice', partNumber: 'SL-1' });
    const all = await outcome('toApproval=restricted');
    expect(all.curated).toBeGreaterThan(0);
    expect(all.chosen).toBe(all.changed + all.unchanged + all.curated);
    const said = await outcome('search=sluice&toApproval=restricted');
    expect(said).toMatchObject({ chosen: 1, changed: 1 });
    const { libraryRevision } = said;
    await change('search=sluice', { libraryRevision, approval: 'restricted' }).expect(200);
    expect(await counted('approval=restricted')).toBe(1);
    const { body } = await librarian.agent.get(`/api/resistors/${id}`).expect(200);
    expect(body).toMatchObject({ approval: 'restricted', lifecycle: 'active', version: 2 });
  });

  it('changes nothing where the library was changed since the outcome was said', async () => {
    const { libraryRevision } = await outcome('toLifecycle=obsolete');
    await createResistor(librarian);
    const { body } = await change('', { libraryRevision, lifecycle: 'obsolete' }).expect(409);
    expect(body.code).toBe('part.library-changed');
    expect(await counted('lifecycle=obsolete')).toBe(1);
  });

  it('is the librarians’, says something, and can be taken back for a day', async () => {
    const { libraryRevision } = await outcome('toApproval=approved');
    await change('', { libraryRevision, approval: 'approved' }, engineer).expect(403);
    await change('', { libraryRevision }).expect(400);
    await change('lifecycle=perhaps', { libraryRevision, approval: 'approved' }).expect(400);
    const first = await change('search=W-1', { libraryRevision, approval: 'restricted' }).expect(200);
    await app.dataSource.query('UPDATE standing_changes SET made_at = made_at - INTERVAL 25 HOUR');
    const { libraryRevision: next } = await outcome('toApproval=approved');
    await change('search=W-1', { libraryRevision: next, approval: 'approved' }).expect(200);
    await librarian.agent.post(`/api/resistors/standings/${first.body.id}/undo`).expect(404);
    expect(await app.dataSource.manager.count(StandingChange)).toBe(1);
  });
});
