import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module.js';
import { AppConfig } from './config/app-config.js';
import { configureApp } from './http/configure-app.js';
import { serveOpenApi } from './openapi/serve-openapi.js';

async function start(): Promise<void> {
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    abortOnError: false,
    bodyParser: false,
    logger: ['warn', 'error'],
  });
  configureApp(app);
  serveOpenApi(app);
  const { HOST, PORT } = app.get(AppConfig);
  await app.listen(PORT, HOST);
  console.log(`Roothertz listens on ${await app.getUrl()}`);
}

start().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
