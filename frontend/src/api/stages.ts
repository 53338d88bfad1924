import type { PartFilter, ResistorFilter } from '@roothertz/common/conditions';
import type { SoughtConditions, StageSort } from '@roothertz/common/noise';
import { answer, client } from './client';
import { pagesQuery } from './pages';
import { PAGE, RANKINGS_KEY } from './ranking';
import type { components } from './schema';

export type StageRanking = components['schemas']['StageRankingDto'];
export type StageItem = StageRanking['items'][number];
export type WholeStage = StageRanking['frontier'][number];

/** What whole stages are ranked by. */
export interface StageRequest {
  conditions: SoughtConditions;
  filter?: PartFilter;
  resistorFilter?: ResistorFilter;
  quantity?: number;
  sort?: StageSort;
  /** dB above the quietest stage, where they are sorted by price */
  within?: number;
}

export interface StagePage extends StageRanking {
  request: StageRequest;
}

/** Each op-amp with the network of library resistors that makes it quietest, in pages. */
export function stagesQuery(request: StageRequest) {
  return pagesQuery([...RANKINGS_KEY, 'stages', request], async (offset, signal): Promise<StagePage> => {
    const body = { ...request, limit: PAGE, offset };
    const page = await answer(client.POST('/api/rankings/stages', { body, signal }));
    return { ...page, request };
  });
}
