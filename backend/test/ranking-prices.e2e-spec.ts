import { createOffer, createSupplier } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { createResistor } from './factories/resistors.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const conditions = {
  source: { resistance: 600 },
  band: { lower: 20, upper: 20_000 },
  stage: { topology: 'non-inverting', gain: 100, gainResistance: 10 },
  bandwidthMargin: 0,
};

interface Item {
  rank: number;
  part: { id: string; partNumber: string };
  unitPrice: { amount: string } | null;
}

describe('a ranking with prices', () => {
  let app: TestApp;
  let admin: TestMember;
  let supplierId: string;
  const parts: Record<string, string> = {};

  const price = (partNumber: string, unitPrice: string, changes: object = {}) =>
    createOffer(
      admin,
      { partId: parts[partNumber], supplierId },
      { breaks: [{ minimumQuantity: 1, unitPrice }], ...changes },
    );
  const rank = async (body: object = {}, member = admin) =>
    (
      await member.agent
        .post('/api/rankings/op-amps')
        .send({ conditions, ...body })
        .expect(200)
    ).body;
  const priced = ({ items }: { items: Item[] }) =>
    items.map(({ part, unitPrice }) => [part.partNumber, unitPrice && unitPrice.amount]);

  beforeAll(async () => {
    app = await startTestApp();
    admin = await signInMember(app, await createTeam(app), ['admin']);
    supplierId = (await createSupplier(admin, 'Brook & Weir')).id;
    const noises = { 'Q-1': 1e-9, 'Q-2': 1.01e-9, 'Q-3': 1.02e-9, LOUD: 9e-9, NONE: 12e-9 };
    for (const [partNumber, voltageNoise] of Object.entries(noises))
      parts[partNumber] = (
        await createOpAmp(admin, { partNumber, amplifier: { voltageNoise, currentNoise: 1e-13 } })
      ).id;
    await price('Q-1', '9.5');
    await price('Q-2', '2.2', { currency: 'USD', leadTimeDays: 21, stock: 400 });
    await price('LOUD', '0.4', { minimumOrderQuantity: 50 });
    await createOffer(
      admin,
      { partId: parts['Q-3'], supplierId },
      {
        breaks: [
          { minimumQuantity: 1, unitPrice: '3.00' },
          { minimumQuantity: 100, unitPrice: '1.80' },
        ],
      },
    );
  });
  afterAll(() => app.close());

  it('passes over a currency without a rate until there is one', async () => {
    expect(priced(await rank())[1]).toEqual(['Q-2', null]);
    const rates = [{ currency: 'USD', rate: '0.9' }];
    await admin.agent.put('/api/prices/rates').send({ rates }).expect(200);
    expect(priced(await rank())[1]).toEqual(['Q-2', '1.9800']);
  });

  it('says what each part costs at the quantity, from whom and how soon', async () => {
    const { items } = await rank({ quantity: 95 });
    expect(priced({ items })).toEqual([
      ['Q-1', '9.5000'],
      ['Q-2', '1.9800'],
      ['Q-3', '3.0000'],
      ['LOUD', '0.4000'],
      ['NONE', null],
    ]);
    expect(items[1].unitPrice).toEqual({
      amount: '1.9800',
      currency: 'EUR',
      minimumQuantity: 1,
      orderQuantity: 95,
      total: '188.1000',
      cheaperOrder: null,
      supplier: 'Brook & Weir',
      leadTimeDays: 21,
      stock: 400,
      isStale: false,
    });
    expect(items[2].unitPrice.cheaperOrder).toEqual({ orderQuantity: 100, total: '180.0000' });
    const hundred = await rank({ quantity: 100 });
    expect(hundred.items[2].unitPrice).toMatchObject({ amount: '1.8000', minimumQuantity: 100 });
  });

  it('counts what has to be bought beyond the quantity', async () => {
    const { items } = await rank({ quantity: 10 });
    expect(items[3].unitPrice).toMatchObject({ amount: '2.0000', orderQuantity: 50, total: '20.0000' });
  });

  it('sorts the whole ranking by price, parts without one last', async () => {
    const order = async (body: object) => priced(await rank(body)).map(([partNumber]) => partNumber);
    expect(await order({ sort: 'unitPrice' })).toEqual(['Q-2', 'Q-3', 'Q-1', 'LOUD', 'NONE']);
    expect(await order({ sort: '-unitPrice' })).toEqual(['LOUD', 'Q-1', 'Q-3', 'Q-2', 'NONE']);
    expect(await order({ sort: 'unitPrice', quantity: 100 })).toEqual(['LOUD', 'Q-3', 'Q-2', 'Q-1', 'NONE']);
    expect(await order({ sort: 'unitPrice', limit: 2, offset: 1 })).toEqual(['Q-3', 'Q-1']);
  });

  it('names the cheapest part of the quiet set', async () => {
    const { cheapest, quietSet } = await rank();
    expect(quietSet.total).toBe(3);
    expect(cheapest).toMatchObject({ part: { partNumber: 'Q-2' }, unitPrice: { amount: '1.9800' } });
    expect(cheapest.aboveQuietest).toBeGreaterThan(0);
    expect(cheapest.aboveQuietest).toBeLessThan(0.1);
    expect((await rank({ quantity: 100 })).cheapest.part.partNumber).toBe('Q-3');
    expect((await rank({ filter: { search: 'NONE' } })).cheapest).toBeNull();
  });

  it('draws the frontier: each part cheaper than all that are as quiet', async () => {
    const { frontier } = await rank({ quantity: 100 });
    expect(priced({ items: frontier })).toEqual([
      ['Q-1', '9.5000'],
      ['Q-2', '1.9800'],
      ['Q-3', '1.8000'],
      ['LOUD', '0.4000'],
    ]);
    expect(frontier[0].inputNoiseRms).toBeLessThan(frontier[3].inputNoiseRms);
    expect((await rank({ filter: { search: 'NONE' } })).frontier).toEqual([]);
  });

  it('follows each change of a price, of the rates and of the team’s currency', async () => {
    const { id, version } = await price('NONE', '0.10');
    expect(priced(await rank()).at(-1)).toEqual(['NONE', '0.1000']);
    const breaks = [{ minimumQuantity: 1, unitPrice: '0.12' }];
    const { body } = await admin.agent.patch(`/api/offers/${id}`).send({ version, breaks }).expect(200);
    expect(priced(await rank()).at(-1)).toEqual(['NONE', '0.1200']);
    await admin.agent.delete(`/api/offers/${body.id}?version=${body.version}`).expect(204);
    expect(priced(await rank()).at(-1)).toEqual(['NONE', null]);
    const settings = (currency: string) =>
      admin.agent.put('/api/prices/settings').send({ currency, staleAfterDays: 90 }).expect(200);
    await settings('USD');
    expect(priced(await rank()).slice(0, 2)).toEqual([
      ['Q-1', null],
      ['Q-2', '2.2000'],
    ]);
    await settings('EUR');
    expect(priced(await rank())[1]).toEqual(['Q-2', '1.9800']);
  });

  it('shows a team its own prices only', async () => {
    const stranger = await signInMember(app, await createTeam(app), ['admin']);
    await app.dataSource.query('INSERT INTO libraries (team_id) VALUES (NULL)');
    await app.dataSource.query(
      'UPDATE parts SET library_id = (SELECT id FROM libraries WHERE team_id IS NULL) WHERE id = ?',
      [parts.LOUD],
    );
    await app.dataSource.query('UPDATE libraries SET revision = revision + 1');
    expect(priced(await rank({}, stranger))).toEqual([['LOUD', null]]);
    expect(priced(await rank({ filter: { library: ['curated'] }, quantity: 50 }))).toEqual([
      ['LOUD', '0.4000'],
    ]);
  });

  it('prices resistors alike', async () => {
    const resistance = { resistance: 1000 };
    const cheap = await createResistor(admin, { resistor: resistance, partNumber: 'R-CHEAP' });
    await createResistor(admin, { resistor: resistance, partNumber: 'R-NONE' });
    const dear = await createResistor(admin, { resistor: resistance, partNumber: 'R-DEAR' });
    for (const [{ id: partId }, unitPrice] of [
      [cheap, '0.0125'],
      [dear, '0.9'],
    ] as const)
      await createOffer(admin, { partId, supplierId }, { breaks: [{ minimumQuantity: 1, unitPrice }] });
    const at = { resistance: 1000, band: { lower: 1, upper: 1000 } };
    const sorted = async (sort: string) => {
      const body = { conditions: at, sort, quantity: 1000 };
      return priced((await admin.agent.post('/api/rankings/resistors').send(body).expect(200)).body);
    };
    expect(await sorted('unitPrice')).toEqual([
      ['R-CHEAP', '0.0125'],
      ['R-DEAR', '0.9000'],
      ['R-NONE', null],
    ]);
    expect((await sorted('-unitPrice'))[0]).toEqual(['R-DEAR', '0.9000']);
  });
});
