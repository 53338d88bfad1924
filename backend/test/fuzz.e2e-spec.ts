import type { OpenAPIObject } from '@nestjs/swagger';
import fc from 'fast-check';
import { Invitation } from '../src/teams/invitations/entities/invitation.entity.js';
import { createOpenApiDocument } from '../src/openapi/document.js';
import { createSupplier } from './factories/offers.js';
import { applyList, checkedList, uploadList } from './factories/imports.js';
import { createOpAmp } from './factories/op-amps.js';
import { createResistor } from './factories/resistors.js';
import { hostileValue, toRequestText } from './fuzz/hostile.js';
import { mutated } from './fuzz/mutated.js';
import { SAMPLES } from './fuzz/samples.js';
import type { PaymentsFake } from '../fakes/payments/payments-fake.js';
import {
  createTeam,
  press,
  signInMember,
  startPaidApp,
  type TestApp,
  type TestMember,
} from './support/index.js';
import { type DocumentedOperation, operationsOf } from './support/operations.js';

/** The same bodies in each run; another seed and more bodies look further, by hand: `FUZZ_SEED=7 FUZZ_BODIES=2000`. */
const FUZZ = {
  seed: Number(process.env.FUZZ_SEED ?? 1928),
  numRuns: Number(process.env.FUZZ_BODIES ?? 60),
};
/**
 * What takes a password, a token or a signature, which can't be guessed, and what a team that has paid can't do a
 * second time.
 */
const REFUSED =
  /sign-in|auth\/confirm|reset-password|account\/|\{token\}|billing\/(trial|checkout|webhook|seats)$|\/standings(\/|$)/;
/** Stands for the id of what the operation's sample made. */
const OWN = 'own';
const IDS = [
  OWN,
  OWN,
  OWN,
  '1',
  '2',
  '0',
  '-1',
  'x',
  '1e999',
  '99999999999999999999',
  '%00',
  '%27%20OR%201=1',
];

describe('whatever is sent', () => {
  let app: TestApp;
  let payments: PaymentsFake;
  let member: TestMember;
  let operations: DocumentedOperation[];
  const made = new Map<string, string>();

  beforeAll(async () => {
    ({ app, payments } = await startPaidApp());
    const team = await createTeam(app, { plan: 'free' });
    member = await signInMember(app, team, ['admin', 'librarian', 'engineer']);
    await buyPlan();
    await createOpAmp(member);
    await createResistor(member);
    await createSupplier(member);
    await makeImports();
    await makeInvitation();
    const document: OpenAPIObject = createOpenApiDocument(app.nest);
    operations = operationsOf(document)
      .filter(({ method }) => ['post', 'put', 'patch'].includes(method))
      .filter(takesJson);
  });
  afterAll(async () => {
    await payments.close();
    await app.close();
  });

  async function buyPlan(): Promise<void> {
    const { body } = await member.agent.post('/api/billing/checkout').send({ seats: 3 }).expect(201);
    await press(body.url, { card: 'pays' });
    await payments.settled();
  }

  /** Each operation on an import has one in the state that it takes. */
  async function makeImports(): Promise<void> {
    const list = (number: string) => `maker,mpn,en\nVireo,${number},2\n`;
    const steps = { mapping: uploadList, cancel: uploadList, apply: checkedList, undo: applyList };
    for (const [step, make] of Object.entries(steps))
      made.set(`/api/imports/${step}`, (await make(member, 'op-amps', list(step))).id);
  }

  /** One that was sent long enough ago to be sent again. */
  async function makeInvitation(): Promise<void> {
    const invited = { email: 'invited@weir.example', roles: ['reviewer'] };
    const { body } = await member.agent.post('/api/team/invitations').send(invited).expect(201);
    await app.dataSource.manager.update(Invitation, { id: body.id }, { sentAt: new Date('2026-01-01') });
    made.set('/api/team/invitations/resend', body.id);
  }

  it('has a sample for every operation that takes a body', () => {
    expect(Object.keys(SAMPLES).sort()).toEqual(operations.map(nameOf).sort());
  });

  it('takes every sample as it stands but what must be refused', async () => {
    for (const operation of operations)
      for (const sample of SAMPLES[nameOf(operation)]) {
        const status = await send(operation, sample, OWN);
        expect([nameOf(operation), status < 300]).toEqual([nameOf(operation), !REFUSED.test(operation.path)]);
      }
  });

  it.each(Object.keys(SAMPLES))('never makes %s fail, and is refused with problem details', async (name) => {
    const operation = operations.find((candidate) => nameOf(candidate) === name)!;
    const body = fc.oneof(
      { weight: 5, arbitrary: fc.constantFrom(...SAMPLES[nameOf(operation)]).chain(mutated) },
      { weight: 1, arbitrary: hostileValue },
    );
    const property = fc.asyncProperty(body, fc.constantFrom(...IDS), async (value, id) => {
      expect(await send(operation, value, id)).toBeLessThan(500);
    });
    await fc.assert(property, FUZZ);
  });

  /** The member never signs out: nothing could be tried after that. */
  async function send({ method, path }: DocumentedOperation, body: unknown, id: string): Promise<number> {
    const own = made.get(path.replace('/{id}', '')) ?? '1';
    const place = path.replace('{id}', id === OWN ? own : id);
    const asker = path.endsWith('/sign-out') ? app.request : member.agent;
    const { status, headers, text } = await asker[method](place)
      .set('Content-Type', 'application/json')
      .send(toRequestText(body));
    if (status >= 400) {
      expect(headers['content-type']).toMatch(/^application\/problem\+json/);
      expect(JSON.parse(text)).toMatchObject({ status, code: expect.any(String) });
      expect(text).not.toMatch(/node_modules|\.ts:\d|SELECT |INSERT |UPDATE /);
    }
    if (status === 201) made.set(path, (JSON.parse(text) as { id: string }).id);
    return status;
  }
});

/** Forms with files are tried where lists are uploaded. */
function takesJson({ operation }: DocumentedOperation): boolean {
  return !JSON.stringify(operation.requestBody ?? {}).includes('multipart/form-data');
}

function nameOf({ method, path }: DocumentedOperation): string {
  return `${method} ${path}`;
}
