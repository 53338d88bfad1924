export interface ErrorBody {
  type: 'invalid_request_error' | 'card_error' | 'api_error' | 'idempotency_error';
  message: string;
  code?: string;
  decline_code?: string;
  param?: string;
}

/** A refusal as the service words its own: status and error object. */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly body: ErrorBody,
  ) {
    super(body.message);
  }
}

export function invalid(message: string, details: { code?: string; param?: string } = {}): ApiError {
  return new ApiError(400, { type: 'invalid_request_error', message, ...details });
}

export function missing(what: string, id: string): ApiError {
  return new ApiError(404, {
    type: 'invalid_request_error',
    code: 'resource_missing',
    message: `No such ${what}: '${id}'`,
    param: 'id',
  });
}

export function declined(): ApiError {
  return new ApiError(402, {
    type: 'card_error',
    code: 'card_declined',
    decline_code: 'generic_decline',
    message: 'Your card was declined.',
  });
}
