import { createOpAmp, opAmpBody } from './factories/op-amps.js';
import {
  createTeam,
  signInLibraryTeam,
  signInMember,
  startTestApp,
  type TestApp,
  type TestMember,
} from './support/index.js';
import { Part } from '../src/library/entities/part.entity.js';

describe('op-amps', () => {
  let app: TestApp;
  let librarian: TestMember;
  let engineer: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    ({ librarian, engineer } = await signInLibraryTeam(app));
  });
  afterAll(() => app.close());

  const partCount = () => app.dataSource.manager.count(Part);

  describe('creating', () => {
    it('keeps every parameter and origin that is sent', async () => {
      const sent = {
        manufacturer: 'Halden Semi',
        partNumber: 'HS 2001',
        description: 'Quiet bipolar for coils',
        package: 'SOIC-8',
        lifecycle: 'last-time-buy',
        approval: 'restricted',
        amplifier: {
          inputType: 'bipolar',
          channels: 2,
          voltageNoise: 1.1e-9,
          voltageNoiseCorner: 3,
          currentNoise: 1.7e-12,
          currentNoiseCorner: 50,
          gainBandwidth: 40e6,
          inputCapacitance: 4.7e-12,
          inputBiasCurrent: 1e-7,
          minimumStableGain: 5,
          supplyMinimum: 5,
          supplyMaximum: 36,
          supplyCurrent: 4e-3,
        },
        origins: { voltageNoise: 'measured', supplyCurrent: 'maximum' },
      };
      const { body } = await librarian.agent.post('/api/op-amps').send(sent).expect(201);
      expect(body).toEqual({
        ...sent,
        id: expect.stringMatching(/^\d+$/),
        library: 'team',
        version: 1,
        updatedAt: expect.any(String),
      });
      expect((await engineer.agent.get(`/api/op-amps/${body.id}`).expect(200)).body).toEqual(body);
    });

    it('fills what is left out and leaves unknown figures unknown', async () => {
      const { body } = await librarian.agent.post('/api/op-amps').send(opAmpBody()).expect(201);
      expect(body).toMatchObject({ description: '', package: '', lifecycle: 'active', approval: 'approved' });
      expect(body.amplifier).toEqual({
        inputType: null,
        channels: 1,
        voltageNoise: 1.1e-9,
        voltageNoiseCorner: 0,
        currentNoise: null,
        currentNoiseCorner: 0,
        gainBandwidth: null,
        inputCapacitance: 0,
        inputBiasCurrent: null,
        minimumStableGain: null,
        supplyMinimum: null,
        supplyMaximum: null,
        supplyCurrent: null,
      });
      expect(body.origins).toEqual({});
    });

    it('keeps an origin of a known figure only', async () => {
      const origins = { voltageNoise: 'measured', currentNoise: 'estimated' };
      const { body } = await librarian.agent.post('/api/op-amps').send(opAmpBody({ origins })).expect(201);
      expect(body.origins).toEqual({ voltageNoise: 'measured' });
    });

    it.each([
      ['manufacturer', { manufacturer: '' }],
      ['manufacturer', { manufacturer: 'two\nlines' }],
      ['manufacturer', { manufacturer: 7 }],
      ['partNumber', { partNumber: 'x'.repeat(121) }],
      ['partNumber', { partNumber: undefined }],
      ['partNumber', { partNumber: 'half \ud800' }],
      ['description', { description: null }],
      ['lifecycle', { lifecycle: 'retired' }],
      ['amplifier', { amplifier: undefined }],
      ['amplifier', { amplifier: [] }],
      ['amplifier.voltageNoise', { amplifier: {} }],
      ['amplifier.voltageNoise', { amplifier: { voltageNoise: null } }],
      ['amplifier.voltageNoise', { amplifier: { voltageNoise: 0 } }],
      ['amplifier.voltageNoise', { amplifier: { voltageNoise: '1e-9' } }],
      ['amplifier.currentNoise', { amplifier: { voltageNoise: 1e-9, currentNoise: -1e-12 } }],
      ['amplifier.gainBandwidth', { amplifier: { voltageNoise: 1e-9, gainBandwidth: 1e300 } }],
      ['amplifier.channels', { amplifier: { voltageNoise: 1e-9, channels: 1.5 } }],
      ['amplifier.channels', { amplifier: { voltageNoise: 1e-9, channels: null } }],
      ['amplifier.inputType', { amplifier: { voltageNoise: 1e-9, inputType: 'valve' } }],
      ['amplifier.colour', { amplifier: { voltageNoise: 1e-9, colour: 'red' } }],
      ['origins.voltageNoise', { origins: { voltageNoise: 'hearsay' } }],
      ['library', { library: 'curated' }],
    ])('refuses a wrong %s at that field: %j', async (field, changes) => {
      const before = await partCount();
      const { body } = await librarian.agent.post('/api/op-amps').send(opAmpBody(changes)).expect(400);
      expect(body.code).toBe('request.invalid');
      expect(body.errors.map((error: { field: string }) => error.field)).toContain(field);
      expect(await partCount()).toBe(before);
    });

    it('refuses figures that contradict each other', async () => {
      const amplifier = { voltageNoise: 1e-9, supplyMinimum: 12, supplyMaximum: 5 };
      const { body } = await librarian.agent.post('/api/op-amps').send(opAmpBody({ amplifier })).expect(422);
      expect(body).toMatchObject({ code: 'part.invalid', errors: [{ field: 'amplifier.supplyMaximum' }] });
    });
  });

  describe('changing', () => {
    it('changes what is sent and leaves the rest', async () => {
      const { id } = await createOpAmp(librarian, {
        amplifier: { voltageNoise: 2e-9, currentNoise: 1e-12, gainBandwidth: 1e7 },
        origins: { voltageNoise: 'measured', currentNoise: 'maximum', gainBandwidth: 'estimated' },
      });
      const { body } = await librarian.agent
        .patch(`/api/op-amps/${id}`)
        .send({
          version: 1,
          approval: 'not-approved',
          amplifier: { voltageNoise: 3e-9, currentNoise: null },
          origins: { gainBandwidth: null },
        })
        .expect(200);
      expect(body).toMatchObject({ manufacturer: 'Kestrel Analog', approval: 'not-approved', version: 2 });
      expect(body.amplifier).toMatchObject({ voltageNoise: 3e-9, currentNoise: null, gainBandwidth: 1e7 });
      expect(body.origins).toEqual({ voltageNoise: 'measured' });
      expect((await engineer.agent.get(`/api/op-amps/${id}`)).body).toEqual(body);
    });

    it('refuses a change that contradicts what is stored', async () => {
      const { id } = await createOpAmp(librarian, { amplifier: { voltageNoise: 1e-9, supplyMinimum: 9 } });
      const change = { version: 1, amplifier: { supplyMaximum: 5 } };
      const { body } = await librarian.agent.patch(`/api/op-amps/${id}`).send(change).expect(422);
      expect(body.code).toBe('part.invalid');
      expect((await engineer.agent.get(`/api/op-amps/${id}`)).body.version).toBe(1);
    });

    it.each([
      ['version', {}],
      ['version', { version: 0 }],
      ['version', { version: '1' }],
      ['amplifier.voltageNoise', { version: 1, amplifier: { voltageNoise: null } }],
      ['amplifier.voltageNoiseCorner', { version: 1, amplifier: { voltageNoiseCorner: -3 } }],
      ['updatedAt', { version: 1, updatedAt: '2026-01-01' }],
    ])('refuses a wrong %s at that field: %j', async (field, change) => {
      const { id } = await createOpAmp(librarian);
      const { body } = await librarian.agent.patch(`/api/op-amps/${id}`).send(change).expect(400);
      expect(body.errors).toEqual([expect.objectContaining({ field })]);
    });
  });

  describe('listing', () => {
    let lister: TestMember;
    const list = async (query: string) => {
      const { body } = await lister.agent.get(`/api/op-amps?library=team&${query}`).expect(200);
      return body.items.map(({ partNumber }: { partNumber: string }) => partNumber) as string[];
    };

    beforeAll(async () => {
      lister = await signInMember(app, await createTeam(app), ['librarian']);
      await createOpAmp(lister, {
        partNumber: 'L-1',
        description: '100% tested, low_noise',
        amplifier: { voltageNoise: 3e-9, gainBandwidth: 1e6, inputType: 'jfet' },
      });
      await createOpAmp(lister, {
        partNumber: 'L-2',
        amplifier: { voltageNoise: 1e-9 },
        approval: 'restricted',
      });
      await createOpAmp(lister, {
        partNumber: 'L-3',
        manufacturer: 'Öre Mikro',
        lifecycle: 'obsolete',
        amplifier: { voltageNoise: 2e-9, gainBandwidth: 9e6, inputType: 'cmos' },
      });
    });

    it('sorts by any parameter, unknown figures last in both directions', async () => {
      expect(await list('sort=voltageNoise')).toEqual(['L-2', 'L-3', 'L-1']);
      expect(await list('sort=gainBandwidth')).toEqual(['L-1', 'L-3', 'L-2']);
      expect(await list('sort=-gainBandwidth')).toEqual(['L-3', 'L-1', 'L-2']);
      expect(await list('sort=-partNumber')).toEqual(['L-3', 'L-2', 'L-1']);
    });

    it('pages without losing a part', async () => {
      const first = await lister.agent.get('/api/op-amps?library=team&limit=2').expect(200);
      const rest = await lister.agent.get('/api/op-amps?library=team&limit=2&offset=2').expect(200);
      expect([first.body.total, rest.body.total]).toEqual([3, 3]);
      expect([...first.body.items, ...rest.body.items].map(({ partNumber }) => partNumber)).toEqual(
        await list(''),
      );
    });

    it('finds the parts that hold every word, whatever the case, and takes no wildcards', async () => {
      expect(await list('search=kestrel%20l-1')).toEqual(['L-1']);
      expect(await list('search=TESTED%20100%25')).toEqual(['L-1']);
      expect(await list('search=low_')).toEqual(['L-1']);
      expect(await list('search=w%25n')).toEqual([]);
      expect(await list('search=l_1')).toEqual([]);
      expect(await list('search=l!1')).toEqual([]);
      expect(await list("search=' OR 1=1 --")).toEqual([]);
    });

    it('narrows to libraries, lifecycles, approvals and input types', async () => {
      expect(await list('lifecycle=obsolete')).toEqual(['L-3']);
      expect(await list('approval=restricted')).toEqual(['L-2']);
      expect(await list('inputType=jfet,cmos')).toEqual(['L-1', 'L-3']);
      const { body } = await lister.agent.get('/api/op-amps?library=curated,team&limit=1000').expect(200);
      expect(new Set(body.items.map(({ library }: { library: string }) => library)).size).toBe(2);
    });

    it.each([
      ['limit', 'limit=0'],
      ['limit', 'limit=1001'],
      ['limit', 'limit=ten'],
      ['offset', 'offset=-1'],
      ['sort', 'sort=password_hash'],
      ['sort', 'sort=voltageNoise;DROP'],
      ['lifecycle', 'lifecycle=dead'],
      ['colour', 'colour=red'],
    ])('refuses a wrong %s: %s', async (field, query) => {
      const { body } = await lister.agent.get(`/api/op-amps?${query}`).expect(400);
      expect(body.errors.map((error: { field: string }) => error.field)).toEqual([field]);
    });
  });
});
