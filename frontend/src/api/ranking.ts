import type { RankingRequest } from '@roothertz/common/conditions';
import { answer, client } from './client';
import { pagesQuery } from './pages';
import type { components } from './schema';

export type Ranking = components['schemas']['RankingResponseDto'];
export type RankingItem = Ranking['items'][number];
export type Exclusions = components['schemas']['ExclusionListDto'];
export type PartName = components['schemas']['PartNameDto'];

export const RANKINGS_KEY = ['rankings'] as const;
export const PAGE = 100;

/** A page of a ranking together with what was asked, so that figures and conditions never come apart. */
export interface RankingPage extends Ranking {
  request: RankingRequest;
}

/** A part that a ranking leaves out, with the reason. */
export interface ExcludedPart<Reason extends string = string> {
  part: PartName;
  reason: Reason;
  detail: string;
}

/** The ranking, quietest first, in pages. */
export function rankingQuery(request: RankingRequest) {
  return pagesQuery([...RANKINGS_KEY, 'op-amps', request], async (offset, signal): Promise<RankingPage> => {
    const body = { ...request, sort: 'inputNoiseRms' as const, limit: PAGE, offset };
    const page = await answer(client.POST('/api/rankings/op-amps', { body, signal }));
    return { ...page, request };
  });
}

/** The parts that a ranking leaves out, each with its reason, in pages. */
export function exclusionsQuery(request: RankingRequest) {
  return pagesQuery([...RANKINGS_KEY, 'exclusions', request], (offset, signal) => {
    const body = { ...request, limit: PAGE, offset };
    return answer(client.POST('/api/rankings/op-amps/exclusions', { body, signal }));
  });
}
