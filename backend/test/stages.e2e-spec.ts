import { createOffer, createSupplier } from './factories/offers.js';
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
  const ids: Record<string, string> = {};

  const add = async (path: string, body: { partNumber: string }) => {
    const { body: part } = await librarian.agent.post(path).send(body).expect(201);
    ids[body.partNumber] = part.id;
  };
  const addOpAmp = (partNumber: string, change: object = {}) =>
    add('/api/op-amps', {
      manufacturer: 'Weir Semi',
      partNumber,
      amplifier: { ...amplifier, ...change },
    } as { partNumber: string });
  const addResistor = (partNumber: string, resistance: number, fields: object = {}) =>
    add('/api/resistors', {
      manufacturer: 'Weir Ohmic',
      partNumber,
      resistor: { resistance, noiseIndex: -20, technology: 'thin-film' },
      ...fields,
    } as { partNumber: string });
  const rank = (change: object = {}, stage: object = {}) =>
    librarian.agent
      .post('/api/rankings/stages')
      .send({ conditions: { ...conditions, stage: { ...conditions.stage, ...stage } }, ...change });

  beforeAll(async () => {
    app = await startTestApp();
    librarian = await signInMember(app, await createTeam(app), ['librarian', 'purchasing']);
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
        gainResistor: {
          partNumber: 'R-10',
          resistance: 10,
          library: 'team',
          noiseIndex: -20,
          technology: 'thin-film',
        },
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

  it('finds the feedback resistor of a transimpedance stage, however large, where no limit is stated', async () => {
    await addResistor('R-1M', 1e6);
    const { body } = await librarian.agent
      .post('/api/rankings/stages')
      .send({
        conditions: {
          ...conditions,
          source: { resistance: 1e9, capacitance: 1e-11 },
          stage: { topology: 'transimpedance', feedbackResistance: 1e6, feedbackCapacitance: 'auto' },
        },
      })
      .expect(200);
    expect(body).toMatchObject({ total: 2, pairs: 1, nearestGain: 1e6 });
    expect(body.items[0].network).toMatchObject({
      gainResistor: null,
      feedbackResistor: { partNumber: 'R-1M' },
    });
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

  it('ranks an op-amp with a direct output voltage and noise indices as the stage that was found', async () => {
    const { body } = await rank({}, { outputVoltage: 10 }).expect(200);
    const [found] = body.items;
    const { gainTolerance: _tolerance, ...stage } = conditions.stage;
    const { gainResistor, feedbackResistor, gain } = found.network;
    const given = {
      ...stage,
      gain,
      gainResistance: gainResistor.resistance,
      outputVoltage: 10,
      gainNoiseIndex: gainResistor.noiseIndex,
      feedbackNoiseIndex: feedbackResistor.noiseIndex,
    };
    const { body: alone } = await librarian.agent
      .post('/api/rankings/op-amps')
      .send({ conditions: { ...conditions, stage: given }, filter: { search: found.part.partNumber } })
      .expect(200);
    expect(alone.items[0].contributions.excess).toBeCloseTo(found.contributions.excess, 15);
  });

  it('takes only resistors as close as asked, and none of unknown tolerance', async () => {
    const pairs = async (tolerance: number) =>
      (await rank({ resistorFilter: { tolerance } }).expect(200)).body.pairs;
    expect(await pairs(0.01)).toBe(0);
    await addResistor('R-12', 12, { resistor: { resistance: 12, tolerance: 0.001 } });
    await addResistor('R-1k2', 1200, { resistor: { resistance: 1200, tolerance: 0.01 } });
    expect([await pairs(0.01), await pairs(0.005)]).toEqual([1, 0]);
    const { body } = await rank({ resistorFilter: { tolerance: 0.01 } });
    expect(body.items[0].network).toMatchObject({
      gainResistor: { partNumber: 'R-12', tolerance: 0.001 },
      feedbackResistor: { partNumber: 'R-1k2', tolerance: 0.01 },
    });
    for (const partNumber of ['R-12', 'R-1k2'])
      await librarian.agent.delete(`/api/resistors/${ids[partNumber]}?version=1`).expect(204);
    const { body: problem } = await rank({ resistorFilter: { tolerance: 2 } }).expect(400);
    expect(problem.errors[0].field).toBe('resistorFilter.tolerance');
  });

  it('says what a stage takes that isn’t sought', async () => {
    const instrumentation = { topology: 'instrumentation', gain: 201, network: { minimumTotal: 500 } };
    const { body } = await rank({}, instrumentation).expect(200);
    expect(body.items[0].unsought).toEqual([{ place: 'difference', pieces: 4, value: 10_000 }]);
    expect((await rank().expect(200)).body.items[0].unsought).toEqual([]);
  });

  it.each([
    [400, 'conditions.stage.gainTolerance', { gainTolerance: 2 }],
    [400, 'conditions.stage.feedbackNoiseIndex', { feedbackNoiseIndex: -20 }],
    [400, 'conditions.stage.gainResistance', { gainResistance: 10 }],
    [422, 'conditions.stage.network.maximumTotal', { network: { minimumTotal: 500, maximumTotal: 400 } }],
    [422, 'conditions.stage.gain', { gain: 0.5 }],
  ])('answers %i at %s', async (status, field, stage) => {
    const { body } = await rank({}, stage).expect(status);
    expect(body.errors).toContainEqual({ field, message: expect.any(String) });
  });

  it.each([
    ['sort', { sort: 'noiseFigure' }],
    ['within', { within: -1 }],
    ['quantity', { quantity: 0 }],
  ])('answers 400 at %s', async (field, body) => {
    const { body: problem } = await rank(body).expect(400);
    expect(problem.errors).toContainEqual({ field, message: expect.any(String) });
  });

  it('shows nothing of another team', async () => {
    const stranger = await signInMember(app, await createTeam(app), ['engineer']);
    const { body } = await stranger.agent.post('/api/rankings/stages').send({ conditions }).expect(200);
    expect(body).toMatchObject({ total: 0, pairs: 0, nearestGain: null });
  });

  describe('with prices', () => {
    const row = ({
      part,
      unitPrice,
    }: {
      part: { partNumber: string };
      unitPrice: { amount: string } | null;
    }) => [part.partNumber, unitPrice && unitPrice.amount];

    beforeAll(async () => {
      await addOpAmp('W-3', { voltageNoise: 3.01e-9, channels: 1 });
      const supplierId = (await createSupplier(librarian, 'Brook & Weir')).id;
      const price = (partNumber: string, breaks: [number, string][], changes: object = {}) =>
        createOffer(
          librarian,
          { partId: ids[partNumber], supplierId },
          {
            breaks: breaks.map(([minimumQuantity, unitPrice]) => ({ minimumQuantity, unitPrice })),
            ...changes,
          },
        );
      await price('W-2', [[1, '8.00']]);
      await price('W-1', [[1, '1.50']]);
      for (const partNumber of ['R-10', 'R-100', 'R-1k']) await price(partNumber, [[1, '0.10']]);
      await price('R-10k', [
        [1, '0.02'],
        [200, '0.01'],
      ]);
    });

    it('adds up what a stage costs, and says which of its parts is without a price', async () => {
      const { body } = await rank({ quantity: 10 }).expect(200);
      expect(body.items.map(row)).toEqual([
        ['W-2', '8.2000'],
        ['W-1', '1.7000'],
        ['W-3', null],
      ]);
      expect(body.items[0].unitPrice).toEqual({
        amount: '8.2000',
        currency: 'EUR',
        total: '82.0000',
        isStale: false,
      });
      expect(body.items[0].pieces).toMatchObject([
        { places: ['op-amp'], pieces: 1, unitPrice: { total: '80.0000' } },
        { places: ['gain'], pieces: 1, unitPrice: { total: '1.0000' } },
        { places: ['feedback'], pieces: 1, unitPrice: { total: '1.0000' } },
      ]);
      expect(body.items[2].pieces[0]).toMatchObject({ places: ['op-amp'], unitPrice: null });
    });

    it('counts each resistor as often as it is bought, both places of one part together', async () => {
      const stage = { topology: 'difference', gain: 100, gainTolerance: 0.1 };
      const { body } = await rank({ quantity: 50 }, stage).expect(200);
      expect(body.items[0].pieces.map((piece: { pieces: number }) => piece.pieces)).toEqual([1, 2, 2]);
      const same = await rank({ quantity: 50 }, { gain: 2, network: { minimumTotal: 15_000 } }).expect(200);
      expect(same.body.items[0].pieces.slice(1)).toMatchObject([
        { places: ['gain', 'feedback'], pieces: 2, unitPrice: { orderQuantity: 100, total: '2.0000' } },
      ]);
    });

    it('sorts by price within so many dB of the quietest, stages without a price last', async () => {
      const order = async (within: number) => {
        const { body } = await rank({ sort: 'unitPrice', within, quantity: 100 }).expect(200);
        expect(body.total).toBe(body.items.length);
        return body.items.map(row);
      };
      expect(await order(0.5)).toEqual([['W-2', '8.2000']]);
      expect(await order(20)).toEqual([
        ['W-1', '1.6200'],
        ['W-2', '8.1200'],
        ['W-3', null],
      ]);
    });

    it('draws the frontier: each stage cheaper than all that are as quiet', async () => {
      const { body } = await rank({ quantity: 100 }).expect(200);
      const network = ({ gainResistor, feedbackResistor }: Record<string, { partNumber: string }>) =>
        `${gainResistor.partNumber} ${feedbackResistor.partNumber}`;
      expect(
        body.frontier.map((stage: never) => [...row(stage), network((stage as { network: never }).network)]),
      ).toEqual([
        ['W-2', '8.2000', 'R-10 R-1k'],
        ['W-2', '8.1200', 'R-100 R-10k'],
        ['W-1', '1.7000', 'R-10 R-1k'],
        ['W-1', '1.6200', 'R-100 R-10k'],
      ]);
    });

    it('shows no price to another team', async () => {
      const stranger = await signInMember(app, await createTeam(app), ['engineer']);
      await app.dataSource.query('INSERT INTO libraries (team_id) VALUES (NULL)');
      await app.dataSource.query(
        'UPDATE parts SET library_id = (SELECT id FROM libraries WHERE team_id IS NULL)',
      );
      await app.dataSource.query('UPDATE libraries SET revision = revision + 1');
      const { body } = await stranger.agent.post('/api/rankings/stages').send({ conditions }).expect(200);
      expect(body.items.map(row)).toEqual([
        ['W-2', null],
        ['W-1', null],
        ['W-3', null],
      ]);
      expect(body.frontier).toEqual([]);
    });
  });
});
