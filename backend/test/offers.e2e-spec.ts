import { addDays, dayOf } from '@roothertz/common/prices';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Offer } from '../src/prices/entities/offer.entity.js';
import { createOffer, createSupplier, offerBody } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const TODAY = dayOf(new Date());

describe('offers', () => {
  let app: TestApp;
  let purchasing: TestMember;
  let engineer: TestMember;
  let librarian: TestMember;
  let stranger: TestMember;
  let supplierId: string;
  let partId: string;

  beforeAll(async () => {
    app = await startTestApp();
    const team = await createTeam(app);
    purchasing = await signInMember(app, team, ['purchasing']);
    engineer = await signInMember(app, team, ['engineer']);
    librarian = await signInMember(app, team, ['librarian']);
    stranger = await signInMember(app, await createTeam(app), ['admin']);
    supplierId = (await createSupplier(purchasing)).id;
  });
  beforeEach(async () => {
    partId = (await createOpAmp(librarian)).id;
  });
  afterAll(() => app.close());

  const make = (changes: object = {}) => createOffer(purchasing, { partId, supplierId }, { ...changes });
  const send = (changes: object = {}) =>
    purchasing.agent.post('/api/offers').send(offerBody({ partId, supplierId }, { ...changes }));
  const ofPart = async (member = engineer) =>
    (await member.agent.get(`/api/parts/${partId}/offers`).expect(200)).body;
  const fields = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);

  it('keeps an offer whole, shows it to every member and fills what is left out', async () => {
    const whole = {
      supplierNumber: 'TK-55/A',
      currency: 'USD',
      minimumOrderQuantity: 10,
      orderMultiple: 5,
      leadTimeDays: 42,
      stock: 1200,
      validFrom: addDays(TODAY, -10),
      validUntil: addDays(TODAY, 200),
    };
    const created = await make(whole);
    expect(created).toEqual({
      id: expect.stringMatching(/^\d+$/),
      part: expect.objectContaining({ id: partId, library: 'team', kind: 'op-amp' }),
      supplier: { id: supplierId, name: expect.any(String) },
      ...whole,
      breaks: [
        { minimumQuantity: 1, unitPrice: '4.2000' },
        { minimumQuantity: 100, unitPrice: '3.1000' },
      ],
      confirmedAt: expect.any(String),
      confirmedBy: { id: String(purchasing.caller.userId), name: expect.any(String) },
      openedAt: expect.any(String),
      openedBy: { id: String(purchasing.caller.userId), name: expect.any(String) },
      closedAt: null,
      closedBy: null,
      states: [],
      version: 1,
    });
    expect(await ofPart()).toEqual({ current: [created], history: [] });
    const short = await make();
    expect(short).toMatchObject({
      supplierNumber: '',
      minimumOrderQuantity: 1,
      orderMultiple: 1,
      leadTimeDays: null,
      stock: null,
      validFrom: TODAY,
      validUntil: null,
    });
  });

  it('closes the old row when a price changes, and overwrites nothing', async () => {
    const before = await make();
    const changed = [{ minimumQuantity: 1, unitPrice: '4.35' }];
    const { body: after } = await purchasing.agent
      .patch(`/api/offers/${before.id}`)
      .send({ version: 1, breaks: changed })
      .expect(200);
    expect(after).toMatchObject({ version: 2, breaks: [{ unitPrice: '4.3500' }], closedAt: null });
    expect(after.id).not.toBe(before.id);
    const { current, history } = await ofPart();
    expect(current).toEqual([after]);
    const closedBy = { id: String(purchasing.caller.userId), name: expect.any(String) };
    expect(history).toEqual([{ ...before, closedAt: expect.any(String), closedBy }]);
  });

  it('opens nothing where nothing changes', async () => {
    const before = await make();
    const same = {
      version: 1,
      currency: 'EUR',
      stock: null,
      breaks: offerBody({ partId, supplierId }).breaks,
    };
    const { body } = await purchasing.agent.patch(`/api/offers/${before.id}`).send(same).expect(200);
    expect(body).toEqual(before);
    expect((await ofPart()).history).toEqual([]);
  });

  it('refuses a change of what somebody has changed or closed meanwhile', async () => {
    const { id } = await make();
    const change = { version: 1, stock: 5 };
    const [{ id: next }] = [
      (await purchasing.agent.patch(`/api/offers/${id}`).send(change).expect(200)).body,
    ];
    const again = await purchasing.agent.patch(`/api/offers/${id}`).send(change).expect(409);
    expect(again.body.code).toBe('offer.stale');
    expect((await purchasing.agent.patch(`/api/offers/${next}`).send(change).expect(409)).body.code).toBe(
      'offer.stale',
    );
    expect((await purchasing.agent.delete(`/api/offers/${next}?version=1`).expect(409)).body.code).toBe(
      'offer.stale',
    );
    await purchasing.agent.delete(`/api/offers/${next}?version=2`).expect(204);
    await purchasing.agent.patch(`/api/offers/${next}`).send({ version: 2, stock: 6 }).expect(409);
    const { current, history } = await ofPart();
    expect(current).toEqual([]);
    expect(history.map((offer: { id: string }) => offer.id)).toEqual([next, id]);
  });

  it('tells in what currency each supplier made its latest offer', async () => {
    await make({ currency: 'GBP' });
    const { id } = await make({ currency: 'USD', supplierNumber: 'Reel' });
    await purchasing.agent.delete(`/api/offers/${id}?version=1`).expect(204);
    const { name } = await createSupplier(purchasing);
    const { body } = await purchasing.agent.get('/api/suppliers?limit=1000').expect(200);
    const currencies = body.items.filter(
      (one: { id: string; name: string }) => one.id === supplierId || one.name === name,
    );
    expect(currencies.map((one: { currency: string | null }) => one.currency)).toEqual(['USD', null]);
  });

  it('lets only one of several changes at once through', async () => {
    const { id } = await make();
    const answers = await Promise.all(
      [1, 2, 3, 4].map((stock) => purchasing.agent.patch(`/api/offers/${id}`).send({ version: 1, stock })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
    expect((await ofPart()).current).toHaveLength(1);
  });

  it('confirms offers in one click without a new row', async () => {
    const ids = [(await make()).id, (await make({ supplierNumber: 'B' })).id];
    const long = new Date('2026-01-05T08:00:00Z');
    await app.dataSource.manager.update(Offer, ids, { confirmedAt: long, confirmedById: null });
    expect((await ofPart()).current.map(({ states }: { states: string[] }) => states)).toEqual([
      ['stale'],
      ['stale'],
    ]);
    const { body } = await purchasing.agent.post('/api/offers/confirm').send({ ids }).expect(200);
    expect(body.items.map((offer: { id: string; states: string[] }) => [offer.id, offer.states])).toEqual(
      ids.map((id) => [id, []]),
    );
    expect(body.items[0]).toMatchObject({
      version: 1,
      confirmedBy: { id: String(purchasing.caller.userId) },
    });
    expect((await ofPart()).current).toEqual(body.items);
  });

  it('takes back a confirmation: the one before holds again, once', async () => {
    const { id } = await make();
    const long = new Date('2026-01-05T08:00:00Z');
    await app.dataSource.manager.update(
      Offer,
      { id: Number(id) },
      { confirmedAt: long, confirmedById: null },
    );
    const undo = (member: TestMember) => member.agent.post('/api/offers/confirm/undo').send({ ids: [id] });
    expect(fields((await undo(purchasing).expect(409)).body)).toEqual(['ids[0]']);
    await purchasing.agent
      .post('/api/offers/confirm')
      .send({ ids: [id] })
      .expect(200);
    const colleague = await signInMember(
      app,
      { id: purchasing.caller.teamId, plan: purchasing.caller.plan },
      ['purchasing'],
    );
    expect((await undo(colleague).expect(409)).body.code).toBe('offer.stale');
    const { body } = await undo(purchasing).expect(200);
    expect(body.items).toMatchObject([
      { id, confirmedAt: long.toISOString(), confirmedBy: null, version: 1 },
    ]);
    expect(await app.dataSource.manager.findOneByOrFail(Offer, { id: Number(id) })).toMatchObject({
      confirmedAt: long,
      confirmedById: null,
      earlierConfirmedAt: null,
    });
    await undo(purchasing).expect(409);
  });

  it('confirms all or none', async () => {
    const { id } = await make();
    const before = await ofPart();
    const { body } = await purchasing.agent
      .post('/api/offers/confirm')
      .send({ ids: [id, '4000000000'] })
      .expect(404);
    expect(fields(body)).toEqual(['ids[1]']);
    expect(await ofPart()).toEqual(before);
  });

  it('doesn’t take an offer that has ended for one that holds', async () => {
    const { id } = await make({ validFrom: '2026-01-01' });
    await app.dataSource.manager.update(Offer, { id: Number(id) }, { validUntil: '2026-02-01' });
    const { body } = await purchasing.agent
      .post('/api/offers/confirm')
      .send({ ids: [id] })
      .expect(422);
    expect(fields(body)).toEqual(['ids[0]']);
    expect((await ofPart()).current[0].states).toEqual(['expired']);
  });

  const breaks = (...list: [number, string][]) => ({
    breaks: list.map(([minimumQuantity, unitPrice]) => ({ minimumQuantity, unitPrice })),
  });

  it.each([
    [400, 'breaks[0].unitPrice', breaks([1, '0'])],
    [400, 'breaks[1].unitPrice', breaks([1, '2'], [10, '-1.50'])],
    [400, 'breaks[0].unitPrice', breaks([1, '1.234,56'])],
    [400, 'breaks[0].unitPrice', breaks([1, '1,234.56'])],
    [400, 'breaks[0].unitPrice', breaks([1, 'USD 1.20'])],
    [400, 'breaks[0].unitPrice', breaks([1, '1.00001'])],
    [400, 'breaks[0].unitPrice', { breaks: [{ minimumQuantity: 1, unitPrice: 1.2 }] }],
    [400, 'breaks[0].currency', { breaks: [{ minimumQuantity: 1, unitPrice: '1', currency: 'USD' }] }],
    [400, 'breaks[0].minimumQuantity', breaks([0, '1'])],
    [400, 'breaks', { breaks: [] }],
    [400, 'breaks', { breaks: undefined }],
    [400, 'currency', { currency: 'EURO' }],
    [400, 'currency', { currency: undefined }],
    [400, 'minimumOrderQuantity', { minimumOrderQuantity: 0 }],
    [400, 'orderMultiple', { orderMultiple: 2.5 }],
    [400, 'leadTimeDays', { leadTimeDays: -1 }],
    [400, 'stock', { stock: '12' }],
    [400, 'validFrom', { validFrom: '2026-02-30' }],
    [400, 'validUntil', { validUntil: '31.12.2026' }],
    [400, 'partId', { partId: 5 }],
    [400, 'supplierNumber', { supplierNumber: 'x'.repeat(61) }],
    [422, 'breaks[1].minimumQuantity', breaks([100, '2'], [10, '1'])],
    [422, 'breaks[1].unitPrice', breaks([1, '2'], [10, '2.0001'])],
    [422, 'validUntil', { validUntil: addDays(TODAY, -1), validFrom: '2020-01-01' }],
    [422, 'validUntil', { validUntil: addDays(TODAY, 5), validFrom: addDays(TODAY, 6) }],
    [404, 'partId', { partId: '4000000000' }],
    [404, 'supplierId', { supplierId: '4000000000' }],
  ])('answers %i at %s: %j', async (status, field, changes) => {
    const count = await app.dataSource.manager.count(Offer);
    const { body } = await send(changes).expect(status);
    expect(fields(body)).toEqual([field]);
    expect(await app.dataSource.manager.count(Offer)).toBe(count);
  });

  it('refuses a second offer of a supplier for a part, unless under another number', async () => {
    await make({ supplierNumber: 'Reel' });
    const { body } = await send({ supplierNumber: 'REEL' }).expect(409);
    expect(body).toMatchObject({ code: 'offer.duplicate', errors: [{ field: 'supplierNumber' }] });
    await make({ supplierNumber: 'cut tape' });
  });

  it('lets purchasing and admin edit, and others only see', async () => {
    const { id } = await make();
    for (const member of [engineer, librarian]) {
      const refused = [
        await member.agent.post('/api/offers').send(offerBody({ partId, supplierId })),
        await member.agent.patch(`/api/offers/${id}`).send({ version: 1 }),
        await member.agent.delete(`/api/offers/${id}?version=1`),
        await member.agent.post('/api/offers/confirm').send({ ids: [id] }),
        await member.agent.put('/api/prices').send({ rows: [{ id, version: 1, stock: 1 }] }),
        await member.agent.post('/api/suppliers').send({ name: 'Mine' }),
        await member.agent.put('/api/prices/rates').send({ rates: [{ currency: 'USD', rate: '1' }] }),
        await member.agent.put('/api/prices/settings').send({ currency: 'USD', staleAfterDays: 1 }),
      ];
      expect(refused.map(({ status }) => status)).toEqual(Array(8).fill(403));
      for (const path of [
        'prices',
        'prices/rates',
        'prices/settings',
        'suppliers',
        `offers/history?partId=${partId}`,
      ])
        await member.agent.get(`/api/${path}`).expect(200);
    }
    await purchasing.agent.post('/api/op-amps').send({}).expect(403);
    const free = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
    expect((await free.agent.post('/api/suppliers').send({ name: 'Mine' }).expect(402)).body.code).toBe(
      'access.plan',
    );
  });

  it('keeps teams apart: own offers for a curated part, nothing of another team’s', async () => {
    const { id } = await make();
    await stranger.agent.get(`/api/parts/${partId}/offers`).expect(404);
    await stranger.agent.get(`/api/offers/history?partId=${partId}`).expect(404);
    await stranger.agent.patch(`/api/offers/${id}`).send({ version: 1, stock: 1 }).expect(404);
    await stranger.agent.delete(`/api/offers/${id}?version=1`).expect(404);
    await stranger.agent
      .post('/api/offers/confirm')
      .send({ ids: [id] })
      .expect(404);
    await stranger.agent
      .put('/api/prices')
      .send({ rows: [{ id, version: 1, stock: 1 }] })
      .expect(404);
    const foreign = offerBody({ partId, supplierId });
    await stranger.agent.post('/api/offers').send(foreign).expect(404);
    const own = (await createSupplier(stranger)).id;
    expect(
      (
        await stranger.agent
          .post('/api/offers')
          .send({ ...foreign, supplierId: own })
          .expect(404)
      ).body.code,
    ).toBe('part.not-found');
    expect((await stranger.agent.get('/api/prices').expect(200)).body.total).toBe(0);

    const { identifiers } = await app.dataSource
      .createQueryBuilder()
      .insert()
      .into('libraries')
      .values({ teamId: null })
      .execute();
    await app.dataSource.query('UPDATE parts SET library_id = ? WHERE id = ?', [identifiers[0].id, partId]);
    const offer = await createOffer(stranger, { partId, supplierId: own });
    expect((await ofPart(stranger)).current).toEqual([offer]);
    expect((await ofPart()).current.map((shown: { id: string }) => shown.id)).toEqual([id]);
  });

  it('draws the history of a part’s price at a quantity', async () => {
    const { id } = await make();
    const cheaper = [{ minimumQuantity: 1, unitPrice: '3.90' }];
    await purchasing.agent.patch(`/api/offers/${id}`).send({ version: 1, breaks: cheaper }).expect(200);
    const dollars = await createSupplier(purchasing);
    await createOffer(purchasing, { partId, supplierId: dollars.id }, { currency: 'USD' });
    const { body } = await engineer.agent
      .get(`/api/offers/history?partId=${partId}&quantity=100`)
      .expect(200);
    expect(body).toMatchObject({ currency: 'EUR', quantity: 100 });
    expect(body.items.map(({ unitPrice }: { unitPrice: string }) => unitPrice)).toEqual([
      '3.1000',
      '3.9000',
      null,
    ]);
    expect(body.items[0].until).toBe(body.items[1].from);
    expect(body.items[1]).toMatchObject({ until: null, supplier: { id: supplierId } });
  });

  it('writes every change into the audit trail, for the admin to read', async () => {
    const admin = await signInMember(app, { id: purchasing.caller.teamId, plan: 'team' }, ['admin']);
    const { id } = await make();
    const { body: next } = await purchasing.agent
      .patch(`/api/offers/${id}`)
      .send({ version: 1, stock: 7 })
      .expect(200);
    await purchasing.agent
      .post('/api/offers/confirm')
      .send({ ids: [next.id] })
      .expect(200);
    await purchasing.agent.delete(`/api/offers/${next.id}?version=2`).expect(204);
    const list = async (query: string) => (await admin.agent.get(`/api/audit?${query}`).expect(200)).body;
    const { items, total } = await list(`objectKind=offer&objectId=${next.id}`);
    expect(total).toBe(3);
    expect(items.map(({ action }: { action: string }) => action)).toEqual([
      'offer.closed',
      'offer.confirmed',
      'offer.changed',
    ]);
    expect(items[2]).toMatchObject({
      by: { id: String(purchasing.caller.userId) },
      object: { kind: 'offer', id: next.id },
      from: { id, stock: null, breaks: [{ unitPrice: '4.2000' }, {}] },
      to: { partId, stock: 7 },
    });
    expect(items[0]).toMatchObject({ from: { stock: 7 }, to: null });
    expect((await list(`action=offer.opened&objectId=${id}&userId=${purchasing.caller.userId}`)).total).toBe(
      1,
    );
    expect((await list(`objectId=${id}&to=2020-01-01`)).total).toBe(0);
    expect((await list(`from=${TODAY}&to=${TODAY}&limit=1`)).items).toHaveLength(1);
    await purchasing.agent.get('/api/audit').expect(403);
    expect((await stranger.agent.get(`/api/audit?objectId=${next.id}`).expect(200)).body.total).toBe(0);
  });

  it('leaves no trace in the trail of what was refused', async () => {
    const count = await app.dataSource.manager.count(AuditEntry);
    await send({ currency: 'EURO' }).expect(400);
    await send(breaks([100, '2'], [10, '1'])).expect(422);
    expect(await app.dataSource.manager.count(AuditEntry)).toBe(count);
  });
});
