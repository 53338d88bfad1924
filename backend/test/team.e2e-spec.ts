import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Membership } from '../src/teams/entities/membership.entity.js';
import { Team } from '../src/teams/entities/team.entity.js';
import { createOpAmp } from './factories/op-amps.js';
import {
  createTeam,
  signInMember,
  startTestApp,
  type TestApp,
  type TestMember,
  type TestTeam,
} from './support/index.js';

describe('the team', () => {
  let app: TestApp;
  let team: TestTeam;
  let owner: TestMember;
  let admin: TestMember;
  let engineer: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    stranger = await signInMember(app, await createTeam(app), ['admin']);
  });
  beforeEach(async () => {
    team = await createTeam(app);
    owner = await signInMember(app, team, ['admin']);
    admin = await signInMember(app, team, ['admin', 'librarian']);
    engineer = await signInMember(app, team, ['engineer']);
  });
  afterAll(() => app.close());

  const at = ({ caller }: TestMember) => `/api/team/members/${caller.userId}`;
  const rolesOf = async ({ caller: { userId, teamId } }: TestMember) =>
    (await app.dataSource.manager.findOneBy(Membership, { userId, teamId }))?.roles ?? null;
  const lastEntry = () =>
    app.dataSource.manager.findOne(AuditEntry, { where: { teamId: team.id }, order: { id: 'DESC' } });
  const members = async (member = engineer) =>
    (await member.agent.get('/api/team/members').expect(200)).body.items as {
      id: string;
      isOwner: boolean;
    }[];

  it('shows every member who is in it and with which roles', async () => {
    const { body } = await engineer.agent.get('/api/team/members').expect(200);
    expect(body.total).toBe(3);
    expect(body.items[1]).toEqual({
      id: String(admin.caller.userId),
      name: expect.stringMatching(/^Person \d+$/),
      email: admin.email,
      roles: ['admin', 'librarian'],
      isOwner: false,
      joinedAt: expect.any(String),
    });
    expect(body.items[0].isOwner).toBe(true);
    expect((await engineer.agent.get('/api/team').expect(200)).body).toEqual({
      id: String(team.id),
      name: 'Weir & Sons',
    });
  });

  it('is renamed by an admin, which the trail tells', async () => {
    const { body } = await admin.agent.patch('/api/team').send({ name: ' Weir & Daughters ' }).expect(200);
    expect(body.name).toBe('Weir & Daughters');
    expect((await app.dataSource.manager.findOneByOrFail(Team, { id: team.id })).name).toBe(body.name);
    expect(await lastEntry()).toMatchObject({
      action: 'team.renamed',
      userId: admin.caller.userId,
      from: { name: 'Weir & Sons' },
      to: { name: 'Weir & Daughters' },
    });
    for (const name of ['', '  ', 'x'.repeat(121), 5, null])
      await admin.agent.patch('/api/team').send({ name }).expect(400);
  });

  it('gives members other roles, several at once, in force at the next request', async () => {
    const { body } = await admin.agent
      .patch(at(engineer))
      .send({ roles: ['reviewer', 'librarian', 'reviewer'] })
      .expect(200);
    expect(body.roles).toEqual(['librarian', 'reviewer']);
    expect(await rolesOf(engineer)).toEqual(['librarian', 'reviewer']);
    expect((await engineer.agent.get('/api/auth/me')).body.roles).toEqual(['librarian', 'reviewer']);
    expect(await lastEntry()).toMatchObject({
      action: 'member.roles-changed',
      objectId: String(engineer.caller.userId),
      from: { roles: ['engineer'] },
      to: { roles: ['librarian', 'reviewer'] },
    });
  });

  it.each([[[]], [['boss']], ['admin'], [null], [undefined]])('refuses the roles %j', async (roles) => {
    const { body } = await admin.agent.patch(at(engineer)).send({ roles }).expect(400);
    expect(body.errors).toMatchObject([{ field: 'roles' }]);
    expect(await rolesOf(engineer)).toEqual(['engineer']);
  });

  it('ends a removed member’s session at the next request, and keeps their work', async () => {
    await admin.agent.patch(at(engineer)).send({ roles: ['librarian'] });
    const { id } = await createOpAmp(engineer);
    await admin.agent.delete(at(engineer)).expect(204);
    expect((await engineer.agent.get('/api/op-amps').expect(401)).body.code).toBe('session.missing');
    await engineer.agent.get('/api/auth/me').expect(401);
    await admin.agent.get(`/api/op-amps/${id}`).expect(200);
    expect(await lastEntry()).toMatchObject({ action: 'member.removed', from: { roles: ['librarian'] } });
    await admin.agent.delete(at(engineer)).expect(404);
  });

  it('is left by oneself', async () => {
    await engineer.agent.delete('/api/team/membership').expect(204);
    await engineer.agent.get('/api/auth/me').expect(401);
    expect(await rolesOf(engineer)).toBeNull();
    expect(await lastEntry()).toMatchObject({ action: 'member.left', userId: engineer.caller.userId });
  });

  it('keeps its last admin: no leaving, no removal, no other roles', async () => {
    await owner.agent.delete(at(admin)).expect(204);
    const answers = [
      await owner.agent.delete('/api/team/membership'),
      await owner.agent.delete(at(owner)),
      await owner.agent.patch(at(owner)).send({ roles: ['engineer'] }),
    ];
    expect(answers.map(({ status, body }) => [status, body.code])).toEqual(
      answers.map(() => [409, 'team.last-admin']),
    );
    expect(await rolesOf(owner)).toEqual(['admin']);
    await owner.agent
      .patch(at(owner))
      .send({ roles: ['admin', 'engineer'] })
      .expect(200);
  });

  it('keeps its owner until it is handed over to another admin', async () => {
    const hand = (to: TestMember, by = owner) =>
      by.agent.post('/api/team/owner').send({ memberId: String(to.caller.userId) });
    expect((await admin.agent.delete(at(owner)).expect(409)).body.code).toBe('team.owner');
    const { body } = await hand(engineer).expect(422);
    expect(body).toMatchObject({ code: 'team.owner-invalid', errors: [{ field: 'memberId' }] });
    await hand(stranger).expect(404);
    await hand(admin, engineer).expect(403);
    await hand(admin).expect(204);
    expect((await members()).filter(({ isOwner }) => isOwner).map(({ id }) => id)).toEqual([
      String(admin.caller.userId),
    ]);
    expect(await lastEntry()).toMatchObject({ action: 'team.handed-over', objectLabel: 'Weir & Sons' });
    await owner.agent.delete('/api/team/membership').expect(204);
  });

  it('lets one of two admins win who demote each other at once', async () => {
    const other = await signInMember(app, team, ['admin']);
    const answers = await Promise.all([
      admin.agent.patch(at(other)).send({ roles: ['engineer'] }),
      other.agent.patch(at(admin)).send({ roles: ['engineer'] }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 403]);
    expect(
      [await rolesOf(admin), await rolesOf(other)].filter((roles) => roles?.includes('admin')),
    ).toHaveLength(1);
  });

  it('is its own: other members and other teams change nothing of it', async () => {
    for (const member of [engineer, stranger]) {
      const status = member === engineer ? 403 : 404;
      await member.agent
        .patch(at(admin))
        .send({ roles: ['engineer'] })
        .expect(status);
      await member.agent.delete(at(admin)).expect(status);
    }
    await engineer.agent.patch('/api/team').send({ name: 'Mine' }).expect(403);
    expect(await members(stranger)).toHaveLength(1);
    for (const id of ['0', 'x', '99999999999'])
      await admin.agent.delete(`/api/team/members/${id}`).expect(404);
    expect(await rolesOf(admin)).toEqual(['admin', 'librarian']);
  });
});
