import { RequestMethod } from '@nestjs/common';
import { METHOD_METADATA } from '@nestjs/common/constants.js';
import { MetadataScanner, ModulesContainer } from '@nestjs/core';
import { ACCESS_KEY } from '../src/shared/access/access.decorator.js';
import { PUBLIC_KEY } from '../src/shared/access/public.decorator.js';
import { RequestCount } from '../src/throttling/entities/request-count.entity.js';
import { RequestCounts } from '../src/throttling/request-counts.service.js';
import { createTeam, signInMember, startTestApp, type TestApp } from './support/index.js';

interface Route {
  name: string;
  isPublic: boolean;
  action?: string;
}

const OPEN_ROUTES = [
  'askForPasswordReset',
  'confirmAddress',
  'getAccountLink',
  'getHealth',
  'getInvitation',
  'getUnsubscription',
  'joinWithNewAccount',
  'receiveBillingEvent',
  'resetPassword',
  'signIn',
  'signOut',
  'signUp',
  'unsubscribe',
];
const OPEN_ADDRESSES = [
  'post /api/auth/sign-in',
  'post /api/auth/sign-out',
  'post /api/auth/sign-up',
  'post /api/auth/password-resets',
  'get /api/auth/links/:token',
  'post /api/auth/confirm',
  'post /api/auth/reset-password',
  'get /api/health',
  'get /api/invitations/:token',
  'post /api/invitations/:token/account',
  'get /api/mail/unsubscribe/:token',
  'post /api/mail/unsubscribe/:token',
  'post /api/billing/webhook',
];

describe('guards', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  it('finds on every route who may call it', () => {
    const routes = routesOf(app);
    expect(routes.length).toBeGreaterThan(8);
    expect(routes.filter(({ isPublic, action }) => isPublic === (action !== undefined))).toEqual([]);
  });

  it('opens nothing to the public but the ways into an account, links in e-mails, signed events and the health', () => {
    const open = routesOf(app).filter(({ isPublic }) => isPublic);
    expect(open.map(({ name }) => name).sort()).toEqual(OPEN_ROUTES);
  });

  it('asks for a session at every other address', async () => {
    const closed = addressesOf(app).filter((address) => !OPEN_ADDRESSES.includes(address));
    expect(closed.length).toBeGreaterThan(5);
    const statuses = await Promise.all(
      closed.map(async (address) => [address, await statusOf(app, address)]),
    );
    expect(statuses.filter(([, status]) => status !== 401)).toEqual([]);
  });

  it('counts requests in the database, so that a limit is one for several processes', async () => {
    const { agent } = await signInMember(app, await createTeam(app), ['engineer']);
    const counts = app.dataSource.getRepository(RequestCount);
    await counts.clear();
    await agent.get('/api/auth/me').expect(200);
    await agent.get('/api/auth/me').expect(200);
    const [{ hash, count }] = await counts.find();
    expect(count).toBe(2);
    await counts.update({ hash }, { count: 600 });
    const refused = await agent.get('/api/auth/me').expect(429);
    expect(refused.body.code).toBe('request.too-many');
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    await agent.get('/api/auth/teams').expect(200);
    await counts.update({ hash }, { until: new Date(Date.now() - 1000) });
    await agent.get('/api/auth/me').expect(200);
    const other = new RequestCounts(app.dataSource);
    expect((await other.increment(hash, 60_000, 600)).totalHits).toBe(2);
    await other.tidy();
    expect(await counts.count()).toBe(2);
  });

  it('lets requests through that can’t be counted', async () => {
    const { agent } = await signInMember(app, await createTeam(app), ['engineer']);
    await app.dataSource.query('RENAME TABLE request_counts TO counts_elsewhere');
    await agent.get('/api/auth/me').expect(200);
    await app.dataSource.query('RENAME TABLE counts_elsewhere TO request_counts');
  });

  it('refuses by role with 403 and by plan with 402', async () => {
    const team = await createTeam(app, { plan: 'free' });
    const reviewer = await signInMember(app, team, ['reviewer']);
    const librarian = await signInMember(app, team, ['librarian']);
    const byRole = await reviewer.agent.post('/api/op-amps').send({}).expect(403);
    expect(byRole.body.code).toBe('access.role');
    const byPlan = await librarian.agent.post('/api/op-amps').send({}).expect(402);
    expect(byPlan.body.code).toBe('access.plan');
  });
});

function routesOf(app: TestApp): Route[] {
  const scanner = new MetadataScanner();
  const controllers = [...app.nest.get(ModulesContainer).values()].flatMap(({ controllers }) => [
    ...controllers.values(),
  ]);
  return controllers.flatMap(({ metatype }) => {
    const prototype = (metatype as unknown as { prototype: Record<string, object> }).prototype;
    return scanner
      .getAllMethodNames(prototype)
      .filter((name) => Reflect.hasMetadata(METHOD_METADATA, prototype[name]))
      .map((name) => toRoute(name, prototype[name]));
  });
}

function toRoute(name: string, handler: object): Route {
  const isPublic = Reflect.getMetadata(PUBLIC_KEY, handler) === true;
  return { name, isPublic, action: Reflect.getMetadata(ACCESS_KEY, handler) };
}

interface Layer {
  route?: { path: string; methods: Record<string, boolean> };
}

/** What Express answers itself: the API’s documentation is no route of the application’s. */
function addressesOf(app: TestApp): string[] {
  const { stack } = app.nest.getHttpAdapter().getInstance().router as { stack: Layer[] };
  const methods = Object.keys(RequestMethod).map((method) => method.toLowerCase());
  return stack
    .flatMap(({ route }) => (route ? Object.keys(route.methods).map((method) => [method, route.path]) : []))
    .filter(([method, path]) => methods.includes(method) && !path.startsWith('/api/docs'))
    .map((parts) => parts.join(' '));
}

async function statusOf(app: TestApp, address: string): Promise<number> {
  const [method, path] = address.split(' ') as ['get' | 'post' | 'patch' | 'put' | 'delete', string];
  const { status } = await app.request[method](path.replace(':id', '1'));
  return status;
}
