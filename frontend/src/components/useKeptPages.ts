import { useInfiniteQuery, type UseInfiniteQueryResult } from '@tanstack/react-query';
import { useState } from 'react';
import type { PagesQuery } from '../api/pages';

/** The pages of an answer as far as they are loaded; the last good ones stay until the next are there. */
export function useKeptPages<Page extends { items: readonly unknown[]; total: number }>(
  query: PagesQuery<Page>,
  enabled: boolean,
) {
  const asked = useInfiniteQuery({ ...query, enabled });
  const { data, isPlaceholderData, fetchNextPage, hasNextPage, isFetchingNextPage, refetch } = asked;
  const error = asked.error ?? unanswered(asked);
  const [pages, setPages] = useState(data?.pages);
  if (data && data.pages !== pages) setPages(data.pages);
  return {
    pages,
    error,
    isLoadingMore: isFetchingNextPage,
    isStale: !enabled || isPlaceholderData || error !== null,
    retry: refetch,
    loadNext: fetchNextPage,
    loadMore: () => {
      if (hasNextPage && !isFetchingNextPage && !isPlaceholderData) void fetchNextPage();
    },
  };
}

/** Why there is no answer to the question yet, while the server can't be reached and is asked again and again. */
function unanswered({
  data,
  isPlaceholderData,
  failureReason,
}: Pick<UseInfiniteQueryResult, 'data' | 'isPlaceholderData' | 'failureReason'>): Error | null {
  return data === undefined || isPlaceholderData ? failureReason : null;
}
