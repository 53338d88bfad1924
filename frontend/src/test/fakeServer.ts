import { vi } from 'vitest';

type Answer = (body: unknown, url: URL) => Response;

/** What was asked of the fake server, in order. */
export interface Asked {
  route: string;
  body: unknown;
  url: URL;
}

/** Answers the page's requests by "METHOD /path"; anything else is an error of the test. */
export function fakeServer(answers: Record<string, Answer>): Asked[] {
  const asked: Asked[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    const url = new URL(request.url);
    const route = `${request.method} ${url.pathname}`;
    const body: unknown = request.body === null ? null : await request.clone().json();
    asked.push({ route, body, url });
    const answer = answers[route];
    if (answer === undefined) throw new TypeError(`nothing answers ${route}`);
    return answer(body, url);
  });
  return asked;
}

export function json(body: unknown, status = 200, headers: Record<string, string> = {}): Response {
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'Content-Type': 'application/json', ...headers },
  });
}

export function problem(
  status: number,
  code: string,
  more: { detail?: string; errors?: { field: string; message: string }[] } = {},
  headers: Record<string, string> = {},
): Response {
  const body = { type: `urn:roothertz:problem:${code}`, title: code, status, code, detail: code, ...more };
  return json(body, status, { 'Content-Type': 'application/problem+json', ...headers });
}
