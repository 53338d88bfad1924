/** Every way in which a request can fail: the status and the title that its problem details carry. */
export const ERROR_CODES = {
  'request.invalid': { status: 400, title: 'Invalid request' },
  'session.missing': { status: 401, title: 'Not signed in' },
  'session.wrong-credentials': { status: 401, title: 'Wrong e-mail or password' },
  'access.plan': { status: 402, title: 'Not in the team’s plan' },
  'plan.saved-conditions': { status: 402, title: 'Not in the team’s plan' },
  'session.no-team': { status: 403, title: 'No team' },
  'access.origin': { status: 403, title: 'Foreign origin' },
  'access.role': { status: 403, title: 'Not allowed' },
  'access.undeclared': { status: 403, title: 'Not allowed' },
  'part.curated': { status: 403, title: 'Curated part' },
  'request.unknown-path': { status: 404, title: 'Nothing at this address' },
  'part.not-found': { status: 404, title: 'Part not found' },
  'conditions.not-found': { status: 404, title: 'Conditions not found' },
  'part.stale': { status: 409, title: 'Part changed meanwhile' },
  'part.duplicate': { status: 409, title: 'Part exists already' },
  'conditions.stale': { status: 409, title: 'Conditions changed meanwhile' },
  'conditions.duplicate': { status: 409, title: 'Name is taken' },
  'request.too-large': { status: 413, title: 'Request too large' },
  'request.unsupported': { status: 415, title: 'Unsupported content' },
  'part.invalid': { status: 422, title: 'Invalid part' },
  'conditions.invalid': { status: 422, title: 'Invalid operating conditions' },
  'request.too-many': { status: 429, title: 'Too many requests' },
  'server.failed': { status: 500, title: 'Internal error' },
  'database.unavailable': { status: 503, title: 'Database not available' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ErrorCode = keyof typeof ERROR_CODES;
