import type { NestExpressApplication } from '@nestjs/platform-express';
import { SchedulerRegistry } from '@nestjs/schedule';
import { Test } from '@nestjs/testing';
import supertest from 'supertest';
import { DataSource } from 'typeorm';
import { AppModule } from '../../src/app.module.js';
import { NOTICES } from '../../src/notices/notice-schedule.service.js';
import { AppConfig } from '../../src/config/app-config.js';
import { configureApp } from '../../src/http/configure-app.js';
import { serveOpenApi } from '../../src/openapi/serve-openapi.js';
import { prepareStructure } from '../../src/database/prepare-database.js';
import { createFreshDatabase, dropDatabase, testConfig } from './database.js';

export interface TestApp {
  nest: NestExpressApplication;
  config: AppConfig;
  dataSource: DataSource;
  /** A request of nobody in particular. */
  request: ReturnType<typeof supertest>;
  close(): Promise<void>;
}

/**
 * The whole application on a loopback port with a fresh, empty, migrated database of this suite.
 *
 *     const app = await startTestApp();                                   // beforeAll
 *     const team = await createTeam(app, { plan: 'free' });               // plan "team" when left out
 *     const { agent, caller } = await signInMember(app, team, ['librarian']);
 *     await agent.get('/api/op-amps').expect(200);
 *     await app.close();                                                  // afterAll
 *
 * `environment` sets variables, such as `{ PUBLIC_ORIGIN: 'https://noise.example.org' }`. One application
 * at a time in a test file: the session strategy is registered for the whole process. Notices are sent when a test
 * asks for them, never by the clock.
 */
export async function startTestApp(environment: Record<string, string> = {}): Promise<TestApp> {
  const config = testConfig(environment);
  await createFreshDatabase(testConfig());
  await prepareStructure(config);
  const nest = await startNest(config);
  const dataSource = nest.get(DataSource);
  const close = async () => {
    await nest.close();
    await dropDatabase(testConfig());
  };
  return { nest, config, dataSource, request: supertest(await nest.getUrl()), close };
}

async function startNest(config: AppConfig): Promise<NestExpressApplication> {
  const module = await Test.createTestingModule({ imports: [AppModule] })
    .overrideProvider(AppConfig)
    .useValue(config)
    .compile();
  const nest = module.createNestApplication<NestExpressApplication>({ bodyParser: false, logger: false });
  configureApp(nest);
  serveOpenApi(nest);
  await nest.listen(0, '127.0.0.1');
  nest.get(SchedulerRegistry, { strict: false }).deleteInterval(NOTICES);
  return nest;
}
