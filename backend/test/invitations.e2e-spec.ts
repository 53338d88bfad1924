import type { Role } from '@roothertz/common/access';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { OutboxMail } from '../src/mail/entities/outbox-mail.entity.js';
import { Subscription } from '../src/plans/entities/subscription.entity.js';
import { Membership } from '../src/teams/entities/membership.entity.js';
import { Invitation } from '../src/teams/invitations/entities/invitation.entity.js';
import { User } from '../src/users/entities/user.entity.js';
import {
  createTeam,
  signInMember,
  startTestApp,
  type TestApp,
  type TestMember,
  type TestTeam,
} from './support/index.js';

const NEW_ACCOUNT = { name: 'Nell Weir', password: 'still water runs deep' };
const LONG_AGO = new Date('2026-01-01T00:00:00Z');
let people = 0;

describe('an invitation', () => {
  let app: TestApp;
  let team: TestTeam;
  let admin: TestMember;
  let email: string;

  beforeAll(async () => {
    app = await startTestApp();
  });
  beforeEach(async () => {
    team = await createTeam(app);
    admin = await signInMember(app, team, ['admin']);
    email = `invited${++people}@weir.example`;
  });
  afterAll(() => app.close());

  const invite = (body: object = {}, by = admin) =>
    by.agent.post('/api/team/invitations').send({ email, roles: ['engineer'], ...body });
  const mailsTo = (to: string) =>
    app.dataSource.manager.find(OutboxMail, { where: { to }, order: { id: 'ASC' } });
  const tokenFor = async (to = email) =>
    /\/invitations\/([\w-]+)/.exec((await mailsTo(to)).at(-1)!.text!)![1];
  const stored = () => app.dataSource.manager.findOneByOrFail(Invitation, { email });
  const change = (changes: Partial<Invitation>) =>
    app.dataSource.manager.update(Invitation, { email }, changes);
  const join = (token: string, body: object = NEW_ACCOUNT) =>
    app.request.post(`/api/invitations/${token}/account`).send(body);
  const rolesOf = async (userId: number) =>
    (await app.dataSource.manager.findOneBy(Membership, { userId, teamId: team.id }))?.roles;
  const codes = (answers: { status: number; body: { code?: string } }[]) =>
    answers.map(({ status, body }) => [status, body.code]);

  it('goes out as an e-mail whose link alone opens it, and is stored only as a hash', async () => {
    const { body } = await invite({
      email: ` ${email.toUpperCase()} `,
      roles: ['reviewer', 'engineer'],
    }).expect(201);
    expect(body).toMatchObject({
      email,
      roles: ['engineer', 'reviewer'],
      invitedBy: { id: String(admin.caller.userId) },
    });
    expect(Date.parse(body.expiresAt) - Date.parse(body.sentAt)).toBe(7 * 86_400_000);
    const [mail] = await mailsTo(email);
    expect(mail).toMatchObject({
      kind: 'invitation',
      teamId: team.id,
      subject: expect.stringContaining('Weir & Sons'),
    });
    const token = await tokenFor();
    expect(JSON.stringify([body, await stored()])).not.toContain(token);
    const opened = await app.request.get(`/api/invitations/${token}`).expect(200);
    expect(opened.body).toMatchObject({ team: { name: 'Weir & Sons' }, email, hasAccount: false });
    const list = await admin.agent.get('/api/team/invitations').expect(200);
    expect(list.body).toEqual({ items: [body], total: 1 });
    expect(await app.dataSource.manager.findOneByOrFail(AuditEntry, { objectLabel: email })).toMatchObject({
      action: 'invitation.sent',
      to: { roles: ['engineer', 'reviewer'] },
    });
  });

  it('is accepted by a new account, which can sign in at once', async () => {
    await invite({ roles: ['librarian', 'reviewer'] }).expect(201);
    const { body } = await join(await tokenFor()).expect(201);
    expect(body).toEqual({ id: String(team.id), name: 'Weir & Sons' });
    const user = await app.dataSource.manager.findOneByOrFail(User, { email });
    expect(user.passwordHash).not.toContain(NEW_ACCOUNT.password);
    expect(await rolesOf(user.id)).toEqual(['librarian', 'reviewer']);
    const signedIn = await app.request
      .post('/api/auth/sign-in')
      .send({ email, password: NEW_ACCOUNT.password })
      .expect(200);
    expect(signedIn.body).toMatchObject({ user: { name: 'Nell Weir' }, roles: ['librarian', 'reviewer'] });
    expect((await admin.agent.get('/api/team/invitations')).body.total).toBe(0);
    const joined = await app.dataSource.manager.findOneByOrFail(AuditEntry, {
      action: 'member.joined',
      teamId: team.id,
    });
    expect(joined).toMatchObject({ userId: user.id, objectLabel: 'Weir & Sons' });
  });

  it('is accepted by an existing account of that address, and of no other', async () => {
    const guest = await signInMember(app, await createTeam(app), ['admin']);
    const other = await signInMember(app, await createTeam(app), ['admin']);
    await invite({ email: guest.email });
    const token = await tokenFor(guest.email);
    expect((await app.request.get(`/api/invitations/${token}`)).body.hasAccount).toBe(true);
    const refused = [
      await other.agent.post(`/api/invitations/${token}/accept`),
      await app.request.post(`/api/invitations/${token}/accept`),
      await join(token),
    ];
    expect(codes(refused)).toEqual([
      [403, 'invitation.other-address'],
      [401, 'session.missing'],
      [409, 'invitation.account-exists'],
    ]);
    expect(await rolesOf(guest.caller.userId)).toBeUndefined();
    await guest.agent.post(`/api/invitations/${token}/accept`).expect(200);
    expect(await rolesOf(guest.caller.userId)).toEqual(['engineer']);
    expect((await invite({ email: guest.email }).expect(409)).body.code).toBe('invitation.member');
  });

  it('is accepted once: again, later or twice at the same time it is refused', async () => {
    await invite();
    const token = await tokenFor();
    const answers = await Promise.all([join(token), join(token), join(token)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    expect(codes([await join(token), await app.request.get(`/api/invitations/${token}`)])).toEqual([
      [409, 'invitation.used'],
      [409, 'invitation.used'],
    ]);
    expect(await app.dataSource.manager.countBy(User, { email })).toBe(1);
    expect(await app.dataSource.manager.countBy(Membership, { teamId: team.id })).toBe(2);
  });

  it('is refused when it is too old, withdrawn, replaced by a newer one or made up', async () => {
    const { body } = await invite();
    const token = await tokenFor();
    await change({ expiresAt: LONG_AGO });
    expect(codes([await join(token)])).toEqual([[410, 'invitation.expired']]);
    await change({ sentAt: LONG_AGO });
    await admin.agent.post(`/api/team/invitations/${body.id}/resend`).expect(200);
    const newer = await tokenFor();
    expect(codes([await join(token)])).toEqual([[404, 'invitation.not-found']]);
    await app.request.get(`/api/invitations/${newer}`).expect(200);
    await admin.agent.delete(`/api/team/invitations/${body.id}`).expect(204);
    expect(codes([await join(newer), await join('x'), await join('%00')])).toEqual([
      [410, 'invitation.revoked'],
      [404, 'invitation.not-found'],
      [404, 'invitation.not-found'],
    ]);
    await admin.agent.delete(`/api/team/invitations/${body.id}`).expect(404);
    expect(await app.dataSource.manager.countBy(User, { email })).toBe(0);
  });

  it('is sent again for another week, but not right after it was sent', async () => {
    const { body } = await invite();
    const resend = () => admin.agent.post(`/api/team/invitations/${body.id}/resend`);
    expect(Number((await resend().expect(429)).headers['retry-after'])).toBeGreaterThan(0);
    await change({ sentAt: LONG_AGO, expiresAt: LONG_AGO });
    const again = await resend().expect(200);
    expect(Date.parse(again.body.expiresAt)).toBeGreaterThan(Date.now() + 6 * 86_400_000);
    expect(await mailsTo(email)).toHaveLength(2);
  });

  it('is sent once to an address, and again after it was withdrawn', async () => {
    const { body } = await invite();
    const answers = await Promise.all([invite(), invite()]);
    expect(codes(answers)).toEqual(answers.map(() => [409, 'invitation.duplicate']));
    expect(answers[0].body.errors).toMatchObject([{ field: 'email' }]);
    await admin.agent.delete(`/api/team/invitations/${body.id}`).expect(204);
    await invite().expect(201);
    expect(await mailsTo(email)).toHaveLength(2);
  });

  it('says, opened again after its member was removed, that there is a newer one', async () => {
    await invite();
    const old = await tokenFor();
    await join(old).expect(201);
    const { id } = await app.dataSource.manager.findOneByOrFail(User, { email });
    await admin.agent.delete(`/api/team/members/${id}`).expect(204);
    const before = await app.request.get(`/api/invitations/${old}`).expect(409);
    expect(before.body.detail).toMatch(/accepted already/);
    await invite().expect(201);
    for (const answer of [await app.request.get(`/api/invitations/${old}`), await join(old)]) {
      expect(codes([answer])).toEqual([[409, 'invitation.used']]);
      expect(answer.body.detail).toMatch(/A newer invitation took this one’s place/);
    }
    await app.request.get(`/api/invitations/${await tokenFor()}`).expect(200);
  });

  it('keeps its seat: past the paid ones nobody is invited, and nobody joins', async () => {
    const seats = (count: number) =>
      app.dataSource.manager.update(Subscription, { teamId: team.id }, { seats: count });
    await seats(2);
    await invite().expect(201);
    const refused = await invite({ email: `more.${email}` }).expect(402);
    expect(refused.body).toMatchObject({
      code: 'access.seats',
      detail: expect.stringContaining('add a seat'),
    });
    expect(await mailsTo(`more.${email}`)).toEqual([]);
    const token = await tokenFor();
    await seats(1);
    expect((await join(token).expect(402)).body.code).toBe('access.seats');
    expect(await app.dataSource.manager.countBy(User, { email })).toBe(0);
    await seats(2);
    await join(token).expect(201);
    const alone = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
    await invite({ email: `free.${email}` }, alone).expect(402);
  });

  it.each<[string, object]>([
    ['email', { email: 'no address' }],
    ['email', { email: 'a@b.example\r\nBcc: all@weir.example' }],
    ['email', { email: '' }],
    ['email', { email: null }],
    ['email', { email: `${'x'.repeat(250)}@weir.example` }],
    ['roles', { roles: [] }],
    ['roles', { roles: ['boss' as Role] }],
    ['team', { team: '1' }],
  ])('is refused with a wrong %s: %j', async (field, body) => {
    const answer = await invite(body).expect(400);
    expect(answer.body.errors.map((error: { field: string }) => error.field)).toContain(field);
    expect(await app.dataSource.manager.countBy(Invitation, { teamId: team.id })).toBe(0);
  });

  it.each<[string, object]>([
    ['name', { name: ' ' }],
    ['password', { password: '' }],
    ['password', { password: undefined }],
    ['email', { email: 'other@weir.example' }],
  ])('is not accepted with a wrong %s: %j', async (field, body) => {
    await invite();
    const answer = await join(await tokenFor(), { ...NEW_ACCOUNT, ...body }).expect(400);
    expect(answer.body.errors.map((error: { field: string }) => error.field)).toContain(field);
    expect((await stored()).acceptedAt).toBeNull();
  });

  it.each(['too short', 'password1234', 'x'.repeat(73)])(
    'is not accepted with the password %s',
    async (password) => {
      await invite();
      const { body } = await join(await tokenFor(), { ...NEW_ACCOUNT, password }).expect(422);
      expect(body.errors).toMatchObject([{ field: 'password' }]);
      expect((await stored()).acceptedAt).toBeNull();
    },
  );

  it('is the admin’s to send, and its team’s to see', async () => {
    const { body } = await invite();
    const engineer = await signInMember(app, team, ['engineer']);
    const stranger = await signInMember(app, await createTeam(app), ['admin']);
    await invite({ email: `x.${email}` }, engineer).expect(403);
    await engineer.agent.get('/api/team/invitations').expect(403);
    expect((await stranger.agent.get('/api/team/invitations').expect(200)).body.total).toBe(0);
    await stranger.agent.post(`/api/team/invitations/${body.id}/resend`).expect(404);
    await stranger.agent.delete(`/api/team/invitations/${body.id}`).expect(404);
    expect((await stored()).revokedAt).toBeNull();
  });
});
