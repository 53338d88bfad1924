import { infiniteQueryOptions, keepPreviousData } from '@tanstack/react-query';

/** One page of a long answer. */
interface Page {
  items: readonly unknown[];
  total: number;
}

/** A long answer in pages; the one before it stays until the next is there. */
export function pagesQuery<Loaded extends Page>(
  queryKey: readonly unknown[],
  load: (offset: number, signal: AbortSignal) => Promise<Loaded>,
) {
  return infiniteQueryOptions({
    queryKey,
    queryFn: ({ pageParam, signal }) => load(pageParam, signal),
    initialPageParam: 0,
    getNextPageParam: (last: Loaded, pages: Loaded[]) => nextOffset(last.total, pages),
    placeholderData: keepPreviousData,
  });
}

export type PagesQuery<Loaded extends Page> = ReturnType<typeof pagesQuery<Loaded>>;

function nextOffset(total: number, pages: readonly Page[]): number | undefined {
  const loaded = pages.reduce((sum, { items }) => sum + items.length, 0);
  return pages.at(-1)?.items.length && loaded < total ? loaded : undefined;
}
