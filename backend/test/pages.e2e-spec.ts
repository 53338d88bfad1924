import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startTestApp, type TestApp } from './support/index.js';

describe('pages', () => {
  let app: TestApp;
  let pages: string;

  beforeAll(async () => {
    pages = await mkdtemp(join(tmpdir(), 'roothertz-pages-'));
    await mkdir(join(pages, 'assets'));
    await writeFile(join(pages, 'index.html'), '<title>Roothertz</title>');
    await writeFile(join(pages, 'favicon.svg'), '<svg/>');
    await writeFile(join(pages, 'assets', 'index-a1b2c3.js'), 'export {};');
    app = await startTestApp({ FRONTEND_DIST: pages });
  });
  afterAll(async () => {
    await app.close();
    await rm(pages, { recursive: true });
  });

  const open = (path: string) => app.request.get(path).set('Accept', 'text/html,*/*;q=0.8');

  it.each(['/', '/parts', '/parts/17?tab=notes', '/apiary'])(
    'answers %s with the page, never kept',
    async (path) => {
      const answer = await open(path).expect(200);
      expect(answer.text).toBe('<title>Roothertz</title>');
      expect(answer.headers['cache-control']).toBe('no-cache');
    },
  );

  it('lets browsers keep files with a hash in their name, and no others', async () => {
    const hashed = await app.request.get('/assets/index-a1b2c3.js').expect(200);
    expect(hashed.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    const plain = await app.request.get('/favicon.svg').expect(200);
    expect(plain.headers['cache-control']).toBe('no-cache');
  });

  it.each(['/api', '/api/nothing', '/assets/index-old.js'])(
    'doesn’t answer %s with the page',
    async (path) => {
      const answer = await open(path).expect(404);
      expect(answer.body.code).toBe('request.unknown-path');
    },
  );

  it('forbids the pages everything foreign', async () => {
    const { headers } = await open('/');
    expect(headers['content-security-policy']).toContain("default-src 'self'");
    expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers).not.toHaveProperty('x-powered-by');
  });

  it('never lets an answer of the API be kept', async () => {
    const { headers } = await app.request.get('/api/health');
    expect(headers['cache-control']).toBe('no-store');
  });
});
