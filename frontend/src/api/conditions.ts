import { queryOptions } from '@tanstack/react-query';
import type { OperatingConditions, RankingRequest } from '@roothertz/common/conditions';
import { answer, client } from './client';
import type { components } from './schema';

type ConditionsResponse = components['schemas']['ConditionsResponseDto'];

/** Named conditions as the team keeps them. */
export interface NamedConditions extends RankingRequest, Omit<ConditionsResponse, keyof RankingRequest> {}

export const NAMED_CONDITIONS_KEY = ['conditions'] as const;

/** All named conditions of the team. */
export const namedConditionsQuery = queryOptions({
  queryKey: NAMED_CONDITIONS_KEY,
  queryFn: async ({ signal }) => {
    const query = { limit: 1000, offset: 0 };
    const { items } = await answer(client.GET('/api/conditions', { params: { query }, signal }));
    return items.map(named);
  },
});

export async function createConditions(
  name: string,
  request: RankingRequest,
  partIds: string[],
): Promise<NamedConditions> {
  const body = { name, ...whole(request), partIds };
  return named(await answer(client.POST('/api/conditions', { body })));
}

export async function updateConditions(
  { id, version }: Pick<NamedConditions, 'id' | 'version'>,
  changes: { name: string } | { request: RankingRequest; partIds: string[] },
): Promise<NamedConditions> {
  const body = {
    ...('name' in changes ? changes : { ...whole(changes.request), partIds: changes.partIds }),
    version,
  };
  return named(await answer(client.PATCH('/api/conditions/{id}', { params: { path: { id } }, body })));
}

export async function deleteConditions({
  id,
  version,
}: Pick<NamedConditions, 'id' | 'version'>): Promise<void> {
  await answer(client.DELETE('/api/conditions/{id}', { params: { path: { id }, query: { version } } }));
}

/** A filter or target that is left out of a change would stay as it was. */
function whole({ conditions, filter = {}, target = {}, quantity }: RankingRequest) {
  return { conditions, filter, target, quantity };
}

/** The server fills in every default before it keeps conditions. */
function named(response: ConditionsResponse): NamedConditions {
  return { ...response, conditions: response.conditions as OperatingConditions };
}
