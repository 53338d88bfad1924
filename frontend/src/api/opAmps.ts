import type { OpAmpPart } from '@roothertz/common/parts';
import { answer, client } from './client';
import { partQuery, type PartListQuery, type PartsApi } from './parts';
import type { components, operations } from './schema';

export type OpAmp = components['schemas']['OpAmpResponseDto'];

export const OP_AMPS_API: PartsApi<OpAmpPart, OpAmp> = {
  name: 'op-amps',
  list: (query, signal) => answer(client.GET('/api/op-amps', { params: { query: ownQuery(query) }, signal })),
  find: (id, signal) => answer(client.GET('/api/op-amps/{id}', { params: { path: { id } }, signal })),
  create: (part) => answer(client.POST('/api/op-amps', { body: part })),
  update: (id, version, part) =>
    answer(client.PATCH('/api/op-amps/{id}', { params: { path: { id } }, body: { ...part, version } })),
  duplicates: (query, signal) => answer(client.GET('/api/op-amps/duplicates', { params: { query }, signal })),
  gapCounts: (query, signal) =>
    answer(client.GET('/api/op-amps/completeness', { params: { query: ownQuery(query) }, signal })),
  changeStandings: (parts) => answer(client.PATCH('/api/op-amps', { body: { parts } })),
  standingOutcome: (filter, { lifecycle: toLifecycle, approval: toApproval }, signal) =>
    answer(
      client.GET('/api/op-amps/standings', {
        params: { query: { ...ownQuery(filter), toLifecycle, toApproval } },
        signal,
      }),
    ),
  changeMatching: (filter, body) =>
    answer(client.POST('/api/op-amps/standings', { params: { query: ownQuery(filter) }, body })),
  undoMatching: (id) => answer(client.POST('/api/op-amps/standings/{id}/undo', { params: { path: { id } } })),
  remove: (id, version) =>
    answer(client.DELETE('/api/op-amps/{id}', { params: { path: { id }, query: { version } } })),
};

export function opAmpQuery(id: string) {
  return partQuery(OP_AMPS_API, id);
}

type OwnQuery = operations['listOpAmps']['parameters']['query'];

/** The address names only parameters of this kind as missing. */
function ownQuery(query: PartListQuery): OwnQuery {
  return query as OwnQuery;
}
