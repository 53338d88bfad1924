import { Subscription } from '../src/plans/entities/subscription.entity.js';
import { SeatsService } from '../src/teams/seats.service.js';
import { createOpAmp, opAmpBody } from './factories/op-amps.js';
import { conditionsBody } from './factories/conditions.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const DAY_MS = 86_400_000;
const inDays = (days: number) => new Date(Date.now() + days * DAY_MS);

describe('a team’s plan', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  const memberWith = async (facts: Partial<Subscription>): Promise<TestMember> => {
    const team = await createTeam(app);
    await app.dataSource.getRepository(Subscription).update({ teamId: team.id }, { status: null, ...facts });
    return signInMember(app, team, ['admin']);
  };
  const standingOf = async ({ agent }: TestMember) => {
    const { plan, standing, standingUntil } = (await agent.get('/api/auth/me').expect(200)).body;
    return { plan, standing, standingUntil };
  };

  it('lets everything be done in the trial, and leaves the team on Free with all that it has', async () => {
    const until = inDays(3);
    const admin = await memberWith({ trialEndsAt: until });
    expect(await standingOf(admin)).toEqual({
      plan: 'team',
      standing: 'trial',
      standingUntil: until.toISOString(),
    });
    const { id } = await createOpAmp(admin);
    await app.dataSource
      .getRepository(Subscription)
      .update({ teamId: admin.caller.teamId }, { trialEndsAt: inDays(-1) });
    expect(await standingOf(admin)).toMatchObject({ plan: 'free', standing: 'trial-over' });
    const { body } = await admin.agent.post('/api/op-amps').send(opAmpBody()).expect(402);
    expect(body).toMatchObject({
      code: 'access.plan',
      detail: expect.stringMatching(/trial is over.*under Plan/),
    });
    await admin.agent.get(`/api/op-amps/${id}`).expect(200);
    await admin.agent.post('/api/conditions').send(conditionsBody()).expect(201);
  });

  it('lets everything be done for fourteen days after a payment failed, then only read and exported', async () => {
    const admin = await memberWith({ status: 'past-due', seats: 3, pastDueSince: inDays(-13) });
    const { id } = await createOpAmp(admin);
    expect(await standingOf(admin)).toMatchObject({ plan: 'team', standing: 'past-due' });
    await app.dataSource
      .getRepository(Subscription)
      .update({ teamId: admin.caller.teamId }, { pastDueSince: inDays(-14.1) });
    expect(await standingOf(admin)).toMatchObject({ plan: 'team', standing: 'unpaid' });
    await isReadOnly(admin, id);
  });

  it('lets a cancelled team read and export, and deletes nothing', async () => {
    const admin = await memberWith({ status: 'active', seats: 3 });
    const { id } = await createOpAmp(admin);
    await app.dataSource
      .getRepository(Subscription)
      .update({ teamId: admin.caller.teamId }, { status: 'cancelled' });
    await isReadOnly(admin, id);
  });

  async function isReadOnly({ agent }: TestMember, partId: string): Promise<void> {
    const refused = [
      await agent.post('/api/op-amps').send(opAmpBody()),
      await agent.patch(`/api/op-amps/${partId}`).send({ version: 1, description: 'changed' }),
      await agent.delete(`/api/op-amps/${partId}?version=1`),
      await agent.post('/api/conditions').send(conditionsBody()),
      await agent.put('/api/prices/settings').send({ currency: 'EUR', staleAfterDays: 30 }),
    ];
    expect(refused.map(({ status, body }) => [status, body.code])).toEqual(
      refused.map(() => [402, 'access.read-only']),
    );
    const { body } = await agent.get(`/api/op-amps/${partId}`).expect(200);
    expect(body).toMatchObject({ version: 1, description: '' });
    const { text } = await agent.get('/api/op-amps.csv').expect(200);
    expect(text).toContain(body.partNumber);
    for (const path of ['/api/conditions', '/api/prices', '/api/imports', '/api/audit'])
      await agent.get(path).expect(200);
  }

  it('has a seat for each person that it is paid for, and no more when two are given at once', async () => {
    const admin = await memberWith({ status: 'active', seats: 2 });
    const seats = app.nest.get(SeatsService, { strict: false });
    const { teamId } = admin.caller;
    const give = () =>
      app.dataSource.transaction(async (manager) => {
        await seats.assertSeat(manager, teamId);
        await manager.query(`INSERT INTO users (email, name, password_hash) VALUES (UUID(), 'Guest', '')`);
        await manager.query(
          `INSERT INTO memberships (user_id, team_id, roles) SELECT LAST_INSERT_ID(), ?, 'reviewer'`,
          [teamId],
        );
      });
    const given = await Promise.allSettled([give(), give(), give()]);
    expect(given.filter(({ status }) => status === 'fulfilled').length).toBe(1);
    expect(given.find(({ status }) => status === 'rejected')).toMatchObject({
      reason: { code: 'access.seats', detail: expect.stringContaining('add a seat under Plan') },
    });
    expect(await seats.count(teamId)).toEqual({ seats: 2, used: 2 });
  });

  it('has one seat on Free', async () => {
    const { caller } = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
    const seats = app.nest.get(SeatsService, { strict: false });
    expect(await seats.count(caller.teamId)).toEqual({ seats: 1, used: 1 });
    await expect(
      app.dataSource.transaction((manager) => seats.assertSeat(manager, caller.teamId)),
    ).rejects.toMatchObject({ code: 'access.seats' });
  });
});
