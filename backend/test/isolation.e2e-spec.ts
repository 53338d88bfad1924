import { readFile } from 'node:fs/promises';
import type { OpenAPIObject } from '@nestjs/swagger';
import { ROLES } from '@roothertz/common/access';
import { saveConditions } from './factories/conditions.js';
import { checkedList } from './factories/imports.js';
import { createOffer, createSupplier } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { changedStandings } from './factories/standings.js';
import { createResistor } from './factories/resistors.js';
import { SAMPLES } from './fuzz/samples.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { type DocumentedOperation, operationsOf } from './support/operations.js';

const DOCUMENT = new URL('../openapi.json', import.meta.url);

/** Stands in everything that the one team calls by a name, and so in no answer to the other. */
const MARK = 'Zirkon-7731';

const INVITED = { email: `${MARK.toLowerCase()}@weir.example`, roles: ['engineer'] };

/** Paths whose parameter is a secret that opens them, whoever asks. */
const SECRET_PATHS = /\{token\}/;

describe('two teams', () => {
  let app: TestApp;
  let operations: DocumentedOperation[];
  let theirs: TestMember;
  let mine: TestMember;
  /** Ids of the other team's objects, by the path of their kind. */
  const ids: Record<string, string> = {};
  /** Ids of the other team's objects, by the field of a body that names one. */
  const named: Record<string, string | string[]> = {};

  beforeAll(async () => {
    app = await startTestApp();
    operations = operationsOf(JSON.parse(await readFile(DOCUMENT, 'utf8')) as OpenAPIObject);
    theirs = await signInMember(app, await createTeam(app), [...ROLES]);
    mine = await signInMember(app, await createTeam(app), [...ROLES]);
    await fill();
  });
  afterAll(() => app.close());

  async function fill(): Promise<void> {
    const userId = theirs.caller.userId;
    await app.dataSource.query('UPDATE users SET name = ? WHERE id = ?', [MARK, userId]);
    await theirs.agent.patch('/api/team').send({ name: MARK }).expect(200);
    const part = await createOpAmp(theirs, { manufacturer: MARK });
    const supplier = await createSupplier(theirs, MARK);
    const offer = await createOffer(theirs, { partId: part.id, supplierId: supplier.id });
    const list = await checkedList(theirs, 'op-amps', `maker,mpn,en\n${MARK},M-1,2\n`);
    const sessions = await theirs.agent.get('/api/auth/sessions').expect(200);
    Object.assign(ids, {
      '/api/auth/sessions': sessions.body.items[0].id,
      '/api/conditions': (await saveConditions(theirs, { name: MARK })).id,
      '/api/imports': list.id,
      '/api/offers': offer.id,
      '/api/op-amps': part.id,
      '/api/parts': part.id,
      '/api/resistors': (await createResistor(theirs, { manufacturer: MARK })).id,
      '/api/team/members': String(userId),
      '/api/team/invitations': (await theirs.agent.post('/api/team/invitations').send(INVITED).expect(201))
        .body.id,
    });
    for (const kind of ['op-amps', 'resistors'])
      ids[`/api/${kind}/standings`] = await changedStandings(theirs, kind);
    Object.assign(named, {
      oneId: part.id,
      otherId: part.id,
      partId: part.id,
      partIds: [part.id],
      supplierId: supplier.id,
      memberId: String(userId),
      teamId: String(theirs.caller.teamId),
      ids: [offer.id],
    });
  }

  const nameOf = ({ method, path }: DocumentedOperation) => `${method} ${path}`;
  const withIds = () => operations.filter(({ path }) => path.includes('{') && !SECRET_PATHS.test(path));
  const lists = () => operations.filter(({ method, path }) => method === 'get' && !path.includes('{'));
  const sampleOf = (operation: DocumentedOperation) => SAMPLES[nameOf(operation)]?.[0];

  function ask(member: TestMember, { method, path, operation }: DocumentedOperation, body?: unknown) {
    const [collection] = path.split('/{');
    const place = path.replace(/\{\w+\}/, ids[collection]);
    const needed = (operation.parameters ?? []).flatMap((parameter) =>
      'in' in parameter && parameter.in === 'query' && parameter.required ? [parameter.name] : [],
    );
    const query = Object.fromEntries(needed.map((name) => [name, named[name] ?? 1]));
    const request = member.agent[method](place).query(query);
    return body === undefined ? request : request.send(body as object);
  }

  it('are known to have an object for every route that takes an id', () => {
    const unknown = withIds().filter(({ path }) => ids[path.split('/{')[0]] === undefined);
    expect(unknown.map(nameOf)).toEqual([]);
    expect(withIds().length).toBeGreaterThan(15);
  });

  it('don’t reach each other’s objects over any route: 404 everywhere, and nothing changes', async () => {
    const reads = withIds().filter(({ method }) => method === 'get');
    const standing = () => Promise.all(reads.map(async (read) => (await ask(theirs, read).expect(200)).text));
    const before = await standing();
    expect(before.filter((text) => text.includes(MARK)).length).toBeGreaterThan(5);
    const answers = [];
    for (const operation of withIds()) {
      const { status } = await ask(mine, operation, sampleOf(operation));
      answers.push([nameOf(operation), status]);
    }
    expect(answers.filter(([, status]) => status !== 404)).toEqual([]);
    expect(await standing()).toEqual(before);
  });

  it('can’t name each other’s objects in a body', async () => {
    const unknown = new Set<string>();
    const answers = [];
    for (const operation of operations.filter(({ path }) => !path.includes('{'))) {
      const sample = sampleOf(operation);
      for (const field of fieldsOfIds(sample)) {
        if (named[field] === undefined) unknown.add(`${nameOf(operation)} ${field}`);
        else {
          const { status } = await ask(mine, operation, withField(sample, field, named[field]));
          answers.push([nameOf(operation), field, status]);
        }
      }
    }
    expect([...unknown]).toEqual([]);
    expect(answers.length).toBeGreaterThan(4);
    expect(answers.filter(([, , status]) => status !== 404)).toEqual([]);
  });

  it('see in no list, export or ranking what the other has', async () => {
    const rankings = operations.filter(({ path }) => path.startsWith('/api/rankings/'));
    const shown = [];
    for (const operation of [...lists(), ...rankings]) {
      const { status, text } = await ask(mine, operation, sampleOf(operation));
      if (![200, 404].includes(status) || text.includes(MARK)) shown.push(nameOf(operation));
    }
    expect(shown).toEqual([]);
    const own = await Promise.all(lists().map(async (list) => (await ask(theirs, list)).text));
    expect(own.filter((text) => text.includes(MARK)).length).toBeGreaterThan(8);
  });
});

/** The fields of a body that name another object. */
function fieldsOfIds(body: unknown): string[] {
  if (typeof body !== 'object' || body === null) return [];
  const own = Object.keys(body).filter((field) => /^ids$|Ids?$/.test(field));
  return [...own, ...Object.values(body).flatMap(fieldsOfIds)];
}

function withField(body: unknown, field: string, value: unknown): unknown {
  if (Array.isArray(body)) return body.map((item) => withField(item, field, value));
  if (typeof body !== 'object' || body === null) return body;
  const entries = Object.entries(body).map(([key, item]) => [
    key,
    key === field ? value : withField(item, field, value),
  ]);
  return Object.fromEntries(entries);
}
