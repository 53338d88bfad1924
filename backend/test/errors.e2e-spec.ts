import { startTestApp, type TestApp } from './support/index.js';

describe('errors', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  const send = (body: string, type = 'application/json') =>
    app.request.post('/api/auth/sign-in').set('Content-Type', type).send(body);

  it('answers with problem details that carry the correlation id', async () => {
    const answer = await app.request.get('/api/nothing').expect(404);
    expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    expect(JSON.parse(answer.text)).toEqual({
      type: 'urn:roothertz:problem:request.unknown-path',
      title: 'Nothing at this address',
      status: 404,
      detail: 'There is nothing at this address.',
      code: 'request.unknown-path',
      correlationId: answer.headers['x-correlation-id'],
    });
  });

  it('keeps a correlation id that the request brings, unless it could be harmful', async () => {
    const kept = await app.request.get('/api/health').set('X-Correlation-Id', 'trace-7');
    expect(kept.headers['x-correlation-id']).toBe('trace-7');
    const replaced = await app.request.get('/api/health').set('X-Correlation-Id', '<script>');
    expect(replaced.headers['x-correlation-id']).toMatch(/^[\da-f-]{36}$/);
  });

  it.each(['{"email": ', '"text"', 'null', '[1,', '\u0000'])(
    'refuses the malformed body %j',
    async (body) => {
      const answer = await send(body).expect(400);
      expect(answer.body.code).toBe('request.invalid');
    },
  );

  it.each(['[]', '[{"email": "a", "password": "b"}]', '{}'])(
    'refuses %s in place of the object',
    async (body) => {
      const answer = await send(body).expect(400);
      expect(answer.body.code).toBe('request.invalid');
    },
  );

  it('names every unknown, missing and wrong field', async () => {
    const answer = await send('{"email": 7, "colour": "red", "__proto__": {"admin": true}}').expect(400);
    expect(answer.body.errors).toEqual([
      { field: 'colour', message: 'unknown field' },
      { field: 'email', message: 'e-mail address: a text was expected' },
      { field: 'password', message: 'password: a text was expected' },
    ]);
  });

  it('refuses a body of more than 1 MB', async () => {
    const answer = await send(JSON.stringify({ email: 'x'.repeat(2 ** 20) })).expect(413);
    expect(answer.body.code).toBe('request.too-large');
  });

  it('refuses a body that is nested without end', async () => {
    const answer = await send(`{"email": ${'['.repeat(200_000)}${']'.repeat(200_000)}}`).expect(400);
    expect(answer.body.detail).toBe('The body is nested too deep.');
  });

  it('takes no body but JSON', async () => {
    const answer = await send('email=a&password=b', 'application/x-www-form-urlencoded').expect(400);
    expect(answer.body.code).toBe('request.invalid');
  });

  it('refuses a character set that it can’t read', async () => {
    const answer = await send('{}', 'application/json; charset=x-unknown').expect(415);
    expect(answer.body.code).toBe('request.unsupported');
  });

  it('refuses a malformed address', async () => {
    const answer = await app.request.get('/api/op-amps/%ff').expect(400);
    expect(answer.body.code).toBe('request.invalid');
  });

  it('says after how long a caller who asks too often may come back', async () => {
    for (let time = 0; time < 60; time++) await send('{}');
    const answer = await send('{}').expect(429);
    expect(answer.body.code).toBe('request.too-many');
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
  });
});
