import type { RankingRequest } from '@roothertz/common/conditions';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { rankingQuery, type RankingItem, type RankingPage } from '../../api/ranking';

/** A ranking that is shown, as far as it is loaded. */
export interface ShownRanking {
  /** What it was asked with: figures and conditions never come apart. */
  request: RankingRequest;
  first: RankingPage;
  items: readonly RankingItem[];
}

/** The ranking of a request; the last good one stays until the next is there. */
export function useRanking(request: RankingRequest, enabled: boolean) {
  const { data, error, isPlaceholderData, fetchNextPage, hasNextPage, isFetchingNextPage } = useInfiniteQuery(
    { ...rankingQuery(request), enabled },
  );
  const [pages, setPages] = useState(data?.pages);
  if (data && data.pages !== pages) setPages(data.pages);
  const ranking = useMemo(() => pages && shown(pages), [pages]);
  return {
    ranking,
    error,
    isStale: !enabled || isPlaceholderData || error !== null,
    loadMore: () => {
      if (hasNextPage && !isFetchingNextPage && !isPlaceholderData) void fetchNextPage();
    },
  };
}

function shown(pages: readonly RankingPage[]): ShownRanking {
  const [first] = pages;
  return { request: first.request, first, items: pages.flatMap(({ items }) => items) };
}
