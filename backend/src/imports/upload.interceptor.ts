import { randomUUID } from 'node:crypto';
import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Request, RequestHandler, Response } from 'express';
import multer, { diskStorage, MulterError } from 'multer';
import { catchError, from, type Observable, switchMap, throwError } from 'rxjs';
import { DomainError } from '../shared/errors/domain-error.js';
import { ImportFiles } from './import-files.service.js';

const LARGEST_FILE = 100 * 1024 * 1024;

/** Writes the uploaded file to the disk as it comes in; it goes again where the request is refused. */
@Injectable()
export class UploadInterceptor implements NestInterceptor {
  private readonly receive: RequestHandler;

  constructor(private readonly files: ImportFiles) {
    this.receive = multer({
      storage: diskStorage({
        destination: (_request, _file, done) => done(null, files.directory),
        filename: (_request, _file, done) => done(null, `${randomUUID()}.csv`),
      }),
      defParamCharset: 'utf8',
      limits: { fileSize: LARGEST_FILE, files: 1, fields: 5, fieldSize: 1000 },
    }).single('file');
  }

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const http = context.switchToHttp();
    const request = http.getRequest<Request>();
    return from(this.take(request, http.getResponse<Response>())).pipe(
      switchMap(() => next.handle()),
      catchError((error: unknown) => {
        const name = request.file?.filename;
        const removed = name === undefined ? Promise.resolve() : this.files.remove(name);
        return from(removed).pipe(switchMap(() => throwError(() => error)));
      }),
    );
  }

  private async take(request: Request, response: Response): Promise<void> {
    this.files.ensureDirectory();
    await new Promise<void>((resolve, reject) => {
      void this.receive(request, response, (error?: unknown) =>
        error ? reject(toRefusal(error)) : resolve(),
      );
    });
    request.body = { ...(request.body as object) };
    if (request.file === undefined)
      throw new DomainError('request.invalid', 'The file is missing.', {
        errors: [{ field: 'file', message: 'file: a list was expected' }],
      });
  }
}

function toRefusal(error: unknown): unknown {
  if (error instanceof MulterError && error.code === 'LIMIT_FILE_SIZE')
    return new DomainError('import.too-large', 'The file is larger than 100 MB: split it.');
  if (error instanceof MulterError || isOfForm(error))
    return new DomainError('request.invalid', 'One file and its kind were expected as form data.');
  return error;
}

/** What the form’s parser throws for a body that is cut off or malformed has neither code nor status. */
function isOfForm(error: unknown): boolean {
  return error instanceof Error && !('code' in error);
}
