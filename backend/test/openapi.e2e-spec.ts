import { readFile } from 'node:fs/promises';
import type { OpenAPIObject } from '@nestjs/swagger';
import { startTestApp, type TestApp } from './support/index.js';
import { operationsOf } from './support/operations.js';

const WRITTEN_FILE = new URL('../openapi.json', import.meta.url);

describe('OpenAPI', () => {
  let app: TestApp;
  let document: OpenAPIObject;

  beforeAll(async () => {
    app = await startTestApp();
    document = (await app.request.get('/api/docs-json').expect(200)).body as OpenAPIObject;
  });
  afterAll(() => app.close());

  it('is served as it is committed (else run: npm run openapi -w backend)', async () => {
    expect(document).toEqual(JSON.parse(await readFile(WRITTEN_FILE, 'utf8')));
  });

  it('names every operation once', () => {
    const names = operationsOf(document).map(({ operation }) => operation.operationId);
    expect(names.filter((name, index) => names.indexOf(name) !== index)).toEqual([]);
  });

  it('says of every operation what it answers', () => {
    const silent = operationsOf(document).filter(({ operation }) => {
      const answers = Object.entries(operation.responses ?? {}).filter(([status]) => status.startsWith('2'));
      return !answers.some(([status, answer]) => status === '204' || (answer && 'content' in answer));
    });
    expect(silent.map(({ operation }) => operation.operationId)).toEqual([]);
  });

  it('says of every operation that it may answer with problem details', () => {
    const silent = operationsOf(document).filter(({ operation }) => {
      return !JSON.stringify(operation.responses?.default ?? {}).includes('application/problem+json');
    });
    expect(silent.map(({ operation }) => operation.operationId)).toEqual([]);
  });

  it('shows its pages', async () => {
    const answer = await app.request.get('/api/docs').expect(200);
    expect(answer.text).toContain('swagger-ui');
  });
});
