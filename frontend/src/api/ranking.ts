import { infiniteQueryOptions, keepPreviousData } from '@tanstack/react-query';
import type { RankingRequest } from '@roothertz/common/conditions';
import { answer, client } from './client';
import type { components } from './schema';

export type Ranking = components['schemas']['RankingResponseDto'];
export type RankingItem = Ranking['items'][number];
export type Exclusions = components['schemas']['ExclusionListDto'];
export type ExcludedPart = Exclusions['items'][number];

const RANKINGS_KEY = ['rankings'] as const;
const PAGE = 100;

/** A page of a ranking together with what was asked, so that figures and conditions never come apart. */
export interface RankingPage extends Ranking {
  request: RankingRequest;
}

/** The ranking, quietest first, in pages; the one before it stays until the next is there. */
export function rankingQuery(request: RankingRequest) {
  return infiniteQueryOptions({
    queryKey: [...RANKINGS_KEY, 'op-amps', request],
    queryFn: async ({ pageParam, signal }): Promise<RankingPage> => {
      const body = { ...request, sort: 'inputNoiseRms' as const, limit: PAGE, offset: pageParam };
      const page = await answer(client.POST('/api/rankings/op-amps', { body, signal }));
      return { ...page, request };
    },
    initialPageParam: 0,
    getNextPageParam: (last, pages) => nextOffset(last.total, pages),
    placeholderData: keepPreviousData,
  });
}

/** The parts that a ranking leaves out, each with its reason, in pages. */
export function exclusionsQuery(request: RankingRequest) {
  return infiniteQueryOptions({
    queryKey: [...RANKINGS_KEY, 'exclusions', request],
    queryFn: ({ pageParam, signal }) => {
      const body = { ...request, limit: PAGE, offset: pageParam };
      return answer(client.POST('/api/rankings/op-amps/exclusions', { body, signal }));
    },
    initialPageParam: 0,
    getNextPageParam: (last, pages) => nextOffset(last.total, pages),
    placeholderData: keepPreviousData,
  });
}

function nextOffset(total: number, pages: readonly { items: readonly unknown[] }[]): number | undefined {
  const loaded = pages.reduce((sum, { items }) => sum + items.length, 0);
  return pages.at(-1)?.items.length && loaded < total ? loaded : undefined;
}
