import createClient from 'openapi-fetch';
import { problemOf, unreachableProblem } from './problem';
import type { paths } from './schema';

export const client = createClient<paths>({
  baseUrl: window.location.origin,
  credentials: 'same-origin',
  fetch: (request) => globalThis.fetch(request),
});

interface Call<Data> {
  data?: Data;
  error?: unknown;
  response: Response;
}

/** The data of a call, or an `ApiProblem` where the server refuses it or can't be reached. */
export async function answer<Data>(call: Promise<Call<Data>>): Promise<Data> {
  const { data, error, response } = await call.catch((reason: unknown) => {
    if (reason instanceof DOMException && reason.name === 'AbortError') throw reason;
    throw unreachableProblem();
  });
  if (!response.ok) throw problemOf(response, error);
  return data as Data;
}
