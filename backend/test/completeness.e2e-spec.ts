import { createOpAmp } from './factories/op-amps.js';
import { createResistor } from './factories/resistors.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const WHOLE = {
  inputType: 'jfet',
  voltageNoise: 3e-9,
  currentNoise: 1e-15,
  gainBandwidth: 1e7,
  inputBiasCurrent: 1e-12,
  minimumStableGain: 1,
  supplyMinimum: 5,
  supplyMaximum: 30,
  supplyCurrent: 1e-3,
};

describe('the completeness of a library', () => {
  let app: TestApp;
  let librarian: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
    const stranger = await signInMember(app, await createTeam(app), ['librarian']);
    await createOpAmp(librarian, { partNumber: 'WHOLE', amplifier: WHOLE });
    await createOpAmp(librarian, { partNumber: 'NO-IQ', amplifier: { ...WHOLE, supplyCurrent: null } });
    await createOpAmp(librarian, { partNumber: 'NO-IN', amplifier: { ...WHOLE, currentNoise: null } });
    await createOpAmp(librarian, {
      partNumber: 'LITTLE',
      amplifier: { voltageNoise: 1e-9, voltageNoiseCorner: null },
      lifecycle: 'obsolete',
    });
    await createOpAmp(stranger, { partNumber: 'FOREIGN' });
  });
  afterAll(() => app.close());

  const get = async (path: string) => (await librarian.agent.get(path).expect(200)).body;
  const numbersOf = ({ items }: { items: { partNumber: string }[] }) => items.map((part) => part.partNumber);

  it('sorts the parts by how much the ranking misses', async () => {
    expect(numbersOf(await get('/api/op-amps?sort=completeness'))).toEqual([
      'LITTLE',
      'NO-IN',
      'NO-IQ',
      'WHOLE',
    ]);
    expect(numbersOf(await get('/api/op-amps?sort=-completeness'))[0]).toBe('WHOLE');
  });

  it('narrows to parts that lack one of the named parameters', async () => {
    expect(numbersOf(await get('/api/op-amps?missing=supplyCurrent&sort=partNumber'))).toEqual([
      'LITTLE',
      'NO-IQ',
    ]);
    const either = await get('/api/op-amps?missing=currentNoise,voltageNoiseCorner&lifecycle=active');
    expect(numbersOf(either)).toEqual(['NO-IN']);
    await librarian.agent.get('/api/op-amps?missing=voltageNoise').expect(400);
    await librarian.agent.get('/api/op-amps?missing=1').expect(400);
  });

  it('counts what is missing among the parts that the filter leaves', async () => {
    const counts = await get('/api/op-amps/completeness');
    expect(counts).toMatchObject({ total: 4, complete: 1 });
    const missing = new Map(
      counts.missing.map(({ parameter, count }: { parameter: string; count: number }) => [parameter, count]),
    );
    expect(counts.missing[0]).toEqual({ parameter: 'currentNoise', count: 2 });
    expect(missing.get('supplyCurrent')).toBe(2);
    expect(missing.get('voltageNoiseCorner')).toBe(1);
    expect(await get('/api/op-amps/completeness?lifecycle=active')).toMatchObject({ total: 3, complete: 1 });
    expect(await get('/api/op-amps/completeness?search=nothing')).toMatchObject({ total: 0, complete: 0 });
  });

  it('is counted for resistors alike', async () => {
    await createResistor(librarian, { resistor: { resistance: 1000, noiseIndex: -20 } });
    const counts = await get('/api/resistors/completeness?resistanceFrom=900');
    expect(counts).toMatchObject({ total: 1, complete: 0 });
    expect(counts.missing).toContainEqual({ parameter: 'noiseIndex', count: 0 });
    expect(counts.missing).toContainEqual({ parameter: 'tolerance', count: 1 });
    expect((await get('/api/resistors?missing=tolerance&sort=completeness')).total).toBe(1);
  });
});
