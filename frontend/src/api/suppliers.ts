import { queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';

const MOST = 1000;

/** The team's suppliers by their names. */
export function suppliersQuery() {
  return queryOptions({
    queryKey: ['suppliers'],
    queryFn: ({ signal }) =>
      answer(client.GET('/api/suppliers', { params: { query: { limit: MOST } }, signal })),
  });
}
