import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

async function startSignedIn(environment = {}): Promise<[TestApp, TestMember]> {
  const app = await startTestApp(environment);
  return [app, await signInMember(app, await createTeam(app), ['engineer'])];
}

const signOutFrom = ({ agent }: TestMember, origin: string) =>
  agent.post('/api/auth/sign-out').set('Origin', origin);

describe('origin check without a public origin', () => {
  let app: TestApp;
  let member: TestMember;

  beforeAll(async () => {
    [app, member] = await startSignedIn();
  });
  afterAll(() => app.close());

  it.each(['https://evil.example', 'null', 'http://127.0.0.1:1', 'not an origin'])(
    'refuses a change that comes from %s',
    async (origin) => {
      const answer = await signOutFrom(member, origin).expect(403);
      expect(answer.body.code).toBe('access.origin');
    },
  );

  it('lets changes through from its own pages and from programs that send no origin', async () => {
    const leaving = await signInMember(app, await createTeam(app), ['engineer']);
    await signOutFrom(leaving, await app.nest.getUrl()).expect(204);
    await leaving.agent.post('/api/auth/sign-out').expect(204);
  });

  it('lets reading through from anywhere, for a browser shows it to no other page', async () => {
    const answer = await member.agent.get('/api/auth/me').set('Origin', 'https://evil.example').expect(200);
    expect(answer.headers).not.toHaveProperty('access-control-allow-origin');
  });

  it('doesn’t believe a proxy that it isn’t told to trust', async () => {
    await signOutFrom(member, 'https://noise.example.org')
      .set('X-Forwarded-Host', 'noise.example.org')
      .expect(403);
  });
});

describe('origin check with a public origin', () => {
  it('takes only that origin for its own, by scheme and host', async () => {
    const [app, member] = await startSignedIn({ PUBLIC_ORIGIN: 'https://noise.example.org' });
    await signOutFrom(member, 'https://noise.example.org').expect(204);
    await signOutFrom(member, 'http://noise.example.org').expect(403);
    await signOutFrom(member, await app.nest.getUrl()).expect(403);
    await app.close();
  });
});

describe('origin check behind a trusted proxy', () => {
  it('takes the host that the proxy was asked for as its own', async () => {
    const [app, member] = await startSignedIn({ TRUST_PROXY: 'loopback' });
    await signOutFrom(member, 'https://noise.example.org')
      .set('X-Forwarded-Host', 'noise.example.org')
      .expect(204);
    await app.close();
  });
});
