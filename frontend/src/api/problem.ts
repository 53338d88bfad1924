import type { FieldError } from '@roothertz/common/parts';

interface ProblemDetails {
  code?: string;
  title?: string;
  detail?: string;
  errors?: FieldError[];
}

/** What the server refused or couldn't do. Decide by `code`, never by the text. */
export class ApiProblem extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    readonly detail: string,
    readonly errors: FieldError[] = [],
    /** Seconds to wait before another try, where the server says so. */
    readonly retryAfter: number | null = null,
  ) {
    super(detail);
    this.name = 'ApiProblem';
  }

  /** Nobody answered, or the server waits for its database: the same request may succeed later. */
  get isUnreachable(): boolean {
    return this.status === 0 || this.status === 502 || this.status === 503 || this.status === 504;
  }
}

export function problemOf(response: Response, body: unknown): ApiProblem {
  const details: ProblemDetails = typeof body === 'object' && body !== null ? body : {};
  const retryAfter = Number(response.headers.get('retry-after') ?? NaN);
  return new ApiProblem(
    response.status,
    details.code ?? 'server.unknown',
    details.detail ?? details.title ?? `The server answered with status ${response.status}.`,
    details.errors ?? [],
    Number.isFinite(retryAfter) ? retryAfter : null,
  );
}

export function unreachableProblem(): ApiProblem {
  return new ApiProblem(0, 'server.unreachable', 'The server can’t be reached.');
}

/** The sentence to show for any error. */
export function detailOf(error: unknown): string {
  return error instanceof ApiProblem
    ? error.detail
    : 'Something went wrong in the page. Load it again; if it stays, tell your admin.';
}
