import { describe, expect, it } from 'vitest';
import { fakeServer, json, problem } from '../test/fakeServer';
import { OP_AMPS_API } from './opAmps';
import { ApiProblem } from './problem';
import { createQueryClient } from './queryClient';
import { SESSION_KEY, sessionQuery, signIn } from './session';
import { opAmp, sessionOf } from '../test/factories';

function failure(call: Promise<unknown>): Promise<ApiProblem> {
  return call.then(
    () => Promise.reject(new Error('the call was expected to fail')),
    (error: ApiProblem) => error,
  );
}

const CREDENTIALS = { email: 'a@tarnfield.example', password: 'x' };

describe('the API client', () => {
  it('turns problem details into an error with code, detail and fields', async () => {
    const errors = [{ field: 'amplifier.voltageNoise', message: 'a value above 0 was expected' }];
    fakeServer({
      'POST /api/op-amps': () => problem(422, 'part.invalid', { detail: 'Not a part.', errors }),
    });
    const error = await failure(OP_AMPS_API.create(opAmp()));
    expect(error).toBeInstanceOf(ApiProblem);
    expect(error).toMatchObject({ status: 422, code: 'part.invalid', detail: 'Not a part.', errors });
  });

  it('knows how long to wait after too many attempts', async () => {
    fakeServer({
      'POST /api/auth/sign-in': () => problem(429, 'request.too-many', {}, { 'Retry-After': '27' }),
    });
    expect((await failure(signIn(CREDENTIALS))).retryAfter).toBe(27);
  });

  it('says that the server can’t be reached where nobody answers', async () => {
    fakeServer({});
    const error = await failure(signIn(CREDENTIALS));
    expect(error).toMatchObject({ status: 0, code: 'server.unreachable', isUnreachable: true });
  });

  it('understands an error that isn’t problem details', async () => {
    fakeServer({ 'POST /api/auth/sign-in': () => new Response('<h1>Bad gateway</h1>', { status: 502 }) });
    expect(await failure(signIn(CREDENTIALS))).toMatchObject({ status: 502, code: 'server.unknown' });
  });

  it('carries the version of a part that is deleted', async () => {
    const asked = fakeServer({ 'DELETE /api/op-amps/41': () => new Response(null, { status: 204 }) });
    await OP_AMPS_API.remove('41', 3);
    expect(asked[0].url.search).toBe('?version=3');
  });

  it('reads a missing session as nobody, not as a failure', async () => {
    fakeServer({ 'GET /api/auth/me': () => problem(401, 'session.missing') });
    expect(await createQueryClient().fetchQuery(sessionQuery)).toBeNull();
  });

  it('forgets the session when another request finds that it is over', async () => {
    const queryClient = createQueryClient();
    queryClient.setQueryData(SESSION_KEY, sessionOf('engineer'));
    const lost = {
      queryKey: ['lost'],
      queryFn: () => Promise.reject(new ApiProblem(401, 'session.missing', '')),
    };
    await failure(queryClient.fetchQuery(lost));
    expect(queryClient.getQueryData(SESSION_KEY)).toBeNull();
  });

  it('asks again by itself while the database is away', async () => {
    let attempts = 0;
    fakeServer({
      'GET /api/auth/me': () =>
        ++attempts === 1 ? problem(503, 'database.unavailable') : json(sessionOf('engineer')),
    });
    const session = await createQueryClient().fetchQuery({ ...sessionQuery, retryDelay: 1 });
    expect(session).toEqual(sessionOf('engineer'));
    expect(attempts).toBe(2);
  });
});
