import type { RankingRequest } from '@roothertz/common/conditions';
import { useMemo } from 'react';
import { rankingQuery, type RankingPage } from '../../api/ranking';
import { useKeptPages } from '../../components/useKeptPages';

/** A ranking that is shown, as far as it is loaded. */
export interface Shown<Request, Page extends { items: readonly unknown[]; request: Request }> {
  /** What it was asked with: figures and conditions never come apart. */
  request: Request;
  first: Page;
  items: readonly Page['items'][number][];
}

export type ShownRanking = Shown<RankingRequest, RankingPage>;

/** The ranking of a request; the last good one stays until the next is there. */
export function useRanking(request: RankingRequest, enabled: boolean) {
  const { pages, ...state } = useKeptPages(rankingQuery(request), enabled);
  const ranking = useMemo(() => pages && shownOf<RankingRequest, RankingPage>(pages), [pages]);
  return { ranking, ...state };
}

export function shownOf<Request, Page extends { items: readonly unknown[]; request: Request }>(
  pages: readonly Page[],
): Shown<Request, Page> {
  const [first] = pages;
  return { request: first.request, first, items: pages.flatMap(({ items }) => items) };
}
