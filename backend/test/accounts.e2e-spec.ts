import supertest from 'supertest';
import { AccountToken } from '../src/auth/entities/account-token.entity.js';
import { AttemptCount } from '../src/auth/entities/attempt-count.entity.js';
import { OutboxMail } from '../src/mail/entities/outbox-mail.entity.js';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Membership } from '../src/teams/entities/membership.entity.js';
import { Team } from '../src/teams/entities/team.entity.js';
import { Subscription } from '../src/plans/entities/subscription.entity.js';
import { User } from '../src/users/entities/user.entity.js';
import { createTeam, PASSWORD, signInMember, startTestApp, type TestApp } from './support/index.js';

const NEW_PASSWORD = 'correct pony battery';
let addresses = 0;

describe('an account', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });
  beforeEach(async () => {
    await app.dataSource.getRepository(AttemptCount).deleteAll();
    await app.dataSource.getRepository(OutboxMail).deleteAll();
  });
  afterAll(() => app.close());

  const newAddress = () => `ada${++addresses}@bourne.example`;
  const post = (path: string, body: object) => app.request.post(`/api/${path}`).send(body);
  const signUp = (email: string, changes: object = {}) =>
    post('auth/sign-up', {
      name: 'Ada Bourne',
      email,
      password: NEW_PASSWORD,
      teamName: 'Bourne',
      ...changes,
    });
  const signIn = (email: string, password: string) => post('auth/sign-in', { email, password });
  const mails = (to?: string) =>
    app.dataSource
      .getRepository(OutboxMail)
      .find({ where: to === undefined ? {} : { to }, order: { id: 'ASC' } });
  const userOf = (email: string) => app.dataSource.getRepository(User).findOneBy({ email });
  const newestToken = async (to: string) => {
    const sent = await mails(to);
    return /\/(?:confirm|reset-password)\/([\w-]+)/.exec(sent.at(-1)?.text ?? '')?.[1] ?? '';
  };
  const answerOf = async (call: supertest.Test) => {
    const { status, body } = await call;
    return { status, ...body, correlationId: '' };
  };

  async function signedUp(): Promise<string> {
    const email = newAddress();
    await signUp(email).expect(204);
    await post('auth/confirm', { token: await newestToken(email) }).expect(204);
    return email;
  }

  describe('sign-up', () => {
    it('makes nothing until the address is confirmed, then account and team, and lets in by the password', async () => {
      const email = newAddress();
      await signUp(` ${email.toUpperCase()} `).expect(204);
      expect(await userOf(email)).toBeNull();
      await signIn(email, NEW_PASSWORD).expect(401);
      expect(await mails()).toMatchObject([{ kind: 'confirm-address', to: email, userId: null }]);
      const token = await newestToken(email);
      const link = await app.request.get(`/api/auth/links/${token}`).expect(200);
      expect(link.body).toEqual({ purpose: 'sign-up', email });
      await post('auth/confirm', { token }).expect(204);
      const me = await signIn(email, NEW_PASSWORD).expect(200);
      expect(me.body).toMatchObject({
        user: { email, name: 'Ada Bourne' },
        team: { name: 'Bourne' },
        roles: ['admin'],
        plan: 'free',
      });
      const teamId = Number(me.body.team.id);
      const user = await userOf(email);
      expect(await app.dataSource.getRepository(Team).findOneBy({ id: teamId })).toMatchObject({
        ownerId: user?.id,
      });
      expect(await app.dataSource.getRepository(AuditEntry).findBy({ teamId })).toMatchObject([
        { action: 'team.founded', userId: user?.id },
      ]);
    });

    it('stores neither the password nor the token', async () => {
      const email = newAddress();
      await signUp(email).expect(204);
      const token = await newestToken(email);
      const [row] = await app.dataSource.getRepository(AccountToken).findBy({ email });
      expect(JSON.stringify(row)).not.toContain(token);
      expect(JSON.stringify(row)).not.toContain(NEW_PASSWORD);
    });

    it('answers alike where the address has an account, and tells its mailbox', async () => {
      const email = await signedUp();
      const before = await userOf(email);
      const answers = [await answerOf(signUp(email)), await answerOf(signUp(newAddress()))];
      expect(answers[0]).toEqual(answers[1]);
      expect((await mails(email)).at(-1)).toMatchObject({ kind: 'account-exists' });
      expect(await userOf(email)).toEqual(before);
    });

    it('makes one account of two sign-ups that are confirmed at once, each with its own password', async () => {
      const email = newAddress();
      await signUp(email).expect(204);
      const first = await newestToken(email);
      await signUp(email, { password: 'another pony battery', teamName: 'Other' }).expect(204);
      const second = await newestToken(email);
      const answers = await Promise.all([first, second].map((token) => post('auth/confirm', { token })));
      expect(answers.map(({ status }) => status).sort()).toEqual([204, 409]);
      const won = answers[0].status === 204 ? NEW_PASSWORD : 'another pony battery';
      await signIn(email, won).expect(200);
      expect(await app.dataSource.getRepository(User).countBy({ email })).toBe(1);
    });

    it.each([
      ['password', 'short'],
      ['password', 'LeaveMeAlone'],
      ['password', 'é'.repeat(40)],
      ['email', 'nobody'],
      ['email', 'a@b'],
      ['name', ' '],
      ['teamName', 'x'.repeat(121)],
    ])('is refused at the field %s: %s', async (field, value) => {
      const answer = await signUp(newAddress(), { [field]: value });
      expect([400, 422]).toContain(answer.status);
      expect(answer.body.errors.map((error: { field: string }) => error.field)).toEqual([field]);
      expect(await mails()).toEqual([]);
    });

    it('is refused at all the fields at once that are at fault', async () => {
      const answer = await signUp('nobody', { name: ' ', password: '1qaz2wsx3edc' }).expect(400);
      expect(answer.body.errors).toMatchObject([
        { field: 'name' },
        { field: 'email', message: expect.stringMatching(/such as name@company.example/) },
        { field: 'password', message: expect.stringMatching(/everybody tries first/) },
      ]);
    });

    it('is refused where the password is the address', async () => {
      const email = 'long.address@bourne.example';
      const answer = await signUp(email, { password: email.toUpperCase() }).expect(400);
      expect(answer.body.errors[0]).toMatchObject({ field: 'password' });
    });

    it('sends one address no more than a few e-mails, whoever asks', async () => {
      const email = newAddress();
      for (let time = 0; time < 4; time++) await signUp(email).expect(204);
      const answer = await signUp(email).expect(429);
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
      expect((await mails(email)).length).toBe(4);
    });
  });

  describe('link', () => {
    it('is good once: used, too old, for something else, changed or none, it says what is wrong', async () => {
      const email = await signedUp();
      await post('auth/password-resets', { email }).expect(204);
      const token = await newestToken(email);
      const reset = (secret: string) =>
        answerOf(post('auth/reset-password', { token: secret, password: PASSWORD }));
      expect(await answerOf(post('auth/confirm', { token }))).toMatchObject({
        status: 404,
        code: 'token.unknown',
      });
      expect(await reset(`${token}x`)).toMatchObject({ status: 404, code: 'token.unknown' });
      await app.dataSource.query('UPDATE account_tokens SET expires_at = NOW(3) WHERE used_at IS NULL');
      expect(await reset(token)).toMatchObject({ status: 410, code: 'token.expired' });
      await app.dataSource.query('UPDATE account_tokens SET expires_at = NOW(3) + INTERVAL 1 HOUR');
      expect(await reset(token)).toMatchObject({ status: 204 });
      expect(await reset(token)).toMatchObject({ status: 410, code: 'token.used' });
      await app.request.get(`/api/auth/links/${token}`).expect(410);
      await app.request.get('/api/auth/links/nothing').expect(404);
    });

    it('is used by one of several that come at once', async () => {
      const email = await signedUp();
      for (let time = 0; time < 2; time++) await post('auth/password-resets', { email }).expect(204);
      const tokens = (await mails(email)).flatMap(
        ({ text }) => /reset-password\/([\w-]+)/.exec(text ?? '')?.[1] ?? [],
      );
      const answers = await Promise.all(
        [...tokens, ...tokens].map((token, n) =>
          post('auth/reset-password', { token, password: `${NEW_PASSWORD} ${n}` }),
        ),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([204, 410, 410, 410]);
      const won = answers.findIndex(({ status }) => status === 204);
      await signIn(email, `${NEW_PASSWORD} ${won}`).expect(200);
    });
  });

  describe('password', () => {
    it('is set anew by a link of thirty minutes, which ends every session and is told by e-mail', async () => {
      const { agent, email, caller } = await signInMember(app, await createTeam(app), ['engineer']);
      await post('auth/password-resets', { email }).expect(204);
      const [{ expiresAt }] = await app.dataSource
        .getRepository(AccountToken)
        .findBy({ userId: caller.userId });
      expect((expiresAt.getTime() - Date.now()) / 60_000).toBeCloseTo(30, 0);
      const token = await newestToken(email);
      const refused = await post('auth/reset-password', { token, password: 'short' }).expect(422);
      expect(refused.body.errors[0].field).toBe('password');
      await post('auth/reset-password', { token, password: NEW_PASSWORD }).expect(204);
      await agent.get('/api/auth/me').expect(401);
      await signIn(email, PASSWORD).expect(401);
      await signIn(email, NEW_PASSWORD).expect(200);
      expect((await mails(email)).map(({ kind }) => kind)).toEqual(['reset-password', 'password-changed']);
    });

    it('is asked for alike whether or not the address has an account', async () => {
      const email = await signedUp();
      const answers = [newAddress(), email].map((address) =>
        answerOf(post('auth/password-resets', { email: address })),
      );
      const [none, one] = await Promise.all(answers);
      expect(none).toEqual(one);
    });

    it('is changed by who knows it, which ends the other sessions and not this', async () => {
      const { agent, email } = await signInMember(app, await createTeam(app), ['engineer']);
      const other = supertest.agent(await app.nest.getUrl());
      await other.post('/api/auth/sign-in').send({ email, password: PASSWORD }).expect(200);
      const change = (currentPassword: string, newPassword: string) =>
        agent.post('/api/account/password').send({ currentPassword, newPassword });
      const faults = [
        await change('a guess', NEW_PASSWORD).expect(422),
        await change(PASSWORD, 'short').expect(422),
        await change(PASSWORD, PASSWORD).expect(422),
      ].map(({ body }) => body.errors[0].field);
      expect(faults).toEqual(['currentPassword', 'newPassword', 'newPassword']);
      await change(PASSWORD, NEW_PASSWORD).expect(204);
      await agent.get('/api/auth/me').expect(200);
      await other.get('/api/auth/me').expect(401);
      await signIn(email, NEW_PASSWORD).expect(200);
      expect((await mails(email)).map(({ kind }) => kind)).toEqual(['password-changed']);
    });

    it('can’t be guessed by who found a session open', async () => {
      const { agent } = await signInMember(app, await createTeam(app), ['engineer']);
      const guess = () => agent.post('/api/account/close').send({ password: 'a guess' });
      for (let time = 0; time < 5; time++) await guess().expect(422);
      await guess().expect(429);
    });
  });

  describe('address', () => {
    const ask = (agent: ReturnType<typeof supertest.agent>, email: string, password = PASSWORD) =>
      agent.post('/api/account/email').send({ email, password });

    it('changes when the new one agrees; the old one is told, and the other sessions end', async () => {
      const { agent, email: old, caller } = await signInMember(app, await createTeam(app), ['engineer']);
      const other = supertest.agent(await app.nest.getUrl());
      await other.post('/api/auth/sign-in').send({ email: old, password: PASSWORD }).expect(200);
      await post('auth/password-resets', { email: old }).expect(204);
      const resetToken = await newestToken(old);
      const email = newAddress();
      expect((await ask(agent, email, 'a guess').expect(422)).body.errors[0].field).toBe('password');
      expect((await ask(agent, old).expect(422)).body.errors[0].field).toBe('email');
      await ask(agent, email).expect(204);
      expect(await userOf(old)).toMatchObject({ id: caller.userId });
      await post('auth/confirm', { token: await newestToken(email) }).expect(204);
      expect(await userOf(email)).toMatchObject({ id: caller.userId });
      expect((await mails(old)).at(-1)).toMatchObject({ kind: 'address-changed' });
      await agent.get('/api/auth/me').expect(200);
      await other.get('/api/auth/me').expect(401);
      await signIn(email, PASSWORD).expect(200);
      await signIn(old, PASSWORD).expect(401);
      await post('auth/reset-password', { token: resetToken, password: NEW_PASSWORD }).expect(410);
    });

    it('never takes another account’s, nor tells of it', async () => {
      const taken = await signedUp();
      const { agent, email } = await signInMember(app, await createTeam(app), ['engineer']);
      const answers = [await answerOf(ask(agent, taken)), await answerOf(ask(agent, newAddress()))];
      expect(answers[0]).toEqual(answers[1]);
      expect((await mails(taken)).at(-1)).toMatchObject({ kind: 'account-exists' });
      const free = newAddress();
      await ask(agent, free).expect(204);
      await signUp(free).expect(204);
      const signUpToken = await newestToken(free);
      const [{ text }] = await mails(free);
      await post('auth/confirm', { token: signUpToken }).expect(204);
      const token = /confirm\/([\w-]+)/.exec(text ?? '')?.[1];
      expect(await answerOf(post('auth/confirm', { token }))).toMatchObject({
        status: 409,
        code: 'account.exists',
      });
      expect(await userOf(email)).not.toBeNull();
    });
  });

  it('takes another name', async () => {
    const { agent, email } = await signInMember(app, await createTeam(app), ['engineer']);
    await agent.patch('/api/account').send({ name: ' Ada Brook ' }).expect(204);
    expect(await userOf(email)).toMatchObject({ name: 'Ada Brook' });
    await agent.patch('/api/account').send({ name: '' }).expect(400);
  });

  describe('its end', () => {
    const close = (agent: ReturnType<typeof supertest.agent>, password = PASSWORD) =>
      agent.post('/api/account/close').send({ password });

    it('leaves what was made, says so in the trail, and ends the sessions', async () => {
      const team = await createTeam(app);
      await signInMember(app, team, ['admin']);
      const { agent, email, caller } = await signInMember(app, team, ['engineer']);
      const foreseen = await agent.get('/api/account/closing').expect(200);
      expect(foreseen.body.items).toMatchObject([{ closes: false, obstacle: null }]);
      await close(agent, 'a guess').expect(422);
      await close(agent).expect(204);
      expect(await userOf(email)).toBeNull();
      await agent.get('/api/auth/me').expect(401);
      await signIn(email, PASSWORD).expect(401);
      const trail = await app.dataSource.getRepository(AuditEntry).findBy({ teamId: team.id });
      const gone = { action: 'member.account-closed', objectId: String(caller.userId), userId: null };
      expect(trail).toMatchObject([gone]);
    });

    it('is refused to the last admin of a team with others in it, and to who holds a paid plan alone', async () => {
      const team = await createTeam(app);
      const admin = await signInMember(app, team, ['admin']);
      const other = await signInMember(app, team, ['engineer']);
      const foreseen = await admin.agent.get('/api/account/closing').expect(200);
      expect(foreseen.body.items[0].obstacle).toMatch(/needs an admin/);
      expect((await close(admin.agent).expect(409)).body.code).toBe('account.needed');
      await app.dataSource.getRepository(Membership).delete({ userId: other.caller.userId });
      await app.dataSource
        .getRepository(Subscription)
        .update({ teamId: team.id }, { subscriptionId: 'sub_paid', customerId: `cus_${team.id}` });
      expect((await close(admin.agent).expect(409)).body.detail).toMatch(/paid for/);
      await app.dataSource.getRepository(Subscription).update({ teamId: team.id }, { status: 'cancelled' });
      await close(admin.agent).expect(204);
      expect(await app.dataSource.getRepository(Team).findOneBy({ id: team.id })).toMatchObject({
        ownerId: null,
      });
    });

    it('comes to one of two last admins who go at once', async () => {
      const team = await createTeam(app);
      const admins = [await signInMember(app, team, ['admin']), await signInMember(app, team, ['admin'])];
      await signInMember(app, team, ['engineer']);
      await app.dataSource.getRepository(Team).update({ id: team.id }, { ownerId: null });
      const statuses = await Promise.all(admins.map(async ({ agent }) => (await close(agent)).status));
      expect(statuses.sort()).toEqual([204, 409]);
      expect(
        await app.dataSource.getRepository(Membership).countBy({ teamId: team.id }),
      ).toBeGreaterThanOrEqual(2);
    });
  });
});
