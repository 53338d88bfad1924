import { writeFile } from 'node:fs/promises';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '../app.module.js';
import { createOpenApiDocument } from './document.js';

const OPENAPI_FILE = new URL('../../openapi.json', import.meta.url);

const app = await NestFactory.create(AppModule, { preview: true, abortOnError: false, logger: ['error'] });
app.setGlobalPrefix('api');
await writeFile(OPENAPI_FILE, `${JSON.stringify(createOpenApiDocument(app), null, 2)}\n`);
await app.close();
