import type { ResistorPart } from '@roothertz/common/parts';
import { answer, client } from './client';
import type { PartsApi } from './parts';
import type { components } from './schema';

export type StoredResistor = components['schemas']['ResistorResponseDto'];

export const RESISTORS_API: PartsApi<ResistorPart, StoredResistor> = {
  name: 'resistors',
  list: (query, signal) => answer(client.GET('/api/resistors', { params: { query }, signal })),
  find: (id, signal) => answer(client.GET('/api/resistors/{id}', { params: { path: { id } }, signal })),
  create: (part) => answer(client.POST('/api/resistors', { body: part })),
  update: (id, version, part) =>
    answer(client.PATCH('/api/resistors/{id}', { params: { path: { id } }, body: { ...part, version } })),
  changeStandings: (parts) => answer(client.PATCH('/api/resistors', { body: { parts } })),
  remove: (id, version) =>
    answer(client.DELETE('/api/resistors/{id}', { params: { path: { id }, query: { version } } })),
};
