import { opAmpBody } from './factories/op-amps.js';
import { resistorBody } from './factories/resistors.js';
import {
  createTeam,
  signInLibraryTeam,
  signInMember,
  startTestApp,
  type TestApp,
  type TestMember,
} from './support/index.js';
import { Part } from '../src/library/entities/part.entity.js';
import { LibraryService } from '../src/library/library.service.js';

const KINDS = [
  { path: '/api/op-amps', other: '/api/resistors', bodyOf: opAmpBody, curated: 180 },
  { path: '/api/resistors', other: '/api/op-amps', bodyOf: resistorBody, curated: 4000 },
];

describe.each(KINDS)('parts at $path', ({ path, other, bodyOf, curated }) => {
  let app: TestApp;
  let librarian: TestMember;
  let engineer: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    ({ librarian, engineer, stranger } = await signInLibraryTeam(app));
  });
  afterAll(() => app.close());

  const create = async ({ agent }: TestMember, changes: Record<string, unknown> = {}) => {
    const { body } = await agent.post(path).send(bodyOf(changes)).expect(201);
    return body as { id: string };
  };
  const patch = (id: string, body: object) => librarian.agent.patch(`${path}/${id}`).send(body);
  const partCount = () => app.dataSource.manager.count(Part);
  const revision = async () => {
    const readable = await app.nest.get(LibraryService).readableLibraries(librarian.caller);
    return readable.find(({ library }) => library === 'team')?.revision;
  };

  it('keep SQL and HTML as the text they are', async () => {
    const text = `'; DROP TABLE parts; -- <img src=x onerror="alert(1)"> % _ \\ 😀`;
    const { id } = await create(librarian, { description: text, manufacturer: text });
    const { body } = await engineer.agent.get(`${path}/${id}`).expect(200);
    expect(body).toMatchObject({ description: text, manufacturer: text });
  });

  it('are refused where they differ in spelling only, and nothing is stored', async () => {
    await create(librarian, { manufacturer: 'Acme Corp', partNumber: 'AC-77' });
    const [before, revisionBefore] = [await partCount(), await revision()];
    const again = bodyOf({ manufacturer: 'ACME  corp.', partNumber: 'ac 77' });
    const { body } = await librarian.agent.post(path).send(again).expect(409);
    expect(body).toMatchObject({ code: 'part.duplicate', errors: [{ field: 'partNumber' }] });
    expect([await partCount(), await revision()]).toEqual([before, revisionBefore]);
  });

  it('may be the same in two teams', async () => {
    const same = { manufacturer: 'Shared Maker', partNumber: 'SM-1' };
    await create(librarian, same);
    await create(stranger, same);
  });

  it('aren’t renamed to one that is there', async () => {
    await create(librarian, { partNumber: 'TAKEN-1' });
    const { id } = await create(librarian);
    const { body } = await patch(id, { version: 1, partNumber: 'taken 1' }).expect(409);
    expect(body.code).toBe('part.duplicate');
    expect((await engineer.agent.get(`${path}/${id}`)).body.version).toBe(1);
  });

  it('refuse a change that is based on an older version, and stay as they are', async () => {
    const { id } = await create(librarian);
    await patch(id, { version: 1, package: 'DIP-8' }).expect(200);
    const revisionBefore = await revision();
    const { body } = await patch(id, { version: 1, package: 'SOT-23' }).expect(409);
    expect(body.code).toBe('part.stale');
    const { body: kept } = await engineer.agent.get(`${path}/${id}`).expect(200);
    expect(kept).toMatchObject({ package: 'DIP-8', version: 2 });
    expect(await revision()).toBe(revisionBefore);
  });

  it('let one of several changes at once through', async () => {
    const { id } = await create(librarian);
    const answers = await Promise.all(
      ['A', 'B', 'C', 'D'].map((name) => patch(id, { version: 1, package: name })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
  });

  it('are removed at their version only', async () => {
    const { id } = await create(librarian);
    const stale = await librarian.agent.delete(`${path}/${id}?version=7`).expect(409);
    expect(stale.body.code).toBe('part.stale');
    await librarian.agent.delete(`${path}/${id}`).expect(400);
    await librarian.agent.delete(`${path}/${id}?version=1`).expect(204);
    await librarian.agent.get(`${path}/${id}`).expect(404);
    await librarian.agent.delete(`${path}/${id}?version=1`).expect(404);
  });

  it('bump the library’s revision once for each write and never for reading', async () => {
    const start = (await revision())!;
    const { id } = await create(librarian);
    await patch(id, { version: 1, package: 'DIP-8' }).expect(200);
    await engineer.agent.get(path).expect(200);
    expect(await revision()).toBe(start + 2);
    await librarian.agent.delete(`${path}/${id}?version=2`).expect(204);
    expect(await revision()).toBe(start + 3);
  });

  it('are out of another team’s reach', async () => {
    const { id } = await create(librarian, { partNumber: 'SECRET-1' });
    await stranger.agent.get(`${path}/${id}`).expect(404);
    await stranger.agent.patch(`${path}/${id}`).send({ version: 1, package: 'X' }).expect(404);
    await stranger.agent.delete(`${path}/${id}?version=1`).expect(404);
    const { body } = await stranger.agent.get(`${path}?search=SECRET-1`).expect(200);
    expect(body).toEqual({ items: [], total: 0 });
    await engineer.agent.get(`${path}/${id}`).expect(200);
  });

  it('are of their own kind alone', async () => {
    const { id } = await create(librarian);
    await librarian.agent.get(`${other}/${id}`).expect(404);
    await librarian.agent.patch(`${other}/${id}`).send({ version: 1, package: 'X' }).expect(404);
    await librarian.agent.delete(`${other}/${id}?version=1`).expect(404);
    await librarian.agent.get(`${path}/${id}`).expect(200);
  });

  it('stay as they are where they are curated', async () => {
    const { body: list } = await engineer.agent.get(`${path}?library=curated&limit=1`).expect(200);
    const { id, version } = list.items[0];
    const { body } = await patch(id, { version, package: 'X' }).expect(403);
    expect(body.code).toBe('part.curated');
    await librarian.agent.delete(`${path}/${id}?version=${version}`).expect(403);
  });

  it('are read by every member, and written by librarians and admins alone', async () => {
    const { id } = await create(librarian);
    for (const role of ['purchasing', 'engineer', 'reviewer'] as const) {
      const { agent } = await signInMember(app, { id: librarian.caller.teamId, plan: 'team' }, [role]);
      await agent.get(`${path}/${id}`).expect(200);
      await agent.post(path).send(bodyOf()).expect(403);
      await agent.patch(`${path}/${id}`).send({ version: 1 }).expect(403);
      await agent.delete(`${path}/${id}?version=1`).expect(403);
    }
    await app.request.get(path).expect(401);
  });

  it('are a team’s own with the team’s plan only', async () => {
    const admin = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
    const { body } = await admin.agent.post(path).send(bodyOf()).expect(402);
    expect(body.code).toBe('access.plan');
    const { body: list } = await admin.agent.get(`${path}?limit=1`).expect(200);
    expect(list.total).toBeGreaterThan(curated);
  });

  it.each(['0', '-1', '1e3', 'abc', '99999999999', '4294967295', '1%20or%201=1'])(
    'aren’t found at the id %s',
    async (id) => {
      const { body } = await engineer.agent.get(`${path}/${id}`).expect(404);
      expect(body.code).toBe('part.not-found');
    },
  );
});
