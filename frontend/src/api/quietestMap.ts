import type { OperatingConditions, PartFilter } from '@roothertz/common/conditions';
import type { MapAxis } from '@roothertz/common/noise';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';
import { RANKINGS_KEY } from './ranking';
import type { components } from './schema';

export type QuietestMap = components['schemas']['QuietestMapResponseDto'];

export interface MapRequest {
  conditions: OperatingConditions;
  filter?: PartFilter;
  resistance: MapAxis;
  frequency: MapAxis;
}

/** Which part is quietest in each cell; the map before it stays until the next is there. */
export function quietestMapQuery(request: MapRequest) {
  return queryOptions({
    queryKey: [...RANKINGS_KEY, 'quietest-map', request],
    queryFn: ({ signal }) => answer(client.POST('/api/rankings/quietest-map', { body: request, signal })),
    placeholderData: keepPreviousData,
  });
}
