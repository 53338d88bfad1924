import { createResistor, resistorBody } from './factories/resistors.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { Part } from '../src/library/entities/part.entity.js';

const WHOLE = {
  manufacturer: 'Halden Passive',
  partNumber: 'HP 4K70',
  description: 'Thin film for the geophone',
  package: '0805',
  lifecycle: 'last-time-buy',
  approval: 'restricted',
  resistor: {
    technology: 'thin-film',
    resistance: 4700,
    tolerance: 0.001,
    temperatureCoefficient: -2.5e-5,
    powerRating: 0.125,
    noiseIndex: -32.5,
    temperatureRise: 55,
  },
  origins: { noiseIndex: 'measured', powerRating: 'maximum' },
};

describe('resistors', () => {
  let app: TestApp;
  let librarian: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
  });
  afterAll(() => app.close());

  it('keep every parameter and origin that is sent', async () => {
    const { body } = await librarian.agent.post('/api/resistors').send(WHOLE).expect(201);
    expect(body).toEqual({
      ...WHOLE,
      id: expect.stringMatching(/^\d+$/),
      library: 'team',
      version: 1,
      updatedAt: expect.any(String),
    });
    expect((await librarian.agent.get(`/api/resistors/${body.id}`).expect(200)).body).toEqual(body);
  });

  it('leave unknown figures unknown, without an origin', async () => {
    const origins = { resistance: 'measured', noiseIndex: 'measured' };
    const { body } = await librarian.agent.post('/api/resistors').send(resistorBody({ origins })).expect(201);
    expect(body.resistor).toEqual({
      technology: null,
      resistance: 4700,
      tolerance: null,
      temperatureCoefficient: null,
      powerRating: null,
      noiseIndex: null,
      temperatureRise: null,
    });
    expect(body.origins).toEqual({ resistance: 'measured' });
  });

  it('change in what is sent and keep the rest', async () => {
    const { id } = await createResistor(librarian, { ...WHOLE, partNumber: 'HP-2' });
    const change = {
      version: 1,
      approval: 'approved',
      resistor: { noiseIndex: null, tolerance: 0.01 },
      origins: { powerRating: null },
    };
    const { body } = await librarian.agent.patch(`/api/resistors/${id}`).send(change).expect(200);
    expect(body).toMatchObject({ manufacturer: WHOLE.manufacturer, approval: 'approved', version: 2 });
    expect(body.resistor).toEqual({ ...WHOLE.resistor, noiseIndex: null, tolerance: 0.01 });
    expect(body.origins).toEqual({});
  });

  it.each([
    ['resistor', { resistor: undefined }],
    ['resistor.resistance', { resistor: {} }],
    ['resistor.resistance', { resistor: { resistance: 0 } }],
    ['resistor.resistance', { resistor: { resistance: null } }],
    ['resistor.resistance', { resistor: { resistance: '4k7' } }],
    ['resistor.tolerance', { resistor: { resistance: 1, tolerance: -0.01 } }],
    ['resistor.powerRating', { resistor: { resistance: 1, powerRating: 0 } }],
    ['resistor.noiseIndex', { resistor: { resistance: 1, noiseIndex: 1e300 } }],
    ['resistor.technology', { resistor: { resistance: 1, technology: 'cloth' } }],
    ['resistor.voltageNoise', { resistor: { resistance: 1, voltageNoise: 1e-9 } }],
    ['amplifier', { amplifier: { voltageNoise: 1e-9 } }],
    ['origins.voltageNoise', { origins: { voltageNoise: 'measured' } }],
  ])('are refused with a wrong %s at that field: %j', async (field, changes) => {
    const before = await app.dataSource.manager.count(Part);
    const { body } = await librarian.agent.post('/api/resistors').send(resistorBody(changes)).expect(400);
    expect(body.code).toBe('request.invalid');
    expect(body.errors.map((error: { field: string }) => error.field)).toContain(field);
    expect(await app.dataSource.manager.count(Part)).toBe(before);
  });

  describe('in a list', () => {
    let lister: TestMember;
    const list = async (query: string) => {
      const { body } = await lister.agent.get(`/api/resistors?${query}`).expect(200);
      return body.items.map(({ partNumber }: { partNumber: string }) => partNumber) as string[];
    };

    beforeAll(async () => {
      lister = await signInMember(app, await createTeam(app), ['librarian']);
      const parts = [
        ['L-1', { resistance: 1000, technology: 'thick-film', noiseIndex: 3 }, {}],
        ['L-2', { resistance: 220, technology: 'thin-film', noiseIndex: -35 }, { approval: 'restricted' }],
        ['L-3', { resistance: 1e6 }, { lifecycle: 'obsolete', description: 'Bias return' }],
      ] as const;
      for (const [partNumber, resistor, fields] of parts)
        await createResistor(lister, { partNumber, resistor, ...fields });
    });

    it('are sorted by any parameter, unknown figures last in both directions', async () => {
      expect(await list('sort=resistance')).toEqual(['L-2', 'L-1', 'L-3']);
      expect(await list('sort=-resistance')).toEqual(['L-3', 'L-1', 'L-2']);
      expect(await list('sort=noiseIndex')).toEqual(['L-2', 'L-1', 'L-3']);
      expect(await list('sort=-noiseIndex')).toEqual(['L-1', 'L-2', 'L-3']);
      expect(await list('sort=technology')).toEqual(['L-1', 'L-2', 'L-3']);
    });

    it('are narrowed to technologies, values, words and the rest', async () => {
      expect(await list('technology=thin-film,thick-film&sort=resistance')).toEqual(['L-2', 'L-1']);
      expect(await list('resistanceFrom=220&resistanceTo=1000&sort=resistance')).toEqual(['L-2', 'L-1']);
      expect(await list('resistanceFrom=1e5')).toEqual(['L-3']);
      expect(await list('resistanceTo=219.9')).toEqual([]);
      expect(await list('search=bias%20kestrel')).toEqual(['L-3']);
      expect(await list('approval=restricted')).toEqual(['L-2']);
      expect(await list('lifecycle=obsolete&library=team')).toEqual(['L-3']);
    });

    it.each([
      ['sort', 'sort=voltageNoise'],
      ['technology', 'technology=cloth'],
      ['resistanceFrom', 'resistanceFrom=0'],
      ['resistanceFrom', 'resistanceFrom=4k7'],
      ['resistanceTo', 'resistanceTo=1e99'],
      ['inputType', 'inputType=jfet'],
    ])('are refused with a wrong %s: %s', async (field, query) => {
      const { body } = await lister.agent.get(`/api/resistors?${query}`).expect(400);
      expect(body.errors.map((error: { field: string }) => error.field)).toEqual([field]);
    });
  });
});
