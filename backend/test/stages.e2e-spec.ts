import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const conditions = {
  source: { resistance: 200 },
  band: { lower: 20, upper: 20_000 },
  stage: { topology: 'non-inverting', gain: 100, gainTolerance: 0.02 },
  referenceFrequency: 1000,
};

const amplifier = {
  voltageNoise: 3e-9,
  currentNoise: 1e-12,
  gainBandwidth: 1e8,
  minimumStableGain: 1,
  channels: 2,
};

describe('rankings of whole stages', () => {
  let app: TestApp;
  let librarian: TestMember;

  const addOpAmp = (partNumber: string, change: object = {}) =>
    librarian.agent
      .post('/api/op-amps')
      .send({ manufacturer: 'Weir Semi', partNumber, amplifier: { ...amplifier, ...change } })
      .expect(201);
  const addResistor = (partNumber: string, resistance: number, fields: object = {}) =>
    librarian.agent
      .post('/api/resistors')
      .send({ manufacturer: 'Weir Ohmic', partNumber, resistor: { resistance, noiseIndex: -20 }, ...fields })
      .expect(201);
  const rank = (change: object = {}, stage: object = {}) =>
    librarian.agent
      .post('/api/rankings/stages')
      .send({ conditions: { ...conditions, stage: { ...conditions.stage, ...stage } }, ...change });

  beforeAll(async () => {
    app = await startTestApp();
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
    await addOpAmp('W-1');
    await addOpAmp('W-2', { voltageNoise: 1e-9 });
    await addResistor('R-10', 10);
    await addResistor('R-100', 100);
    await addResistor('R-1k', 1000);
    await addResistor('R-10k', 10_000, { approval: 'restricted' });
  });
  afterAll(() => app.close());

  it('gives each op-amp the resistors that make it quietest', async () => {
    const { body } = await rank().expect(200);
    expect(body).toMatchObject({ total: 2, pairs: 2, nearestGain: 101, excluded: { total: 0 } });
    expect(body.items.map((item: { part: { partNumber: string } }) => item.part.partNumber)).toEqual([
      'W-2',
      'W-1',
    ]);
    expect(body.items[0]).toMatchObject({
      rank: 1,
      channelsInParallel: 1,
      signalGain: expect.closeTo(101, 1),
      network: {
        gain: 101,
        gainResistor: { partNumber: 'R-10', resistance: 10, library: 'team' },
        feedbackResistor: { partNumber: 'R-1k', resistance: 1000 },
      },
    });
  });

  it('takes a larger network where the output can’t drive the small one', async () => {
    const network = { minimumTotal: 2000, maximumTotal: 100_000 };
    const { body } = await rank({}, { network }).expect(200);
    expect(body.items[0].network.gainResistor.partNumber).toBe('R-100');
  });

  it('uses only the resistors that the filter allows, and says the nearest gain', async () => {
    const network = { minimumTotal: 2000, maximumTotal: 100_000 };
    const { body } = await rank({ resistorFilter: { approval: ['approved'] } }, { network }).expect(200);
    expect(body).toMatchObject({ total: 0, pairs: 0, items: [], nearestGain: 2 });
  });

  it('joins channels of one package where that is quieter', async () => {
    const { body } = await rank({}, { parallelMaximum: 4 }).expect(200);
    expect(body.items[0].channelsInParallel).toBe(2);
    const { body: single } = await rank();
    expect(body.items[0].inputNoiseRms).toBeLessThan(single.items[0].inputNoiseRms);
  });

  it('counts the excess noise that a direct output voltage drives', async () => {
    const { body } = await rank({}, { outputVoltage: 10 }).expect(200);
    expect(body.items[0].contributions.excess).toBeGreaterThan(0);
  });

  it.each([
    [400, 'conditions.stage.gainTolerance', { gainTolerance: 2 }],
    [400, 'conditions.stage.gainResistance', { gainResistance: 10 }],
    [422, 'conditions.stage.network.maximumTotal', { network: { minimumTotal: 500, maximumTotal: 400 } }],
    [422, 'conditions.stage.gain', { gain: 0.5 }],
  ])('answers %i at %s', async (status, field, stage) => {
    const { body } = await rank({}, stage).expect(status);
    expect(body.errors).toContainEqual({ field, message: expect.any(String) });
  });

  it('shows nothing of another team', async () => {
    const stranger = await signInMember(app, await createTeam(app), ['engineer']);
    const { body } = await stranger.agent.post('/api/rankings/stages').send({ conditions }).expect(200);
    expect(body).toMatchObject({ total: 0, pairs: 0, nearestGain: null });
  });
});
