import { Part } from '../src/library/entities/part.entity.js';
import { saveConditions } from './factories/conditions.js';
import { createOpAmp } from './factories/op-amps.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

describe('a part in use', () => {
  let app: TestApp;
  let librarian: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
    stranger = await signInMember(app, await createTeam(app), ['librarian']);
  });
  afterAll(() => app.close());

  const usesOf = async (id: string, { agent } = librarian) =>
    (await agent.get(`/api/parts/${id}/uses`).expect(200)).body;

  it('can’t be deleted, and says which saved conditions use it, until none does', async () => {
    const { id } = await createOpAmp(librarian);
    const saved = await saveConditions(librarian, { name: 'Borehole geophone', partIds: [id] });
    const { body } = await librarian.agent.delete(`/api/op-amps/${id}?version=1`).expect(409);
    expect(body).toMatchObject({
      code: 'part.in-use',
      detail: expect.stringContaining('“Borehole geophone”'),
      errors: [{ field: 'conditions', message: 'Borehole geophone' }],
    });
    expect(await app.dataSource.manager.countBy(Part, { id: Number(id) })).toBe(1);
    expect(await usesOf(id)).toEqual({ conditions: [{ id: saved.id, name: 'Borehole geophone' }] });
    await librarian.agent.delete(`/api/conditions/${saved.id}?version=1`).expect(204);
    expect(await usesOf(id)).toEqual({ conditions: [] });
    await librarian.agent.delete(`/api/op-amps/${id}?version=1`).expect(204);
    expect(await app.dataSource.manager.countBy(Part, { id: Number(id) })).toBe(0);
  });

  it('can be retired', async () => {
    const { id } = await createOpAmp(librarian);
    await saveConditions(librarian, { name: 'Hydrophone', partIds: [id] });
    const parts = [{ id, version: 1, lifecycle: 'obsolete', approval: 'not-approved' }];
    await librarian.agent.patch('/api/op-amps').send({ parts }).expect(200);
    expect((await usesOf(id)).conditions).toHaveLength(1);
  });

  it('says nothing of another team’s conditions or parts', async () => {
    const { id } = await createOpAmp(librarian);
    await stranger.agent.get(`/api/parts/${id}/uses`).expect(404);
    await stranger.agent.get('/api/parts/x/uses').expect(404);
  });
});
