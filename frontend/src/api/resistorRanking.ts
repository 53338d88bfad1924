import type { ResistorRankingRequest } from '@roothertz/common/conditions';
import { answer, client } from './client';
import { pagesQuery } from './pages';
import { PAGE, RANKINGS_KEY } from './ranking';
import type { components } from './schema';

export type ResistorRanking = components['schemas']['ResistorRankingDto'];
export type ResistorItem = ResistorRanking['items'][number];

export interface ResistorPage extends ResistorRanking {
  request: ResistorRankingRequest;
}

/** The resistors for a place, quietest first, in pages. */
export function resistorRankingQuery(request: ResistorRankingRequest) {
  return pagesQuery(
    [...RANKINGS_KEY, 'resistors', request],
    async (offset, signal): Promise<ResistorPage> => {
      const body = { ...request, sort: 'totalRms', limit: PAGE, offset };
      const page = await answer(client.POST('/api/rankings/resistors', { body, signal }));
      return { ...page, request };
    },
  );
}

/** The resistors that the ranking leaves out, each with its reason, in pages. */
export function resistorExclusionsQuery(request: ResistorRankingRequest) {
  return pagesQuery([...RANKINGS_KEY, 'resistor-exclusions', request], (offset, signal) => {
    const body = { ...request, limit: PAGE, offset };
    return answer(client.POST('/api/rankings/resistors/exclusions', { body, signal }));
  });
}
