import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Part } from '../src/library/entities/part.entity.js';
import { LibraryService } from '../src/library/library.service.js';
import { conditionsBody } from './factories/conditions.js';
import { createOpAmp, opAmpBody } from './factories/op-amps.js';
import { createResistor } from './factories/resistors.js';
import { signInLibraryTeam, startTestApp, type TestApp, type TestMember } from './support/index.js';

describe('changing many parts', () => {
  let app: TestApp;
  let librarian: TestMember;
  let engineer: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    ({ librarian, engineer, stranger } = await signInLibraryTeam(app));
  });
  afterAll(() => app.close());

  const change = (parts: object[], member = librarian) =>
    member.agent.patch('/api/op-amps').send({ parts: parts.map((part) => ({ version: 1, ...part })) });
  const stored = async (ids: string[]) => {
    const parts = await app.dataSource.manager.find(Part, { order: { id: 'ASC' } });
    return parts
      .filter(({ id }) => ids.includes(String(id)))
      .map(({ lifecycle, approval, version }) => [lifecycle, approval, version]);
  };
  const createThree = async () => {
    const made = [await createOpAmp(librarian), await createOpAmp(librarian), await createOpAmp(librarian)];
    return made.map(({ id }) => id);
  };
  const revision = async () => {
    const readable = await app.nest.get(LibraryService).readableLibraries(librarian.caller);
    return readable.find(({ library }) => library === 'team')!.revision;
  };
  const trail = async (id: string) => {
    const entries = await app.dataSource.manager.find(AuditEntry, {
      where: { objectKind: 'op-amp', objectId: id },
      order: { id: 'ASC' },
    });
    return entries.map(({ action, from, to, userId }) => ({ action, from, to, userId }));
  };

  it('sets all of them in one act, each to its own values, and bumps the revision once', async () => {
    const ids = await createThree();
    const before = await revision();
    const { body } = await change([
      { id: ids[0], lifecycle: 'last-time-buy' },
      { id: ids[1], lifecycle: 'obsolete', approval: 'restricted' },
      { id: ids[2], approval: 'approved' },
    ]).expect(200);
    expect(body.total).toBe(3);
    expect(body.items.map(({ id, version }: { id: string; version: number }) => [id, version])).toEqual([
      [ids[0], 2],
      [ids[1], 2],
      [ids[2], 1],
    ]);
    expect(await stored(ids)).toEqual([
      ['last-time-buy', 'approved', 2],
      ['obsolete', 'restricted', 2],
      ['active', 'approved', 1],
    ]);
    expect(await revision()).toBe(before + 1);
  });

  it('sets none where one of them was changed meanwhile, and names it', async () => {
    const ids = await createThree();
    await librarian.agent.patch(`/api/op-amps/${ids[1]}`).send({ version: 1, package: 'DIP-8' }).expect(200);
    const before = await revision();
    const { body } = await change(ids.map((id) => ({ id, approval: 'restricted' }))).expect(409);
    expect(body).toMatchObject({ code: 'part.stale', errors: [{ field: 'parts[1]' }] });
    expect(body.errors[0].message).toMatch(/^KA-\d+: somebody has changed/);
    expect((await stored(ids)).map(([, approval]) => approval)).toEqual(['approved', 'approved', 'approved']);
    expect(await revision()).toBe(before);
    expect(await trail(ids[0])).toHaveLength(1);
  });

  it('refuses curated parts at their row, and sets none', async () => {
    const [id] = await createThree();
    const { body: curated } = await librarian.agent.get('/api/op-amps?library=curated&limit=1').expect(200);
    const { body } = await change([
      { id, approval: 'restricted' },
      { id: curated.items[0].id, approval: 'restricted' },
    ]).expect(403);
    expect(body).toMatchObject({ code: 'part.curated', errors: [{ field: 'parts[1]' }] });
    expect(body.errors[0].message).toContain(curated.items[0].partNumber);
    expect(await stored([id])).toEqual([['active', 'approved', 1]]);
  });

  it('knows nothing of another team’s parts or of another kind’s', async () => {
    const [id] = await createThree();
    const own = await createOpAmp(stranger);
    const { body } = await change(
      [
        { id, approval: 'restricted' },
        { id: own.id, approval: 'restricted' },
      ],
      stranger,
    ).expect(404);
    expect(body).toMatchObject({ code: 'part.not-found', errors: [{ field: 'parts[0]' }] });
    const resistor = await createResistor(librarian);
    await change([{ id: resistor.id, approval: 'restricted' }]).expect(404);
    expect(await stored([id, own.id, resistor.id])).toEqual(
      Array.from({ length: 3 }, () => ['active', 'approved', 1]),
    );
  });

  it('is the librarians’, and takes a list that says something', async () => {
    const [id] = await createThree();
    await change([{ id, approval: 'restricted' }], engineer).expect(403);
    const refused: [string, object[]][] = [
      ['parts', []],
      ['parts[0].version', [{ id }]],
      ['parts[0].approval', [{ id, approval: 'perhaps' }]],
      ['parts[0].id', [{ id: '0', approval: 'approved' }]],
      [
        'parts[1].id',
        [
          { id, approval: 'approved' },
          { id, approval: 'restricted' },
        ],
      ],
      [
        'parts',
        Array.from({ length: 1001 }, (_, index) => ({ id: String(index + 1), approval: 'approved' })),
      ],
    ];
    for (const [field, parts] of refused) {
      const { body } = await change(parts).expect(400);
      expect(body.errors.map((error: { field: string }) => error.field)).toContain(field);
    }
    expect(await stored([id])).toEqual([['active', 'approved', 1]]);
  });

  it('changes resistors alike', async () => {
    const { id } = await createResistor(librarian);
    const parts = [{ id, version: 1, lifecycle: 'not-recommended' }];
    const { body } = await librarian.agent.patch('/api/resistors').send({ parts }).expect(200);
    expect(body.items[0]).toMatchObject({ id, lifecycle: 'not-recommended', version: 2 });
  });

  it('stands in the trail part by part: made, changed, retired, brought back, deleted', async () => {
    const { userId } = librarian.caller;
    const { id, partNumber } = await createOpAmp(librarian, opAmpBody());
    const url = `/api/op-amps/${id}`;
    const figures = { version: 1, amplifier: { currentNoise: 2e-12 }, origins: { currentNoise: 'measured' } };
    await librarian.agent.patch(url).send(figures).expect(200);
    await change([{ id, version: 2, lifecycle: 'obsolete', approval: 'not-approved' }]).expect(200);
    await change([{ id, version: 3, lifecycle: 'active' }]).expect(200);
    await librarian.agent.delete(`${url}?version=4`).expect(204);
    const entries = await trail(id);
    expect(entries.map(({ action }) => action)).toEqual([
      'part.created',
      'part.changed',
      'part.retired',
      'part.restored',
      'part.deleted',
    ]);
    expect(entries.every((entry) => entry.userId === userId)).toBe(true);
    const [created, changed, retired, restored, deleted] = entries;
    expect(created).toMatchObject({ from: null, to: { partNumber, amplifier: { voltageNoise: 1.1e-9 } } });
    expect(changed).toMatchObject({
      from: { amplifier: { currentNoise: null }, origins: {} },
      to: { amplifier: { currentNoise: 2e-12 }, origins: { currentNoise: 'measured' } },
    });
    expect(retired).toMatchObject({
      from: { lifecycle: 'active', approval: 'approved' },
      to: { lifecycle: 'obsolete', approval: 'not-approved' },
    });
    expect(restored).toMatchObject({ from: { lifecycle: 'obsolete' }, to: { lifecycle: 'active' } });
    expect(deleted).toMatchObject({ from: { partNumber, amplifier: { currentNoise: 2e-12 } }, to: null });
  });

  it('leaves retired parts out of a ranking until the filter asks for them', async () => {
    const { id } = await createOpAmp(stranger, { lifecycle: 'obsolete', approval: 'not-approved' });
    const { conditions } = conditionsBody();
    const rank = async (filter: object) => {
      const request = { conditions, filter: { library: ['team'], ...filter } };
      const { body } = await stranger.agent.post('/api/rankings/op-amps').send(request).expect(200);
      return {
        ranked: body.items.map(({ part }: { part: { id: string } }) => part.id) as string[],
        reasons: body.excluded.reasons.map(({ reason }: { reason: string }) => reason) as string[],
      };
    };
    expect((await rank({})).reasons).toEqual(['retired']);
    expect((await rank({})).ranked).not.toContain(id);
    expect((await rank({ approval: ['not-approved'] })).ranked).toEqual([id]);
  });
});
