import { DatabaseLink } from './support/database-link.js';
import { testConfig } from './support/database.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

describe('a lost database', () => {
  let link: DatabaseLink;
  let app: TestApp;
  let member: TestMember;

  beforeAll(async () => {
    const { DB_HOST, DB_PORT } = testConfig();
    link = new DatabaseLink(DB_HOST, DB_PORT);
    await link.mend();
    app = await startTestApp({ DB_HOST: '127.0.0.1', DB_PORT: String(link.port) });
    member = await signInMember(app, await createTeam(app), ['engineer']);
  });
  afterAll(async () => {
    await app.close();
    await link.cut();
  });

  it('is told as 503 and found again without a restart', async () => {
    const healthy = await app.request.get('/api/health').expect(200);
    expect(healthy.body).toEqual({ status: 'ok' });
    for (let time = 0; time < 2; time++) {
      await link.cut();
      const health = await app.request.get('/api/health').expect(503);
      expect(health.body.code).toBe('database.unavailable');
      const me = await member.agent.get('/api/auth/me').expect(503);
      expect(me.body.detail).toBe('The database can’t be reached: try again in a moment.');
      expect(me.headers['retry-after']).toBe('5');
      await link.mend();
      await app.request.get('/api/health').expect(200);
      await member.agent.get('/api/auth/me').expect(200);
    }
  });
});
