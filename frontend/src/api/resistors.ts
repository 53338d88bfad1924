import type { ResistorPart } from '@roothertz/common/parts';
import { answer, client } from './client';
import type { PartListQuery, PartsApi } from './parts';
import type { components, operations } from './schema';

export type StoredResistor = components['schemas']['ResistorResponseDto'];

export const RESISTORS_API: PartsApi<ResistorPart, StoredResistor> = {
  name: 'resistors',
  list: (query, signal) =>
    answer(client.GET('/api/resistors', { params: { query: ownQuery(query) }, signal })),
  find: (id, signal) => answer(client.GET('/api/resistors/{id}', { params: { path: { id } }, signal })),
  create: (part) => answer(client.POST('/api/resistors', { body: part })),
  update: (id, version, part) =>
    answer(client.PATCH('/api/resistors/{id}', { params: { path: { id } }, body: { ...part, version } })),
  duplicates: (query, signal) =>
    answer(client.GET('/api/resistors/duplicates', { params: { query }, signal })),
  gapCounts: (query, signal) =>
    answer(client.GET('/api/resistors/completeness', { params: { query: ownQuery(query) }, signal })),
  changeStandings: (parts) => answer(client.PATCH('/api/resistors', { body: { parts } })),
  standingOutcome: (filter, { lifecycle: toLifecycle, approval: toApproval }, signal) =>
    answer(
      client.GET('/api/resistors/standings', {
        params: { query: { ...ownQuery(filter), toLifecycle, toApproval } },
        signal,
      }),
    ),
  changeMatching: (filter, body) =>
    answer(client.POST('/api/resistors/standings', { params: { query: ownQuery(filter) }, body })),
  undoMatching: (id) =>
    answer(client.POST('/api/resistors/standings/{id}/undo', { params: { path: { id } } })),
  remove: (id, version) =>
    answer(client.DELETE('/api/resistors/{id}', { params: { path: { id }, query: { version } } })),
};

type OwnQuery = operations['listResistors']['parameters']['query'];

/** The address names only parameters of this kind as missing. */
function ownQuery(query: PartListQuery): OwnQuery {
  return query as OwnQuery;
}
