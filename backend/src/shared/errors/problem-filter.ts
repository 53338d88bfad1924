import { type ArgumentsHost, Catch, type ExceptionFilter, Logger } from '@nestjs/common';
import type { Response } from 'express';
import { PROBLEM_TYPE, toProblem } from './problem.js';
import { toDomainError } from './to-domain-error.js';

/** Answers every failed request with problem details; only what is the server's fault goes to the log. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(exception: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const error = toDomainError(exception);
    const problem = toProblem(error, String(response.locals.correlationId));
    if (problem.status >= 500) this.log(exception, problem.correlationId);
    if (response.headersSent) return;
    if (error.retryAfter !== undefined) response.setHeader('Retry-After', String(error.retryAfter));
    response.status(problem.status).type(PROBLEM_TYPE).send(JSON.stringify(problem));
  }

  private log(exception: unknown, correlationId: string): void {
    const text = exception instanceof Error ? (exception.stack ?? exception.message) : String(exception);
    this.logger.error(`[${correlationId}] ${text}`);
  }
}
