import { Readable } from 'node:stream';
import { applyDecorators, StreamableFile } from '@nestjs/common';
import { ApiOkResponse } from '@nestjs/swagger';
import type { WrittenList } from './csv-lines.js';

/** Sends a list as a file to be saved. */
export function csvAnswer({ name, pieces }: WrittenList): StreamableFile {
  const plain = name.replace(/[^\w. -]/g, '_');
  return new StreamableFile(Readable.from(pieces), {
    type: 'text/csv',
    disposition: `attachment; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(name)}`,
  });
}

/** Documents that a route answers with a list. */
export function ApiCsv(): MethodDecorator {
  return applyDecorators(ApiOkResponse({ content: { 'text/csv': { schema: { type: 'string' } } } }));
}
