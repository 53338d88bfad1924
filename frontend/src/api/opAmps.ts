import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import type { Approval, InputType, Library, Lifecycle, OpAmpPart } from '@roothertz/common/parts';
import { answer, client } from './client';
import type { components } from './schema';

export type OpAmp = components['schemas']['OpAmpResponseDto'];

export interface OpAmpListQuery {
  search?: string;
  library?: Library[];
  inputType?: InputType[];
  lifecycle?: Lifecycle[];
  approval?: Approval[];
  sort?: string;
  limit?: number;
  offset?: number;
}

/** The most that the server gives in one page. */
export const LONGEST_PAGE = 1000;

const OP_AMPS_KEY = ['op-amps'] as const;

export const opAmpKeys = {
  all: OP_AMPS_KEY,
  one: (id: string) => [...OP_AMPS_KEY, 'one', id] as const,
};

export function opAmpsQuery(query: OpAmpListQuery) {
  return queryOptions({
    queryKey: [...OP_AMPS_KEY, 'list', query],
    queryFn: ({ signal }) => answer(client.GET('/api/op-amps', { params: { query }, signal })),
    placeholderData: keepPreviousData,
  });
}

export function opAmpQuery(id: string) {
  return queryOptions({
    queryKey: opAmpKeys.one(id),
    queryFn: ({ signal }) => answer(client.GET('/api/op-amps/{id}', { params: { path: { id } }, signal })),
  });
}

export function createOpAmp(part: OpAmpPart): Promise<OpAmp> {
  return answer(client.POST('/api/op-amps', { body: part }));
}

export function updateOpAmp(id: string, version: number, part: OpAmpPart): Promise<OpAmp> {
  return answer(client.PATCH('/api/op-amps/{id}', { params: { path: { id } }, body: { ...part, version } }));
}

export async function deleteOpAmp(id: string, version: number): Promise<void> {
  await answer(client.DELETE('/api/op-amps/{id}', { params: { path: { id }, query: { version } } }));
}
