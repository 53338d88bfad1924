import type { RankingRequest } from '@roothertz/common/conditions';
import { conditionsBody, saveConditions } from './factories/conditions.js';
import { createOpAmp } from './factories/op-amps.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { ConditionsService } from '../src/conditions/conditions.service.js';
import { SavedConditionsPart } from '../src/conditions/entities/saved-conditions-part.entity.js';
import { SavedConditions } from '../src/conditions/entities/saved-conditions.entity.js';
import { readDemoData } from '../src/database/seeds/demo-data.js';

const WHOLE: Required<RankingRequest> = {
  conditions: {
    source: {
      resistance: 5e8,
      inductance: 0,
      capacitance: 5.1e-11,
      temperature: 280.15,
      directCurrent: 1e-9,
    },
    ambientTemperature: 283.15,
    band: { lower: 0.1, upper: 20_000, lowPassOrder: 2 },
    stage: {
      topology: 'transimpedance',
      feedbackResistance: 1e7,
      feedbackCapacitance: 'auto',
      network: { minimumTotal: 500 },
    },
    referenceFrequency: 95580.31070271993 / 1e3,
    bandwidthMargin: 0,
    amplifierTemperatureModel: 'none',
  },
  filter: {
    search: `low_noise 100% '; DROP TABLE saved_conditions; --`,
    library: ['team'],
    lifecycle: ['active', 'last-time-buy'],
    approval: ['approved'],
    inputType: ['jfet', 'cmos'],
    channels: 2,
    package: 'SOIC',
    supply: { minimum: 4.75, maximum: 5.25 },
  },
  target: { inputNoiseRms: 6.5e-12 },
  quantity: 500,
};

describe('saved conditions', () => {
  let app: TestApp;
  let team: Awaited<ReturnType<typeof createTeam>>;
  let engineer: TestMember;
  let reviewer: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    team = await createTeam(app);
    engineer = await signInMember(app, team, ['engineer']);
    reviewer = await signInMember(app, team, ['reviewer']);
    stranger = await signInMember(app, await createTeam(app), ['admin']);
  });
  afterEach(() => app.dataSource.manager.createQueryBuilder().delete().from(SavedConditions).execute());
  afterAll(() => app.close());

  const savedCount = () => app.dataSource.manager.count(SavedConditions);
  const fields = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);

  it('gives back exactly what was saved', async () => {
    const { body } = await engineer.agent
      .post('/api/conditions')
      .send({ name: 'Photodiode', ...WHOLE })
      .expect(201);
    expect(body).toEqual({
      name: 'Photodiode',
      ...WHOLE,
      partIds: [],
      id: expect.stringMatching(/^\d+$/),
      version: 1,
      updatedAt: expect.any(String),
      updatedBy: { id: String(engineer.caller.userId), name: expect.stringMatching(/^Person \d+$/) },
    });
    expect((await reviewer.agent.get(`/api/conditions/${body.id}`).expect(200)).body).toEqual(body);
    expect((await reviewer.agent.get('/api/conditions').expect(200)).body).toEqual({
      items: [body],
      total: 1,
    });
  });

  it('takes all conditions of the demo team as they are', async () => {
    const { conditions } = await readDemoData();
    for (const { name, ranking } of conditions) {
      const { body } = await engineer.agent
        .post('/api/conditions')
        .send({ name, ...ranking })
        .expect(201);
      expect(body).toMatchObject({ name, ...ranking });
    }
  });

  it('fills what is left out', async () => {
    const { body } = await engineer.agent.post('/api/conditions').send(conditionsBody()).expect(201);
    expect(body).toMatchObject({ filter: {}, target: {}, quantity: 1 });
    expect(body.conditions).toEqual({
      source: { resistance: 375, inductance: 0, capacitance: 0 },
      ambientTemperature: 298.15,
      band: { lower: 1, upper: 400, lowPassOrder: 0 },
      stage: { topology: 'non-inverting', gain: 100, gainResistance: 10 },
      referenceFrequency: 20,
      bandwidthMargin: 3,
      amplifierTemperatureModel: 'estimated',
    });
  });

  it('keeps a name of SQL and HTML as the text it is, without spaces at its ends', async () => {
    const name = `<b>Bobby</b>'; DROP TABLE teams; -- \\ 😀`;
    const { id } = await saveConditions(engineer, { name: `  ${name} ` });
    expect((await engineer.agent.get(`/api/conditions/${id}`).expect(200)).body.name).toBe(name);
  });

  it('refuses a name that the team has, whatever its case, and stores nothing', async () => {
    await saveConditions(engineer, { name: 'Straße Ø 5' });
    const again = conditionsBody({ name: 'STRASSE ø 5' });
    const { body } = await engineer.agent.post('/api/conditions').send(again).expect(409);
    expect(body).toMatchObject({ code: 'conditions.duplicate', errors: [{ field: 'name' }] });
    expect(await savedCount()).toBe(1);
    await saveConditions(engineer, { name: 'Strasse O 5' });
    await saveConditions(stranger, { name: 'Straße Ø 5' });
  });

  const stage = conditionsBody().conditions.stage;
  const withConditions = (changes: object) => ({
    conditions: { ...conditionsBody().conditions, ...changes },
  });

  it.each([
    ['name', { name: '' }],
    ['name', { name: undefined }],
    ['name', { name: 'tab\there' }],
    ['name', { name: 'x'.repeat(121) }],
    ['conditions', { conditions: undefined }],
    ['conditions', { conditions: [] }],
    ['conditions', { conditions: null }],
    ['conditions.source', withConditions({ source: undefined })],
    ['conditions.source.resistance', withConditions({ source: { resistance: -1 } })],
    ['conditions.source.resistance', withConditions({ source: { resistance: '375' } })],
    ['conditions.source.temperature', withConditions({ source: { resistance: 1, temperature: null } })],
    ['conditions.band.upper', withConditions({ band: { lower: 1, upper: 1e300 } })],
    ['conditions.band.lowPassOrder', withConditions({ band: { lower: 1, upper: 9, lowPassOrder: 1.5 } })],
    ['conditions.stage.topology', withConditions({ stage: { ...stage, topology: 'magic' } })],
    [
      'conditions.stage.feedbackCapacitance',
      withConditions({ stage: { ...stage, feedbackCapacitance: 'big' } }),
    ],
    ['conditions.stage.network.minimumTotal', withConditions({ stage: { ...stage, network: {} } })],
    ['conditions.ambientTemperature', withConditions({ ambientTemperature: 0 })],
    ['conditions.referenceFrequency', withConditions({ referenceFrequency: null })],
    ['conditions.colour', withConditions({ colour: 'red' })],
    ['filter.lifecycle', { filter: { lifecycle: ['dead'] } }],
    ['filter.channels', { filter: { channels: 0 } }],
    ['filter.supply.maximum', { filter: { supply: { minimum: 5 } } }],
    ['target.inputNoiseRms', { target: { inputNoiseRms: 0 } }],
    ['quantity', { quantity: 0.5 }],
    ['version', { version: 1 }],
  ])('refuses a wrong %s at that field: %j', async (field, changes) => {
    const { body } = await engineer.agent.post('/api/conditions').send(conditionsBody(changes)).expect(400);
    expect(body.code).toBe('request.invalid');
    expect(fields(body)).toContain(field);
    expect(await savedCount()).toBe(0);
  });

  it.each([
    ['conditions.band.upper', withConditions({ band: { lower: 500, upper: 1 } })],
    ['conditions.referenceFrequency', withConditions({ referenceFrequency: 401 })],
    ['conditions.stage.gain', withConditions({ stage: { ...stage, gain: 0.5 } })],
    ['conditions.stage.biasResistance', withConditions({ stage: { ...stage, biasResistance: 10 } })],
    ['filter.supply.maximum', { filter: { supply: { minimum: 12, maximum: 5 } } }],
  ])('refuses conditions that contradict themselves at %s', async (field, changes) => {
    const { body } = await engineer.agent.post('/api/conditions').send(conditionsBody(changes)).expect(422);
    expect(body.code).toBe('conditions.invalid');
    expect(fields(body)).toEqual([field]);
    expect(await savedCount()).toBe(0);
  });

  it('changes what is sent and leaves the rest', async () => {
    const { id } = await saveConditions(engineer, { target: { inputNoiseRms: 1e-7 } });
    const change = { version: 1, name: 'River geophone, winter', filter: { channels: 2 } };
    const { body } = await engineer.agent.patch(`/api/conditions/${id}`).send(change).expect(200);
    expect(body).toMatchObject({ name: change.name, version: 2, filter: { channels: 2 } });
    expect(body.target).toEqual({ inputNoiseRms: 1e-7 });
    expect(body.conditions.source.resistance).toBe(375);
    const back = {
      version: 2,
      filter: {},
      target: {},
      quantity: 7,
      ...withConditions({ bandwidthMargin: 1 }),
    };
    const answer = await engineer.agent.patch(`/api/conditions/${id}`).send(back).expect(200);
    expect(answer.body).toMatchObject({ filter: {}, target: {}, quantity: 7, version: 3 });
    expect(answer.body.conditions.bandwidthMargin).toBe(1);
  });

  it('refuses a change that is stale, contradicts what is stored or takes another’s name', async () => {
    await saveConditions(engineer, { name: 'Taken' });
    const { id } = await saveConditions(engineer, { filter: { supply: { minimum: 5, maximum: 9 } } });
    const patch = (body: object) =>
      engineer.agent.patch(`/api/conditions/${id}`).send({ version: 1, ...body });
    expect((await patch({ version: 2 }).expect(409)).body.code).toBe('conditions.stale');
    expect((await patch({ name: 'TAKEN' }).expect(409)).body.code).toBe('conditions.duplicate');
    const outside = withConditions({ referenceFrequency: 1000 });
    expect(fields((await patch(outside).expect(422)).body)).toEqual(['conditions.referenceFrequency']);
    expect(fields((await engineer.agent.patch(`/api/conditions/${id}`).send({}).expect(400)).body)).toEqual([
      'version',
    ]);
    expect((await reviewer.agent.get(`/api/conditions/${id}`)).body.version).toBe(1);
  });

  it('lets one of several changes at once through', async () => {
    const { id } = await saveConditions(engineer);
    const answers = await Promise.all(
      [1, 2, 3, 4].map((quantity) =>
        engineer.agent.patch(`/api/conditions/${id}`).send({ version: 1, quantity }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
  });

  it('removes conditions at their version only', async () => {
    const { id } = await saveConditions(engineer);
    await engineer.agent.delete(`/api/conditions/${id}?version=2`).expect(409);
    await engineer.agent.delete(`/api/conditions/${id}`).expect(400);
    await engineer.agent.delete(`/api/conditions/${id}?version=1`).expect(204);
    expect((await engineer.agent.get(`/api/conditions/${id}`).expect(404)).body.code).toBe(
      'conditions.not-found',
    );
  });

  it('keeps another team’s conditions out of reach', async () => {
    const { id } = await saveConditions(engineer);
    await stranger.agent.get(`/api/conditions/${id}`).expect(404);
    await stranger.agent.patch(`/api/conditions/${id}`).send({ version: 1, quantity: 2 }).expect(404);
    await stranger.agent.delete(`/api/conditions/${id}?version=1`).expect(404);
    expect((await stranger.agent.get('/api/conditions').expect(200)).body).toEqual({ items: [], total: 0 });
    expect(await savedCount()).toBe(1);
  });

  it('lets every member read, and admins, librarians and engineers alone save', async () => {
    const { id } = await saveConditions(engineer);
    for (const role of ['purchasing', 'reviewer'] as const) {
      const { agent } = await signInMember(app, team, [role]);
      await agent.get(`/api/conditions/${id}`).expect(200);
      await agent
        .post('/api/conditions')
        .send(conditionsBody({ name: role }))
        .expect(403);
      await agent.patch(`/api/conditions/${id}`).send({ version: 1 }).expect(403);
      await agent.delete(`/api/conditions/${id}?version=1`).expect(403);
    }
    for (const role of ['admin', 'librarian'] as const)
      await saveConditions(await signInMember(app, team, [role]), { name: role });
    await app.request.get('/api/conditions').expect(401);
  });

  describe('keep the parts chosen at them', () => {
    const chosen = () =>
      app.dataSource.manager
        .find(SavedConditionsPart, { order: { partId: 'ASC' } })
        .then((rows) => rows.map(({ partId }) => String(partId)));

    it('which a change replaces and the rest leaves', async () => {
      const librarian = await signInMember(app, team, ['librarian']);
      const [one, other] = [await createOpAmp(librarian), await createOpAmp(librarian)];
      const { body } = await engineer.agent
        .post('/api/conditions')
        .send(conditionsBody({ partIds: [one.id] }))
        .expect(201);
      expect(body.partIds).toEqual([one.id]);
      const patch = (change: object) => engineer.agent.patch(`/api/conditions/${body.id}`).send(change);
      expect((await patch({ version: 1, quantity: 5 }).expect(200)).body.partIds).toEqual([one.id]);
      const both = { version: 2, partIds: [one.id, other.id] };
      expect((await patch(both).expect(200)).body.partIds).toEqual([one.id, other.id]);
      expect(await chosen()).toEqual([one.id, other.id]);
      expect((await reviewer.agent.get('/api/conditions').expect(200)).body).toMatchObject({
        items: [{ partIds: [one.id, other.id] }],
        total: 1,
      });
      expect((await patch({ version: 3, partIds: [] }).expect(200)).body.partIds).toEqual([]);
      expect(await chosen()).toEqual([]);
    });

    it('of the libraries that the team reads, and of no other team', async () => {
      const foreign = await createOpAmp(stranger);
      const partIds = [foreign.id];
      const { body } = await engineer.agent
        .post('/api/conditions')
        .send(conditionsBody({ partIds }))
        .expect(404);
      expect(body).toMatchObject({ code: 'part.not-found', errors: [{ field: 'partIds[0]' }] });
      expect(await savedCount()).toBe(0);
      for (const wrong of [['x'], 'x', [1], Array.from({ length: 21 }, () => foreign.id)])
        expect(
          fields(
            (
              await engineer.agent
                .post('/api/conditions')
                .send(conditionsBody({ partIds: wrong }))
                .expect(400)
            ).body,
          ),
        ).toContain('partIds');
    });

    it('for other features: by part, with the conditions in the order of their names', async () => {
      const librarian = await signInMember(app, team, ['librarian']);
      const { id } = await createOpAmp(librarian);
      for (const name of ['Weir', 'Geophone'])
        await saveConditions(engineer, { name, partIds: [id], quantity: 9 });
      await saveConditions(engineer, { name: 'Without' });
      const uses = await app.nest.get(ConditionsService).partsInUse(engineer.caller);
      const { userId } = engineer.caller;
      const savedBy = { createdById: userId, updatedById: userId };
      const use = { conditionsId: expect.any(Number), quantity: 9, ...savedBy };
      expect([...uses]).toEqual([
        [
          Number(id),
          [
            { ...use, name: 'Geophone' },
            { ...use, name: 'Weir' },
          ],
        ],
      ]);
      expect((await app.nest.get(ConditionsService).partsInUse(stranger.caller)).size).toBe(0);
    });
  });

  it('holds as many as the plan does, even when they are saved at once', async () => {
    const admin = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
    const answers = await Promise.all(
      ['A', 'B', 'C', 'D', 'E'].map((name) =>
        admin.agent.post('/api/conditions').send(conditionsBody({ name })),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 201, 201, 402, 402]);
    const refused = await admin.agent
      .post('/api/conditions')
      .send(conditionsBody({ name: 'F' }))
      .expect(402);
    expect(refused.body.code).toBe('plan.saved-conditions');
    const { body } = await admin.agent.get('/api/conditions').expect(200);
    expect(body.total).toBe(3);
    await admin.agent.delete(`/api/conditions/${body.items[0].id}?version=1`).expect(204);
    await saveConditions(admin, { name: 'F' });
  });

  it('lists by name or time of change, in pages, and finds by a part of the name', async () => {
    for (const name of ['beta 10%', 'Alpha', 'gamma']) await saveConditions(engineer, { name });
    const names = async (query: string) => {
      const { body } = await reviewer.agent.get(`/api/conditions?${query}`).expect(200);
      return body.items.map(({ name }: { name: string }) => name);
    };
    expect(await names('')).toEqual(['Alpha', 'beta 10%', 'gamma']);
    expect(await names('sort=-name&limit=1&offset=1')).toEqual(['beta 10%']);
    expect(await names('sort=updatedAt')).toEqual(['beta 10%', 'Alpha', 'gamma']);
    expect(await names('search=A%20')).toEqual(['beta 10%']);
    expect(await names('search=%25')).toEqual(['beta 10%']);
    await reviewer.agent.get('/api/conditions?sort=version').expect(400);
  });

  it('still shows conditions whose author has left', async () => {
    const leaver = await signInMember(app, { id: engineer.caller.teamId, plan: 'team' }, ['engineer']);
    const { id } = await saveConditions(leaver);
    await app.dataSource.query('DELETE FROM users WHERE id = ?', [leaver.caller.userId]);
    expect((await reviewer.agent.get(`/api/conditions/${id}`).expect(200)).body.updatedBy).toBeNull();
  });
});
