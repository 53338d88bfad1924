import supertest from 'supertest';
import { readDemoData } from '../src/database/seeds/demo-data.js';
import { seed } from '../src/database/seeds/seed.js';
import { startTestApp, type TestApp } from './support/index.js';

describe('the demo team’s prices', () => {
  let app: TestApp;
  let agent: ReturnType<typeof supertest.agent>;

  beforeAll(async () => {
    app = await startTestApp();
    await app.dataSource.transaction((manager) => seed(manager, true));
    agent = supertest.agent(await app.nest.getUrl());
    const account = { email: 'purchasing@tarnfield.example', password: 'quiet-bench-2026' };
    await agent.post('/api/auth/sign-in').send(account).expect(200);
  });
  afterAll(() => app.close());

  it('are seeded: offers that stand, stale, about to end and past, and parts without one', async () => {
    const total = async (query: string) => (await agent.get(`/api/prices?${query}`).expect(200)).body.total;
    expect([await total(''), await total('state=stale'), await total('state=expiring')]).toEqual([
      247, 20, 15,
    ]);
    expect(await total('state=expired')).toBe(5);
    expect(await total('kind=resistor')).toBe(141);
    expect([
      await total('usedInConditions=true&state=stale'),
      await total('usedInConditions=true&state=missing'),
    ]).toEqual([1, 1]);
    expect(await total('state=missing&library=team')).toBeGreaterThan(10);
    expect((await agent.get('/api/suppliers')).body.total).toBe(5);
    expect((await agent.get('/api/prices/rates')).body).toMatchObject({ currency: 'EUR', missing: [] });
  });

  it('have a history, each price following the one before', async () => {
    const { items } = (await agent.get('/api/prices?search=TN-610').expect(200)).body;
    const { body } = await agent
      .get(`/api/offers/history?partId=${items[0].part.id}&quantity=100`)
      .expect(200);
    expect(body.items).toHaveLength(4);
    const [first, second, , last] = body.items;
    expect([first.until, last.until]).toEqual([second.from, null]);
  });

  it('give each ranking of its operating conditions a cheapest part among the quietest', async () => {
    const { conditions } = await readDemoData();
    for (const { name, ranking } of conditions) {
      const { body } = await agent.post('/api/rankings/op-amps').send(ranking).expect(200);
      expect([name, body.cheapest?.unitPrice.currency]).toEqual([name, 'EUR']);
      const priced = body.items.filter((item: { unitPrice: object | null }) => item.unitPrice !== null);
      expect(priced.length).toBeGreaterThan(5);
      expect(priced.length).toBeLessThan(body.items.length);
    }
  });
});
