import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { KeptPair } from '../src/parts/entities/kept-pair.entity.js';
import { createOpAmp } from './factories/op-amps.js';
import { createResistor } from './factories/resistors.js';
import { signInLibraryTeam, startTestApp, type TestApp, type TestMember } from './support/index.js';

interface Pair {
  likelihood: number;
  reasons: string[];
  one: { id: string; library: string; partNumber: string };
  other: { id: string; library: string; partNumber: string };
}

describe('parts that may be one', () => {
  let app: TestApp;
  let librarian: TestMember;
  let engineer: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    ({ librarian, engineer, stranger } = await signInLibraryTeam(app));
  });
  afterAll(() => app.close());

  const list = async (query = '', { agent } = engineer, kind = 'op-amps') => {
    const { body } = await agent.get(`/api/${kind}/duplicates${query}`).expect(200);
    return body as { items: Pair[]; total: number };
  };
  const numbersOf = ({ items }: { items: Pair[] }) =>
    items.map(({ one, other }) => [one.partNumber, other.partNumber].sort());
  const decide = (step: string, body: object, { agent } = librarian) =>
    agent.post(`/api/duplicates/${step}`).send(body);

  it('are none in a team without parts', async () => {
    expect(await list()).toEqual({ items: [], total: 0 });
  });

  it('are found in the own library and against the curated one, the own part first', async () => {
    const { body } = await engineer.agent.get('/api/op-amps?library=curated&limit=1').expect(200);
    const [{ manufacturer, partNumber, amplifier }] = body.items;
    await createOpAmp(librarian, { manufacturer, partNumber, amplifier });
    await createOpAmp(librarian, { manufacturer: 'Weir Semi', partNumber: 'WS-10' });
    await createOpAmp(librarian, { manufacturer: 'Weir Semi', partNumber: 'WS-1O-TR' });
    await createOpAmp(stranger, { manufacturer: 'Weir Semi', partNumber: 'WS-10/TR' });
    const found = await list();
    expect(numbersOf(found)[0]).toEqual(['WS-10', 'WS-1O-TR']);
    expect(found.items.find(({ reasons }) => reasons.includes('same-part'))).toMatchObject({
      one: { library: 'team', partNumber },
      other: { library: 'curated', partNumber },
    });
    expect(JSON.stringify(found)).not.toContain('WS-10/TR');
    const page = await list('?limit=1&offset=1');
    expect(page.items).toEqual([found.items[1]]);
    expect(page.total).toBe(found.total);
  });

  it('are kept both where a librarian says so, until it is taken back', async () => {
    const one = await createOpAmp(librarian, { manufacturer: 'Lock & Co', partNumber: 'LC-5' });
    const other = await createOpAmp(librarian, { manufacturer: 'Lock', partNumber: 'LC-5/SOIC-8' });
    const pair = { oneId: other.id, otherId: one.id };
    const isListed = async () => numbersOf(await list()).some((numbers) => numbers.includes('LC-5'));
    expect(await isListed()).toBe(true);
    await decide('keep-both', pair, engineer).expect(403);
    await decide('keep-both', pair).expect(204);
    await decide('keep-both', pair).expect(204);
    expect(await isListed()).toBe(false);
    const kept = await app.dataSource.manager.find(KeptPair);
    expect(kept).toMatchObject([
      { oneId: Number(one.id), otherId: Number(other.id), decidedById: librarian.caller.userId },
    ]);
    await decide('ask-again', pair).expect(204);
    expect(await isListed()).toBe(true);
    expect(await app.dataSource.manager.count(KeptPair)).toBe(0);
    await decide('ask-again', pair).expect(204);
    const trail = await app.dataSource.manager.find(AuditEntry, { where: { objectKind: 'pair' } });
    expect(trail).toMatchObject([
      {
        action: 'pair.kept',
        objectLabel: 'Lock LC-5/SOIC-8 and Lock & Co LC-5',
        userId: librarian.caller.userId,
      },
      { action: 'pair.asked-again' },
    ]);
  });

  it('can’t be decided of what isn’t a pair of readable parts', async () => {
    const { id } = await createOpAmp(librarian);
    const foreign = await createOpAmp(stranger);
    await decide('keep-both', { oneId: id, otherId: foreign.id }).expect(404);
    const { body } = await decide('keep-both', { oneId: id, otherId: id }).expect(400);
    expect(body.errors[0].field).toBe('otherId');
    expect(await app.dataSource.manager.count(KeptPair)).toBe(0);
  });

  it('are found anew after each change, and are none where one is retired', async () => {
    await createResistor(librarian, { manufacturer: 'Weir', partNumber: 'WR-4K7' });
    const resistors = async () => numbersOf(await list('', librarian, 'resistors'));
    expect(await resistors()).toEqual([]);
    const { id } = await createResistor(librarian, { manufacturer: 'Weir Inc', partNumber: 'WR 4K7 REEL' });
    expect(await resistors()).toEqual([['WR 4K7 REEL', 'WR-4K7']]);
    const parts = [{ id, version: 1, lifecycle: 'obsolete', approval: 'not-approved' }];
    await librarian.agent.patch('/api/resistors').send({ parts }).expect(200);
    expect(await resistors()).toEqual([]);
  });
});
