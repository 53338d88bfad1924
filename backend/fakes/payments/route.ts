import { integer, type Reader, shape, text } from './params.js';
import { findIn, type State } from './state.js';

export interface Route {
  method: 'get' | 'post' | 'delete';
  path: string;
  answer: (state: State, params: unknown, id: string) => object;
}

function route<Params>(
  method: Route['method'],
  path: string,
  reader: Reader<Params>,
  answer: (state: State, params: Params, id: string) => object,
): Route {
  return { method, path, answer: (state, params, id) => answer(state, reader(params, ''), id) };
}

export function post<Params>(
  path: string,
  reader: Reader<Params>,
  answer: (state: State, params: Params, id: string) => object,
): Route {
  return route('post', path, reader, answer);
}

export function remove<Params>(
  path: string,
  reader: Reader<Params>,
  answer: (state: State, params: Params, id: string) => object,
): Route {
  return route('delete', path, reader, answer);
}

export function retrieve(path: string, what: string, kept: (state: State) => Record<string, object>): Route {
  return route('get', path, shape({}), (state, _, id) => findIn(kept(state), id, what));
}

/** What every list takes. */
export const listShape = { limit: integer(1, 100), starting_after: text };

/** A list, the newest first, page by page. */
export function listRoute<Params extends { limit?: number; starting_after?: string }>(
  path: string,
  reader: Reader<Params>,
  items: (state: State, params: Params) => { id: string; created?: number }[],
): Route {
  return route('get', path, reader, (state, params) => {
    const { limit = 10, starting_after: after } = params;
    const newestFirst = [...items(state, params)].reverse();
    const start = after === undefined ? 0 : newestFirst.findIndex(({ id }) => id === after) + 1;
    const data = newestFirst.slice(start, start + limit);
    return { object: 'list', url: path, has_more: newestFirst.length > start + limit, data };
  });
}
