import { evaluateStage, sourceFloor } from '@roothertz/common/noise';
import type { OperatingConditions, RankingRequest } from '@roothertz/common/conditions';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const conditions: OperatingConditions = {
  source: { resistance: 600, inductance: 0, capacitance: 0, temperature: 298.15 },
  ambientTemperature: 298.15,
  band: { lower: 20, upper: 20000, lowPassOrder: 0 },
  stage: { topology: 'non-inverting', gain: 100, gainResistance: 10 },
  referenceFrequency: 1000,
  bandwidthMargin: 3,
  amplifierTemperatureModel: 'estimated',
};

const amplifier = {
  inputType: 'bipolar',
  channels: 1,
  voltageNoise: 1.1e-9,
  voltageNoiseCorner: 3,
  currentNoise: 1.7e-12,
  currentNoiseCorner: 50,
  gainBandwidth: 40e6,
  inputCapacitance: 0,
  inputBiasCurrent: 1e-7,
  minimumStableGain: 1,
  supplyMinimum: 5,
  supplyMaximum: 36,
  supplyCurrent: 4e-3,
};

const part = (partNumber: string, change: object = {}, fields: object = {}) => ({
  manufacturer: 'Weir Semi',
  partNumber,
  amplifier: { ...amplifier, ...change },
  ...fields,
});

const PARTS = [
  part('W-1'),
  part('W-2', { voltageNoise: 1.3e-9 }),
  part('W-3', { voltageNoise: 2.5e-9, currentNoise: null }),
  part('W-4', { voltageNoise: 9e-9, gainBandwidth: null }),
  part('W-5', { gainBandwidth: 3.8e6 }),
  part('W-6', { minimumStableGain: 200 }),
  part('W-7', { supplyMaximum: 5 }),
  part('W-8', {}, { lifecycle: 'obsolete' }),
  part('W-9', {}, { approval: 'not-approved' }),
];

describe('rankings', () => {
  let app: TestApp;
  let librarian: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    const team = await createTeam(app);
    librarian = await signInMember(app, team, ['librarian']);
    for (const body of PARTS) await librarian.agent.post('/api/op-amps').send(body).expect(201);
  });
  afterAll(() => app.close());

  const rank = (body: object) => librarian.agent.post('/api/rankings/op-amps').send(body);
  const request: RankingRequest = {
    conditions,
    filter: { lifecycle: ['active'], approval: ['approved'], supply: { minimum: 10, maximum: 30 } },
    target: { inputNoiseRms: 5e-7 },
  };

  it('ranks the team’s parts by the noise of the whole stage, with the figures of the noise model', async () => {
    const { body } = await rank(request).expect(200);
    expect(body.items.map((item: { part: { partNumber: string } }) => item.part.partNumber)).toEqual([
      'W-1',
      'W-2',
      'W-3',
      'W-4',
    ]);
    const expected = evaluateStage(conditions, amplifier as never, request.filter);
    expect(body.items[0]).toEqual({
      rank: 1,
      part: {
        id: expect.any(String),
        library: 'team',
        manufacturer: 'Weir Semi',
        partNumber: 'W-1',
        package: '',
        lifecycle: 'active',
        approval: 'approved',
        amplifier,
        origins: {},
      },
      ...expected,
      quietSet: true,
      meetsTarget: true,
      unitPrice: null,
    });
    expect(body.floor).toEqual(sourceFloor(conditions));
    expect(body.total).toBe(4);
    expect(body.quietSet.total).toBe(
      body.items.filter(({ quietSet }: { quietSet: boolean }) => quietSet).length,
    );
  });

  it('marks what is unknown and counts an unknown current noise with its lower bound', async () => {
    const { body } = await rank(request);
    const [, , unknownCurrent, unknownSpeed] = body.items;
    expect(unknownCurrent.cautions).toContain('current-noise-unknown');
    expect(unknownCurrent.contributions.amplifierCurrentSource).toBeGreaterThan(0);
    expect(unknownSpeed.cautions).toContain('bandwidth-unknown');
    expect(unknownSpeed.closedLoopBandwidth).toBeNull();
    expect(unknownSpeed.meetsTarget).toBe(false);
  });

  it('counts the excluded parts by reason and lists each with its reason in words', async () => {
    const { body } = await rank(request);
    expect(body.excluded.total).toBe(5);
    const { body: list } = await librarian.agent
      .post('/api/rankings/op-amps/exclusions')
      .send(request)
      .expect(200);
    const details = list.items.map(
      (item: { part: { partNumber: string }; reason: string; detail: string }) => [
        item.part.partNumber,
        item.reason,
        item.detail,
      ],
    );
    expect(list.total).toBe(5);
    expect(details).toEqual([
      ['W-5', 'too-slow', expect.stringMatching(/closed-loop bandwidth 38\skHz, band needs 60\skHz/)],
      ['W-6', 'below-minimum-stable-gain', expect.stringMatching(/200.*100/)],
      ['W-7', 'supply-out-of-range', expect.stringMatching(/5\sV to 5\sV.*10\sV to 30\sV/)],
      ['W-8', 'lifecycle', expect.stringMatching(/obsolete/)],
      ['W-9', 'approval', expect.stringMatching(/not approved/)],
    ]);
  });

  it('gives pages that join, in any sort', async () => {
    for (const sort of ['inputNoiseRms', '-inputNoiseRms', 'noiseFigure', '-closedLoopBandwidth']) {
      const { body: whole } = await rank({ ...request, sort });
      const { body: first } = await rank({ ...request, sort, limit: 2 });
      const { body: rest } = await rank({ ...request, sort, limit: 2, offset: 2 });
      expect([...first.items, ...rest.items]).toEqual(whole.items);
    }
  });

  it('ranks what has been stored since, under a new library revision', async () => {
    const before = (await rank(request)).body;
    const { body: added } = await librarian.agent
      .post('/api/op-amps')
      .send(part('W-0', { voltageNoise: 0.9e-9 }))
      .expect(201);
    const after = (await rank(request)).body;
    expect(after.libraryRevision).not.toBe(before.libraryRevision);
    expect(after.items[0].part.id).toBe(added.id);
    await librarian.agent.delete(`/api/op-amps/${added.id}?version=${added.version}`).expect(204);
    expect((await rank(request)).body.items).toEqual(before.items);
  });

  it('fills in the defaults and takes no filter for all parts', async () => {
    const { body } = await rank({
      conditions: {
        source: { resistance: 600 },
        band: { lower: 20, upper: 20000 },
        stage: { topology: 'non-inverting', gain: 100, gainResistance: 10 },
        referenceFrequency: 1000,
      },
    }).expect(200);
    expect(body.total).toBe(7);
    expect(body.items[0].meetsTarget).toBeNull();
    expect(body.floor).toEqual(sourceFloor(conditions));
  });

  it('answers an empty ranking where every part is excluded', async () => {
    const { body } = await rank({ ...request, filter: { channels: 4 } }).expect(200);
    expect(body).toMatchObject({ total: 0, items: [], quietSet: { total: 0 } });
    expect(body.excluded).toEqual({ total: 9, reasons: [{ reason: 'too-few-channels', count: 9 }] });
  });

  it('shows nothing of another team', async () => {
    const stranger = await signInMember(app, await createTeam(app), ['engineer']);
    const answer = await stranger.agent.post('/api/rankings/op-amps').send(request).expect(200);
    expect(answer.body).toMatchObject({ total: 0, excluded: { total: 0 } });
    const list = await stranger.agent.post('/api/rankings/op-amps/exclusions').send(request).expect(200);
    expect(list.body.total).toBe(0);
  });

  it('draws the map of the quietest parts, cell by cell', async () => {
    const axes = { resistance: { from: 1, to: 1e7, steps: 15 }, frequency: { from: 0.1, to: 1e6, steps: 3 } };
    const { filter } = request;
    const { body } = await librarian.agent
      .post('/api/rankings/quietest-map')
      .send({ conditions, filter, ...axes })
      .expect(200);
    expect(body.resistances).toHaveLength(15);
    expect(body.winners.map((row: number[]) => row.length)).toEqual(Array(15).fill(3));
    const winnerOf = (row: number, cell: number) => body.parts[body.winners[row][cell]]?.partNumber;
    expect([winnerOf(0, 0), winnerOf(14, 0), winnerOf(0, 2)]).toEqual([
      expect.stringMatching(/W-[15]/),
      'W-3',
      'W-4',
    ]);
  });

  it('refuses a map whose axis runs backwards', async () => {
    const axes = { resistance: { from: 10, to: 1, steps: 3 }, frequency: { from: 1, to: 10, steps: 3 } };
    const { body } = await librarian.agent
      .post('/api/rankings/quietest-map')
      .send({ conditions, ...axes })
      .expect(422);
    expect(body.errors).toEqual([{ field: 'resistance.to', message: expect.any(String) }]);
  });

  it('refuses at its beginning a map from a frequency below any band', async () => {
    const axes = { resistance: { from: 1, to: 10, steps: 3 }, frequency: { from: 1e-6, to: 10, steps: 3 } };
    const { body } = await librarian.agent
      .post('/api/rankings/quietest-map')
      .send({ conditions, ...axes })
      .expect(422);
    expect(body.errors).toEqual([{ field: 'frequency.from', message: expect.any(String) }]);
  });

  it.each([
    [400, 'conditions.source.resistance', { source: { resistance: -1 } }],
    [400, 'conditions.source.resistance', { source: { resistance: 1e300 } }],
    [400, 'conditions.source.resistance', { source: { resistance: '600' } }],
    [400, 'conditions.source.colour', { source: { resistance: 1, colour: 'red' } }],
    [400, 'conditions.stage.topology', { stage: { topology: 'sideways' } }],
    [422, 'conditions.stage.gain', { stage: { topology: 'non-inverting', gain: 0.5, gainResistance: 10 } }],
    [422, 'conditions.band.upper', { band: { lower: 20, upper: 20 } }],
    [422, 'conditions.referenceFrequency', { referenceFrequency: 1e6 }],
  ])('answers %i at %s', async (status, field, change) => {
    const { body } = await rank({ ...request, conditions: { ...conditions, ...change } }).expect(status);
    expect(body.errors).toContainEqual({ field, message: expect.any(String) });
  });

  it('refuses a sort that isn’t one', async () => {
    const { body } = await rank({ ...request, sort: 'partNumber; DROP TABLE parts' }).expect(400);
    expect(body.errors[0].field).toBe('sort');
  });
});

describe('POST /api/noise/stage', () => {
  let app: TestApp;
  let engineer: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    engineer = await signInMember(app, await createTeam(app, { plan: 'free' }), ['engineer']);
  });
  afterAll(() => app.close());

  const evaluate = (body: object) => engineer.agent.post('/api/noise/stage').send(body);

  it('answers the figures of one amplifier', async () => {
    const { body } = await evaluate({ conditions, amplifier }).expect(200);
    expect(body).toEqual(evaluateStage(conditions, amplifier as never));
  });

  it('takes what is left out for unknown', async () => {
    const { body } = await evaluate({ conditions, amplifier: { voltageNoise: 5e-9 } }).expect(200);
    expect(body.cautions).toEqual(expect.arrayContaining(['current-noise-unknown', 'bandwidth-unknown']));
  });

  it('refuses a stage whose noise has no end', async () => {
    const stage = { topology: 'transimpedance', feedbackResistance: 1e6, feedbackCapacitance: 0 };
    const source = { resistance: 1e9, capacitance: 1e-11 };
    const band = { ...conditions.band, lowPassOrder: 1 };
    const { body } = await evaluate({
      conditions: { ...conditions, source, stage, band },
      amplifier: { voltageNoise: 5e-9 },
    }).expect(422);
    expect(body.errors[0].field).toBe('amplifier.gainBandwidth');
  });

  it('refuses an amplifier without voltage noise', async () => {
    const { body } = await evaluate({ conditions, amplifier: { voltageNoise: 0 } }).expect(400);
    expect(body.errors[0].field).toBe('amplifier.voltageNoise');
  });
});
