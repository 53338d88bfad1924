import type { ResistorConditions } from '@roothertz/common/conditions';
import { resistorNoise } from '@roothertz/common/noise';
import type { Resistor } from '@roothertz/common/parts';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const conditions: ResistorConditions = {
  resistance: 1000,
  resistanceTolerance: 0.02,
  dcVoltage: 2.5,
  ambientTemperature: 298.15,
  band: { lower: 0.1, upper: 1000, lowPassOrder: 0 },
};

const resistor: Resistor = {
  technology: 'thick-film',
  resistance: 1000,
  tolerance: 0.01,
  temperatureCoefficient: 1e-4,
  powerRating: 0.125,
  noiseIndex: 3,
  temperatureRise: 60,
};

const part = (partNumber: string, change: Partial<Resistor> = {}, fields: object = {}) => ({
  manufacturer: 'Weir Passive',
  partNumber,
  package: '0805',
  resistor: { ...resistor, ...change },
  ...fields,
});

const PARTS = [
  part('R-1', {}, { origins: { noiseIndex: 'measured' } }),
  part('R-2', { technology: 'thin-film', noiseIndex: -35, resistance: 1010 }),
  part('R-3', { technology: 'metal-film', noiseIndex: null, resistance: 990 }),
  part('R-4', { technology: 'thin-film', powerRating: 0.005 }),
  part('R-5', { resistance: 1100 }),
  part('R-6', {}, { lifecycle: 'obsolete' }),
];

describe('rankings of resistors', () => {
  let app: TestApp;
  let librarian: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
    for (const body of PARTS) await librarian.agent.post('/api/resistors').send(body).expect(201);
  });
  afterAll(() => app.close());

  const request = { conditions, filter: { lifecycle: ['active'] } };
  const rank = (body: object) => librarian.agent.post('/api/rankings/resistors').send(body);
  const exclusions = (body: object) => librarian.agent.post('/api/rankings/resistors/exclusions').send(body);
  const numbers = (body: { items: { part: { partNumber: string } }[] }) =>
    body.items.map(({ part: { partNumber } }) => partNumber);

  it('list what lies within the window by total noise, with the figures of the noise model', async () => {
    const { body } = await rank(request).expect(200);
    expect(numbers(body)).toEqual(['R-2', 'R-1', 'R-3']);
    expect(body.total).toBe(3);
    expect(body.items[1]).toEqual({
      rank: 2,
      part: {
        id: expect.stringMatching(/^\d+$/),
        library: 'team',
        manufacturer: 'Weir Passive',
        partNumber: 'R-1',
        package: '0805',
        lifecycle: 'active',
        approval: 'approved',
        resistor,
        origins: { noiseIndex: 'measured' },
      },
      ...resistorNoise(conditions, resistor),
      unitPrice: null,
    });
  });

  it('say what is unknown', async () => {
    const { body } = await rank(request);
    expect(body.items[2]).toMatchObject({ excessRms: null, cautions: ['noise-index-unknown'] });
  });

  it('count the excluded parts by reason and list each with its reason in words', async () => {
    expect((await rank(request)).body.excluded).toEqual({
      total: 2,
      reasons: expect.arrayContaining([
        { reason: 'over-rating', count: 1 },
        { reason: 'lifecycle', count: 1 },
      ]),
    });
    const { body } = await exclusions(request).expect(200);
    expect(body.total).toBe(2);
    expect(body.items).toEqual([
      {
        part: expect.objectContaining({ partNumber: 'R-4' }),
        reason: 'over-rating',
        detail: expect.stringMatching(/would dissipate 6.25\smW, rated for 5\smW/),
      },
      {
        part: expect.objectContaining({ partNumber: 'R-6' }),
        reason: 'lifecycle',
        detail: expect.stringMatching(/obsolete/),
      },
    ]);
    expect((await exclusions({ ...request, limit: 1, offset: 1 })).body).toEqual({
      items: [body.items[1]],
      total: 2,
    });
  });

  it('obey the filter, the sort and the page', async () => {
    const thin = { ...request, filter: { technology: ['thin-film'], package: '08', search: 'weir r-2' } };
    expect(numbers((await rank(thin)).body)).toEqual(['R-2']);
    expect(numbers((await rank({ ...request, sort: '-resistance' })).body)).toEqual(['R-2', 'R-1', 'R-3']);
    expect(numbers((await rank({ ...request, limit: 1, offset: 2 })).body)).toEqual(['R-3']);
    expect(numbers((await rank({ ...request, filter: { library: ['curated'] } })).body)).toEqual([]);
  });

  it('leave out what is less close than asked', async () => {
    const close = { ...request, filter: { ...request.filter, tolerance: 0.005 } };
    const { body } = await rank(close).expect(200);
    expect(body.excluded.reasons).toContainEqual({ reason: 'tolerance', count: 4 });
    const list = (await exclusions(close)).body.items as { reason: string; detail: string }[];
    expect(list.find(({ reason }) => reason === 'tolerance')!.detail).toMatch(/^its tolerance is 1\s%$/);
  });

  it('take 2 % of window, no voltage and room temperature where these are left out', async () => {
    const { resistance, band } = conditions;
    const { body } = await rank({ conditions: { resistance, band } }).expect(200);
    const plain = { ...conditions, dcVoltage: 0 };
    expect(numbers(body)).toEqual(['R-3', 'R-1', 'R-4', 'R-6', 'R-2']);
    expect(body.items[1]).toMatchObject(resistorNoise(plain, resistor));
    expect(body.items[0].excessRms).toBe(0);
  });

  it('hold what has been stored since, under a new library revision', async () => {
    const { body: before } = await rank(request);
    const { body: added } = await librarian.agent
      .post('/api/resistors')
      .send(part('R-0', { technology: 'metal-foil', noiseIndex: -80, resistance: 982 }))
      .expect(201);
    const { body: after } = await rank(request);
    expect(after.libraryRevision).not.toBe(before.libraryRevision);
    expect(after.items[0].part.id).toBe(added.id);
    await librarian.agent.delete(`/api/resistors/${added.id}?version=1`).expect(204);
    expect((await rank(request)).body.items).toEqual(before.items);
  });

  it('show nothing of another team', async () => {
    const stranger = await signInMember(app, await createTeam(app), ['engineer']);
    const { body } = await stranger.agent.post('/api/rankings/resistors').send(request).expect(200);
    expect(body).toMatchObject({ total: 0, excluded: { total: 0, reasons: [] }, items: [] });
    const list = await stranger.agent.post('/api/rankings/resistors/exclusions').send(request).expect(200);
    expect(list.body).toEqual({ items: [], total: 0 });
  });

  it('hold finite figures at the ends of what can be asked', async () => {
    const extremes: Partial<ResistorConditions>[] = [
      { ambientTemperature: 1, band: { lower: 9.9e11, upper: 1e12, lowPassOrder: 0 } },
      { dcVoltage: -1e6 },
      { band: { lower: 999.9999999999999, upper: 1000, lowPassOrder: 0 } },
      { band: { lower: 1e-6, upper: 1e12, lowPassOrder: 10 } },
    ];
    const unrated = part('R-7', { powerRating: null, temperatureRise: null, noiseIndex: 100 });
    const { body: added } = await librarian.agent.post('/api/resistors').send(unrated).expect(201);
    for (const change of extremes) {
      const { body } = await rank({ conditions: { ...conditions, ...change }, filter: { search: 'R-7' } });
      expect(body.total).toBe(1);
      const { thermalRms, excessRms, totalRms, aboveThermal, dissipation } = body.items[0];
      for (const figure of [thermalRms, excessRms, totalRms, aboveThermal, dissipation])
        expect(figure).toEqual(expect.any(Number));
    }
    await librarian.agent.delete(`/api/resistors/${added.id}?version=1`).expect(204);
  });

  it.each([
    [400, 'conditions.resistance', { resistance: 0 }],
    [400, 'conditions.resistanceTolerance', { resistanceTolerance: 0.9 }],
    [400, 'conditions.dcVoltage', { dcVoltage: '2.5' }],
    [400, 'conditions.source', { source: { resistance: 600 } }],
    [400, 'conditions.band', { band: undefined }],
    [422, 'conditions.band.upper', { band: { lower: 20, upper: 20 } }],
  ])('are refused with %i at %s', async (status, field, change) => {
    const { body } = await rank({ ...request, conditions: { ...conditions, ...change } }).expect(status);
    expect(body.errors).toContainEqual({ field, message: expect.any(String) });
  });

  it.each([
    ['sort', { sort: 'price' }],
    ['filter.technology', { filter: { technology: ['cloth'] } }],
    ['filter.inputType', { filter: { inputType: ['jfet'] } }],
    ['limit', { limit: 1001 }],
  ])('are refused with a wrong %s', async (field, change) => {
    const { body } = await rank({ ...request, ...change }).expect(400);
    expect(body.errors[0].field).toBe(field);
  });
});
