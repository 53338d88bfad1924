import { JwtService } from '@nestjs/jwt';
import supertest from 'supertest';
import { Attempts } from '../src/auth/attempts.service.js';
import { signInSubjects } from '../src/auth/attempt-limits.js';
import { AttemptCount } from '../src/auth/entities/attempt-count.entity.js';
import { Session } from '../src/auth/entities/session.entity.js';
import { Membership } from '../src/teams/entities/membership.entity.js';
import {
  createTeam,
  PASSWORD,
  signInMember,
  startTestApp,
  type TestApp,
  type TestTeam,
} from './support/index.js';

interface OpenSession {
  userAgent: string;
  current: boolean;
  address: string;
}

describe('session', () => {
  let app: TestApp;
  let team: TestTeam;

  beforeAll(async () => {
    app = await startTestApp();
    team = await createTeam(app);
  });
  afterAll(() => app.close());

  const signIn = (email: string, password: string) =>
    app.request.post('/api/auth/sign-in').send({ email, password });
  const askWith = (token: string) =>
    app.request.get('/api/auth/me').set('Cookie', `roothertz_session=${token}`);

  it('signs in with an httpOnly, SameSite cookie and answers who is signed in', async () => {
    const { email, caller } = await signInMember(app, team, ['engineer', 'librarian']);
    const agent = supertest.agent(await app.nest.getUrl());
    const answer = await agent.post('/api/auth/sign-in').send({ email, password: PASSWORD }).expect(200);
    expect(answer.headers['set-cookie'][0]).toMatch(
      /^roothertz_session=.+; Max-Age=43200; Path=\/; .*HttpOnly; SameSite=Lax$/,
    );
    expect(answer.body).toEqual({
      user: { id: String(caller.userId), email, name: expect.any(String) },
      team: { id: String(team.id), name: 'Weir & Sons' },
      teams: [{ id: String(team.id), name: 'Weir & Sons' }],
      roles: ['librarian', 'engineer'],
      plan: 'team',
      standing: 'active',
      standingUntil: null,
    });
    const me = await agent.get('/api/auth/me').expect(200);
    expect(me.body).toEqual(answer.body);
  });

  it('takes the e-mail address in any case and with spaces around it', async () => {
    const { email } = await signInMember(app, team, ['engineer']);
    await signIn(`  ${email.toUpperCase()} `, PASSWORD).expect(200);
  });

  it('answers a wrong e-mail address and a wrong password alike', async () => {
    const { email } = await signInMember(app, team, ['engineer']);
    const answers = [await signIn(email, 'wrong'), await signIn('nobody@weir.example', PASSWORD)];
    const [one, other] = answers.map(({ status, body }) => ({ status, ...body, correlationId: '' }));
    expect(one).toEqual(other);
    expect(one).toMatchObject({ status: 401, code: 'session.wrong-credentials' });
    expect(answers.flatMap(({ headers }) => headers['set-cookie'] ?? [])).toEqual([]);
  });

  it.each(['an account', 'no account'])(
    'slows repeated failures of %s and says when to try again',
    async (whose) => {
      const { email } = await signInMember(app, team, ['engineer']);
      const address = whose === 'an account' ? email : `not.${email}`;
      for (let time = 0; time < 5; time++) await signIn(address, 'wrong').expect(401);
      const answer = await signIn(address, PASSWORD).expect(429);
      expect(answer.body.code).toBe('request.too-many');
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    },
  );

  it('slows attempts on one account from many places, and hears it again when the wait is over', async () => {
    const attempts = () => new Attempts(app.dataSource);
    for (let place = 1; place <= 50; place++)
      await attempts().count(signInSubjects('ada@weir.example', `10.0.0.${place}`));
    const next = () => attempts().count(signInSubjects('ada@weir.example', '10.0.1.1'));
    await expect(next()).rejects.toMatchObject({ code: 'request.too-many', retryAfter: 5 });
    await attempts().count(signInSubjects('bob@weir.example', '10.0.1.1'));
    await app.dataSource.query('UPDATE attempt_counts SET until = NOW(3) - INTERVAL 1 SECOND');
    await next();
    await expect(next()).rejects.toMatchObject({ retryAfter: 10 });
    await app.dataSource.query('UPDATE attempt_counts SET until = NOW(3) - INTERVAL 1 HOUR');
    for (let time = 0; time < 5; time++) await next();
    await expect(next()).rejects.toMatchObject({ retryAfter: 5 });
    await app.dataSource.getRepository(AttemptCount).deleteAll();
  });

  it('counts attempts that are made at the same time', async () => {
    const { email } = await signInMember(app, team, ['engineer']);
    const answers = await Promise.all(Array.from({ length: 12 }, () => signIn(email, 'wrong')));
    expect(answers.filter(({ status }) => status === 401).length).toBeLessThanOrEqual(5);
  });

  it('ends on sign-out, in the browser and for whoever kept the token', async () => {
    const { agent, cookie } = await signInMember(app, team, ['engineer']);
    const answer = await agent.post('/api/auth/sign-out').expect(204);
    expect(answer.headers['set-cookie'][0]).toMatch(/^roothertz_session=; .*Expires=Thu, 01 Jan 1970/);
    await askWith(cookie.split('=')[1]).expect(401);
  });

  it('asks for a session', async () => {
    const answer = await app.request.get('/api/auth/me').expect(401);
    expect(answer.body).toMatchObject({ code: 'session.missing', status: 401 });
  });

  it('refuses a token that is forged, unsigned, garbled or expired', async () => {
    const { caller, cookie } = await signInMember(app, team, ['engineer']);
    const claims = app.nest.get(JwtService, { strict: false }).decode(cookie.split('=')[1]);
    const { sub, sid } = claims;
    const sign = (secret: string, expiresIn: number) =>
      new JwtService().sign({ sub, sid }, { secret, expiresIn });
    const unsigned = `${btoa('{"alg":"none"}')}.${btoa(JSON.stringify(claims))}.`;
    await askWith(sign(app.config.JWT_SECRET, 60)).expect(200);
    await askWith(sign('another secret of thirty-two letters', 60)).expect(401);
    await askWith(sign(app.config.JWT_SECRET, -60)).expect(401);
    await askWith(unsigned).expect(401);
    await askWith('garbled').expect(401);
    expect(claims).toMatchObject({ sub: String(caller.userId), exp: claims.iat + 12 * 3600 });
  });

  it('ends for good when the member leaves the team', async () => {
    const { agent, caller } = await signInMember(app, team, ['engineer']);
    const { userId, teamId } = caller;
    await agent.get('/api/auth/me').expect(200);
    await app.dataSource.getRepository(Membership).delete({ userId });
    await agent.get('/api/auth/me').expect(401);
    await app.dataSource.getRepository(Membership).insert({ userId, teamId, roles: ['engineer'] });
    await agent.get('/api/auth/me').expect(401);
  });

  it('is listed with where it came from, and ended one by one or all but this', async () => {
    const { email, agent, caller } = await signInMember(app, team, ['engineer']);
    const other = await signInMember(app, team, ['engineer']);
    const phone = supertest.agent(await app.nest.getUrl());
    await phone.post('/api/auth/sign-in').set('User-Agent', 'A phone').send({ email, password: PASSWORD });
    const list = await agent.get('/api/auth/sessions').expect(200);
    expect(
      list.body.items.map(({ userAgent, current, address }: OpenSession) => [userAgent, current, address]),
    ).toEqual([
      ['A phone', false, '127.0.0.1'],
      ['tests', true, '127.0.0.1'],
    ]);
    const [{ id }] = list.body.items;
    await other.agent.delete(`/api/auth/sessions/${id}`).expect(404);
    await phone.get('/api/auth/me').expect(200);
    await agent.delete(`/api/auth/sessions/${id}`).expect(204);
    await phone.get('/api/auth/me').expect(401);
    await agent.delete(`/api/auth/sessions/${id}`).expect(404);
    await phone.post('/api/auth/sign-in').send({ email, password: PASSWORD }).expect(200);
    await agent.delete('/api/auth/sessions').expect(204);
    await phone.get('/api/auth/me').expect(401);
    await agent.get('/api/auth/me').expect(200);
    await other.agent.get('/api/auth/me').expect(200);
    expect(await app.dataSource.getRepository(Session).countBy({ userId: caller.userId })).toBe(1);
  });

  it('goes on in another of the person’s teams, and in no other', async () => {
    const { agent, caller } = await signInMember(app, team, ['engineer']);
    const second = await createTeam(app, { plan: 'free' });
    const foreign = await createTeam(app);
    const membership = { userId: caller.userId, teamId: second.id, roles: ['admin' as const] };
    await app.dataSource.getRepository(Membership).insert(membership);
    const teams = await agent.get('/api/auth/teams').expect(200);
    expect(teams.body.items.map(({ id }: { id: string }) => id)).toEqual([
      String(team.id),
      String(second.id),
    ]);
    const answer = await agent
      .post('/api/auth/team')
      .send({ teamId: String(second.id) })
      .expect(200);
    expect(answer.body).toMatchObject({ team: { id: String(second.id) }, roles: ['admin'], plan: 'free' });
    expect(answer.body.teams).toMatchObject([{ id: String(team.id) }, { id: String(second.id) }]);
    const refused = await agent
      .post('/api/auth/team')
      .send({ teamId: String(foreign.id) })
      .expect(404);
    expect(refused.body.code).toBe('team.not-found');
    const me = await agent.get('/api/auth/me').expect(200);
    expect(me.body).toEqual(answer.body);
  });

  it('begins in the team that was opened last, by whichever session', async () => {
    const { email, agent, caller } = await signInMember(app, team, ['engineer']);
    const second = await createTeam(app);
    const membership = { userId: caller.userId, teamId: second.id, roles: ['admin' as const] };
    await app.dataSource.getRepository(Membership).insert(membership);
    const teamOf = async () => (await signIn(email, PASSWORD).expect(200)).body.team.id;
    expect(await teamOf()).toBe(String(team.id));
    await agent
      .post('/api/auth/team')
      .send({ teamId: String(second.id) })
      .expect(200);
    await agent.post('/api/auth/sign-out').expect(204);
    expect(await teamOf()).toBe(String(second.id));
    await app.dataSource.getRepository(Membership).delete({ userId: caller.userId, teamId: second.id });
    expect(await teamOf()).toBe(String(team.id));
  });

  it('follows a change of roles at once', async () => {
    const { agent, caller } = await signInMember(app, team, ['engineer']);
    await app.dataSource.getRepository(Membership).update({ userId: caller.userId }, { roles: ['reviewer'] });
    const answer = await agent.get('/api/auth/me').expect(200);
    expect(answer.body.roles).toEqual(['reviewer']);
  });

  it('founds one team for somebody who has left every other one, so that an invitation can still be taken', async () => {
    const { email, caller } = await signInMember(app, team, ['engineer']);
    const { userId } = caller;
    const memberships = app.dataSource.getRepository(Membership);
    await memberships.delete({ userId });
    await signIn(email, 'wrong').expect(401);
    expect(await memberships.countBy({ userId })).toBe(0);
    const answers = await Promise.all([signIn(email, PASSWORD), signIn(email, PASSWORD)]);
    expect(answers.map(({ status, body }) => [status, body.roles, body.plan])).toEqual([
      [200, ['admin'], 'free'],
      [200, ['admin'], 'free'],
    ]);
    expect(await memberships.countBy({ userId })).toBe(1);
  });
});

describe('session behind https', () => {
  it('sends the cookie over https only', async () => {
    const app = await startTestApp({ PUBLIC_ORIGIN: 'https://noise.example.org' });
    const { email } = await signInMember(app, await createTeam(app), ['engineer']);
    const answer = await app.request.post('/api/auth/sign-in').send({ email, password: PASSWORD });
    expect(answer.headers['set-cookie'][0]).toMatch(/; Secure; SameSite=Lax$/);
    await app.close();
  });
});
