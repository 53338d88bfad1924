import { addDays, dayOf } from '@roothertz/common/prices';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Offer } from '../src/prices/entities/offer.entity.js';
import { saveConditions } from './factories/conditions.js';
import { createOffer, createSupplier } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { createResistor } from './factories/resistors.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const TODAY = dayOf(new Date());
/** Terms of an offer that says all that it can. */
const LONG = {
  minimumOrderQuantity: 10,
  orderMultiple: 10,
  leadTimeDays: 14,
  stock: 250_000,
  validFrom: TODAY,
  validUntil: addDays(TODAY, 365),
};

interface Row {
  part: { partNumber: string };
  offer: { id: string; states: string[] } | null;
  usedIn: string[];
}

describe('the grid of prices', () => {
  let app: TestApp;
  let admin: TestMember;
  let stranger: TestMember;
  let supplierId: string;
  let otherSupplierId: string;

  beforeAll(async () => {
    app = await startTestApp();
    stranger = await signInMember(app, await createTeam(app), ['admin']);
  });
  beforeEach(async () => {
    admin = await signInMember(app, await createTeam(app), ['admin']);
    supplierId = (await createSupplier(admin, 'Brook & Weir')).id;
    otherSupplierId = (await createSupplier(admin, 'Fenway Électronique')).id;
  });
  afterAll(() => app.close());

  const grid = async (query = '', member = admin) =>
    (await member.agent.get(`/api/prices?${query}`).expect(200)).body as { items: Row[]; total: number };
  const names = ({ items }: { items: Row[] }) => items.map(({ part }) => part.partNumber);
  const save = (rows: object[]) => admin.agent.put('/api/prices').send({ rows });
  const fields = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);
  const offered = async (partNumber: string, changes: object = {}, supplier = supplierId) => {
    const { id: partId } = await createOpAmp(admin, { partNumber });
    return createOffer(admin, { partId, supplierId: supplier }, { ...changes });
  };

  describe('lists', () => {
    it('every offer that stands, with its part, and filters what needs a look', async () => {
      const [stale] = [await offered('P-STALE')];
      await app.dataSource.manager.update(
        Offer,
        { id: Number(stale.id) },
        { confirmedAt: new Date(Date.parse(TODAY) - 91 * 86_400_000) },
      );
      await offered('P-SOON', { validUntil: addDays(TODAY, 30) });
      await offered('P-LATER', { validUntil: addDays(TODAY, 31) });
      const ended = await offered('P-ENDED', { validFrom: '2026-01-01' });
      await app.dataSource.manager.update(
        Offer,
        { id: Number(ended.id) },
        { validUntil: addDays(TODAY, -1) },
      );
      await createOpAmp(admin, { partNumber: 'P-WITHOUT' });
      await createResistor(admin, { partNumber: 'R-WITHOUT' });

      expect(names(await grid())).toEqual(['P-ENDED', 'P-LATER', 'P-SOON', 'P-STALE']);
      expect(names(await grid('state=stale'))).toEqual(['P-STALE']);
      expect(names(await grid('state=expiring'))).toEqual(['P-SOON']);
      expect(names(await grid('state=expired,stale'))).toEqual(['P-ENDED', 'P-STALE']);
      const missing = await grid('state=missing&library=team');
      expect(missing.items.map(({ part, offer }) => [part.partNumber, offer])).toEqual([
        ['P-WITHOUT', null],
        ['R-WITHOUT', null],
      ]);
      expect(names(await grid('state=missing,expiring&kind=op-amp&library=team'))).toEqual([
        'P-SOON',
        'P-WITHOUT',
      ]);
      const states = (await grid()).items.map(({ offer }) => offer!.states);
      expect(states).toEqual([['expired'], [], ['expiring'], ['stale']]);

      await admin.agent.put('/api/prices/settings').send({ currency: 'EUR', staleAfterDays: 91 }).expect(200);
      expect(names(await grid('state=stale'))).toEqual([]);
    });

    it('the parts that are chosen in saved conditions, with and without an offer', async () => {
      const used = await offered('P-USED');
      await offered('P-IDLE');
      const { id: without } = await createOpAmp(admin, { partNumber: 'P-WITHOUT' });
      await saveConditions(admin, { name: 'Weir', partIds: [used.part.id, without] });
      await saveConditions(admin, { name: 'Geophone', partIds: [used.part.id] });
      const inUse = await grid('usedInConditions=true');
      expect(names(inUse)).toEqual(['P-USED', 'P-WITHOUT']);
      expect(inUse.items.map(({ usedIn }) => usedIn)).toEqual([['Geophone', 'Weir'], ['Weir']]);
      expect(names(await grid('usedInConditions=true&state=missing'))).toEqual(['P-WITHOUT']);
      expect(names(await grid('usedInConditions=false'))).toEqual(['P-IDLE', 'P-USED']);
      expect((await admin.agent.get('/api/prices/counts').expect(200)).body).toEqual({
        offers: 2,
        stale: 0,
        expiring: 0,
        expired: 0,
        missing: 1,
        usedInConditions: 2,
      });
      expect(names(await grid(`partId=${without}`))).toEqual(['P-WITHOUT']);
      expect((await grid('usedInConditions=true', stranger)).total).toBe(0);
      await admin.agent.get('/api/prices?usedInConditions=1').expect(400);
    });

    it('what is searched for, sorted and in pages', async () => {
      await offered('P-1', { leadTimeDays: 42, supplierNumber: 'AX-7' });
      await offered('P-2', { leadTimeDays: 7 }, otherSupplierId);
      await offered('P-3');
      expect(names(await grid('search=fenway'))).toEqual(['P-2']);
      expect(names(await grid('search=weir%20ax-7'))).toEqual(['P-1']);
      expect(names(await grid('sort=leadTimeDays'))).toEqual(['P-2', 'P-1', 'P-3']);
      expect(names(await grid('sort=-leadTimeDays'))).toEqual(['P-1', 'P-2', 'P-3']);
      expect(names(await grid('sort=-supplier'))).toEqual(['P-2', 'P-1', 'P-3']);
      expect(names(await grid(`supplierId=${otherSupplierId}`))).toEqual(['P-2']);
      await offered('P-4', { breaks: [{ minimumQuantity: 100, unitPrice: '0.5' }] });
      expect(names(await grid('sort=price:100'))).toEqual(['P-4', 'P-1', 'P-2', 'P-3']);
      expect(names(await grid('sort=-price:1'))).toEqual(['P-1', 'P-2', 'P-3', 'P-4']);
      await admin.agent.get('/api/prices?sort=price:0').expect(400);
      const page = await grid('limit=1&offset=1');
      expect([names(page), page.total]).toEqual([['P-2'], 4]);
      await admin.agent.get('/api/prices?sort=price').expect(400);
      await admin.agent.get('/api/prices?state=cheap').expect(400);
    });
  });

  describe('is saved', () => {
    it('in one go: changes and new offers, in the order of the rows', async () => {
      const first = await offered('P-1');
      const { id: partId } = await createOpAmp(admin, { partNumber: 'P-2' });
      const breaks = [{ minimumQuantity: 5, unitPrice: ' 2.5 ' }];
      const { body } = await save([
        { partId, supplierId, currency: 'USD', breaks, stock: 40 },
        { id: first.id, version: 1, leadTimeDays: 14 },
      ]).expect(200);
      expect(body.items).toMatchObject([
        { part: { id: partId }, currency: 'USD', breaks: [{ unitPrice: '2.5000' }], version: 1, stock: 40 },
        { part: { id: first.part.id }, currency: 'EUR', leadTimeDays: 14, version: 2 },
      ]);
      expect((await grid()).items.map(({ offer }) => offer)).toEqual([body.items[1], body.items[0]]);
    });

    it('not at all where a row is wrong: every wrong cell is named, nothing is half-saved', async () => {
      const offers = [await offered('P-1'), await offered('P-2'), await offered('P-3')];
      const before = await grid();
      const trail = await app.dataSource.manager.count(AuditEntry);
      const rows = offers.map(({ id, version }) => ({ id, version, stock: 5 }));
      const price = (unitPrice: string) => ({ breaks: [{ minimumQuantity: 1, unitPrice }] });

      const badCells = [
        rows[0],
        { ...rows[1], ...price('-2') },
        { ...rows[2], ...price('1.234,56'), currency: '€' },
      ];
      expect(fields((await save(badCells).expect(400)).body)).toEqual([
        'rows[1].breaks[0].unitPrice',
        'rows[2].currency',
        'rows[2].breaks[0].unitPrice',
      ]);

      const outOfOrder = [
        { minimumQuantity: 100, unitPrice: '1' },
        { minimumQuantity: 10, unitPrice: '2' },
      ];
      const contradictions = [
        rows[0],
        { ...rows[1], breaks: outOfOrder },
        { ...rows[2], validUntil: '2026-01-01' },
      ];
      const { body } = await save(contradictions).expect(422);
      expect(body.code).toBe('offer.invalid');
      expect(fields(body)).toEqual(['rows[1].breaks[1].minimumQuantity', 'rows[2].validUntil']);

      expect(await grid()).toEqual(before);
      expect(await app.dataSource.manager.count(AuditEntry)).toBe(trail);
    });

    it('not over what somebody has changed meanwhile', async () => {
      const [mine, theirs] = [await offered('P-1'), await offered('P-2')];
      await admin.agent.patch(`/api/offers/${theirs.id}`).send({ version: 1, stock: 1 }).expect(200);
      const before = await grid();
      const { body } = await save([
        { id: mine.id, version: 1, stock: 9 },
        { id: theirs.id, version: 1, stock: 9 },
      ]).expect(409);
      expect(body.code).toBe('offer.stale');
      expect(fields(body)).toEqual(['rows[1].version']);
      expect(await grid()).toEqual(before);
    });

    it('not with rows that say too little, too much or the same thing twice', async () => {
      const { id, part } = await offered('P-1');
      const row = { id, version: 1, stock: 9 };
      const fresh = {
        partId: part.id,
        supplierId: otherSupplierId,
        currency: 'EUR',
        breaks: [{ minimumQuantity: 1, unitPrice: '1' }],
      };
      const refused = async (rows: object[], status: number) =>
        fields((await save(rows).expect(status)).body);
      expect(await refused([{ stock: 3 }], 422)).toEqual(
        ['partId', 'supplierId', 'currency', 'breaks'].map((field) => `rows[0].${field}`),
      );
      expect(await refused([{ ...row, supplierId: otherSupplierId }], 422)).toEqual(['rows[0].supplierId']);
      expect(await refused([{ id, stock: 3 }], 409)).toEqual(['rows[0].version']);
      expect(await refused([row, { ...row, stock: 10 }], 409)).toEqual(['rows[1].id']);
      expect(await refused([fresh, { ...fresh, stock: 1 }], 409)).toEqual(['rows[1].supplierNumber']);
      expect(await refused([{ ...fresh, supplierId }], 409)).toEqual(['rows[0].supplierNumber']);
      expect(await refused([], 400)).toEqual(['rows']);
      const { id: foreign } = await createSupplier(stranger);
      expect(await refused([{ ...fresh, supplierId: foreign }], 404)).toEqual(['rows[0].supplierId']);
      expect((await grid()).total).toBe(1);
    });

    it('a pasted list of some thousand rows at once, or none of it', async () => {
      const { id: partId } = await createOpAmp(admin);
      const fresh = {
        partId,
        supplierId,
        currency: 'EUR',
        breaks: [1, 10, 1000].map((minimumQuantity) => ({ minimumQuantity, unitPrice: '1' })),
      };
      const number = (n: number) => `N-${n}`.padEnd(60, 'x');
      const rows = Array.from({ length: 3000 }, (_, n) => ({ ...LONG, ...fresh, supplierNumber: number(n) }));
      expect(JSON.stringify({ rows }).length).toBeGreaterThan(2 ** 20);
      const wrong = { ...rows[2999], validUntil: addDays(TODAY, -1) };
      expect(fields((await save([...rows.slice(0, -1), wrong]).expect(422)).body)).toEqual([
        'rows[2999].validUntil',
      ]);
      expect((await grid()).total).toBe(0);
      const { body } = await save(rows).expect(200);
      expect((await grid()).total).toBe(3000);
      expect(body.items.map((offer: { supplierNumber: string }) => offer.supplierNumber)).toEqual(
        rows.map(({ supplierNumber }) => supplierNumber),
      );
      const tooMany = Array.from({ length: 5001 }, () => ({ id: '1', version: 1, stock: 1 }));
      expect(fields((await save(tooMany).expect(400)).body)).toEqual(['rows']);
    });
  });

  describe('exchange rates', () => {
    const put = (rates: object[], dated?: string) =>
      admin.agent.put('/api/prices/rates').send({ rates, dated });

    it('are dated: the newest that has begun holds', async () => {
      expect((await admin.agent.get('/api/prices/rates').expect(200)).body).toEqual({
        currency: 'EUR',
        items: [],
        missing: [],
      });
      await offered('P-1', { currency: 'CHF' });
      const first = await put([{ currency: 'USD', rate: '0.9' }], '2026-03-01').expect(200);
      expect(first.body).toEqual({
        currency: 'EUR',
        items: [{ currency: 'USD', rate: '0.90000000', dated: '2026-03-01' }],
        missing: ['CHF'],
      });
      await put([
        { currency: 'USD', rate: '0.85' },
        { currency: 'CHF', rate: '1.07' },
      ]).expect(200);
      await put([{ currency: 'USD', rate: '0.8' }], '2026-02-01').expect(200);
      const { body } = await admin.agent.get('/api/prices/rates').expect(200);
      expect(body).toEqual({
        currency: 'EUR',
        items: expect.arrayContaining([
          { currency: 'USD', rate: '0.85000000', dated: TODAY },
          { currency: 'CHF', rate: '1.07000000', dated: TODAY },
        ]),
        missing: [],
      });
      expect(body.items).toHaveLength(2);
    });

    it.each([
      [400, 'rates[0].rate', [{ currency: 'USD', rate: '0' }], TODAY],
      [400, 'rates[0].rate', [{ currency: 'USD', rate: 0.9 }], TODAY],
      [400, 'rates[0].rate', [{ currency: 'USD', rate: '0,9' }], TODAY],
      [400, 'rates[0].currency', [{ currency: 'US', rate: '1' }], TODAY],
      [400, 'dated', [{ currency: 'USD', rate: '1' }], 'today'],
      [422, 'rates[0].currency', [{ currency: 'EUR', rate: '1' }], TODAY],
      [
        422,
        'rates[1].currency',
        [
          { currency: 'USD', rate: '1' },
          { currency: 'USD', rate: '2' },
        ],
        TODAY,
      ],
      [422, 'dated', [{ currency: 'USD', rate: '1' }], addDays(TODAY, 2)],
    ])('answer %i at %s: %j', async (status, field, rates, dated) => {
      expect(fields((await put(rates, dated).expect(status)).body)).toEqual([field]);
      expect((await admin.agent.get('/api/prices/rates')).body.items).toEqual([]);
    });
  });

  it('has the team’s currency and days, which no other team sees', async () => {
    const settings = '/api/prices/settings';
    expect((await admin.agent.get(settings)).body).toEqual({ currency: 'EUR', staleAfterDays: 90 });
    const chosen = { currency: 'CHF', staleAfterDays: 30 };
    expect((await admin.agent.put(settings).send(chosen).expect(200)).body).toEqual(chosen);
    expect((await admin.agent.get(settings)).body).toEqual(chosen);
    expect((await stranger.agent.get(settings)).body).toEqual({ currency: 'EUR', staleAfterDays: 90 });
    await admin.agent.put(settings).send({ currency: 'francs', staleAfterDays: 30 }).expect(400);
    await admin.agent.put(settings).send({ currency: 'CHF', staleAfterDays: 0 }).expect(400);
  });

  it('has suppliers, each name once in a team whatever its case', async () => {
    const { body } = await admin.agent
      .post('/api/suppliers')
      .send({ name: 'FENWAY électronique' })
      .expect(409);
    expect(body).toMatchObject({ code: 'supplier.duplicate', errors: [{ field: 'name' }] });
    await createSupplier(stranger, 'Fenway Électronique');
    await admin.agent.post('/api/suppliers').send({ name: ' ' }).expect(400);
    const list = await admin.agent.get('/api/suppliers?sort=-name').expect(200);
    expect(list.body).toEqual({
      items: [
        { id: otherSupplierId, name: 'Fenway Électronique', currency: null },
        { id: supplierId, name: 'Brook & Weir', currency: null },
      ],
      total: 2,
    });
  });
});
