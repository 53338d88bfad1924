import { JwtService } from '@nestjs/jwt';
import supertest from 'supertest';
import { Membership } from '../src/teams/entities/membership.entity.js';
import { User } from '../src/users/entities/user.entity.js';
import {
  createTeam,
  PASSWORD,
  signInMember,
  startTestApp,
  type TestApp,
  type TestTeam,
} from './support/index.js';

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

  it('counts attempts that are made at the same time', async () => {
    const { email } = await signInMember(app, team, ['engineer']);
    const answers = await Promise.all(Array.from({ length: 12 }, () => signIn(email, 'wrong')));
    expect(answers.filter(({ status }) => status === 401).length).toBeLessThanOrEqual(5);
  });

  it('ends the session in the browser on sign-out', async () => {
    const { agent } = await signInMember(app, team, ['engineer']);
    const answer = await agent.post('/api/auth/sign-out').expect(204);
    expect(answer.headers['set-cookie'][0]).toMatch(/^roothertz_session=; .*Expires=Thu, 01 Jan 1970/);
  });

  it('asks for a session', async () => {
    const answer = await app.request.get('/api/auth/me').expect(401);
    expect(answer.body).toMatchObject({ code: 'session.missing', status: 401 });
  });

  it('refuses a token that is forged, unsigned, garbled or expired', async () => {
    const { caller, cookie } = await signInMember(app, team, ['engineer']);
    const claims = app.nest.get(JwtService, { strict: false }).decode(cookie.split('=')[1]);
    const { sub, team: teamId, key } = claims;
    const sign = (secret: string, expiresIn: number) =>
      new JwtService().sign({ sub, team: teamId, key }, { secret, expiresIn });
    const unsigned = `${btoa('{"alg":"none"}')}.${btoa(JSON.stringify(claims))}.`;
    await askWith(sign(app.config.JWT_SECRET, 60)).expect(200);
    await askWith(sign('another secret of thirty-two letters', 60)).expect(401);
    await askWith(sign(app.config.JWT_SECRET, -60)).expect(401);
    await askWith(unsigned).expect(401);
    await askWith('garbled').expect(401);
    expect(claims).toMatchObject({ sub: String(caller.userId), exp: claims.iat + 12 * 3600 });
  });

  it('ends when the member leaves the team', async () => {
    const { agent, caller } = await signInMember(app, team, ['engineer']);
    await agent.get('/api/auth/me').expect(200);
    await app.dataSource.getRepository(Membership).delete({ userId: caller.userId });
    await agent.get('/api/auth/me').expect(401);
  });

  it('ends when the password changes', async () => {
    const { agent, caller } = await signInMember(app, team, ['engineer']);
    await app.dataSource.getRepository(User).update(caller.userId, { passwordHash: 'another' });
    await agent.get('/api/auth/me').expect(401);
  });

  it('follows a change of roles at once', async () => {
    const { agent, caller } = await signInMember(app, team, ['engineer']);
    await app.dataSource.getRepository(Membership).update({ userId: caller.userId }, { roles: ['reviewer'] });
    const answer = await agent.get('/api/auth/me').expect(200);
    expect(answer.body.roles).toEqual(['reviewer']);
  });

  it('tells somebody without a team so, but only with the right password', async () => {
    const { email, caller } = await signInMember(app, team, ['engineer']);
    await app.dataSource.getRepository(Membership).delete({ userId: caller.userId });
    await signIn(email, 'wrong').expect(401);
    const answer = await signIn(email, PASSWORD).expect(403);
    expect(answer.body.code).toBe('session.no-team');
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
