import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { PagesQuery } from '../api/pages';

/** The pages of an answer as far as they are loaded; the last good ones stay until the next are there. */
export function useKeptPages<Page extends { items: readonly unknown[]; total: number }>(
  query: PagesQuery<Page>,
  enabled: boolean,
) {
  const { data, error, isPlaceholderData, fetchNextPage, hasNextPage, isFetchingNextPage, refetch } =
    useInfiniteQuery({ ...query, enabled });
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
