import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module.js';
import { readConfig } from './config/read-config.js';
import { configureApp } from './http/configure-app.js';
import { serveOpenApi } from './openapi/serve-openapi.js';

async function start(): Promise<void> {
  const { HOST, PORT } = readConfig();
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    abortOnError: false,
    bodyParser: false,
    logger: ['warn', 'error'],
  });
  configureApp(app);
  serveOpenApi(app);
  await app.listen(PORT, HOST);
  console.log(`Roothertz listens on ${await app.getUrl()}`);
}

start().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
});
