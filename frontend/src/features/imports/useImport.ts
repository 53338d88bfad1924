import { hashKey, useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef } from 'react';
import { type Import, importKey, importQuery, isRunning } from '../../api/imports';

/** An import as the server has it; when work on it ends, everything that it may have changed is asked for again. */
export function useImport(id: string) {
  const query = useQuery(importQuery(id));
  const forget = useForgetOthers(id);
  const running = query.data !== undefined && isRunning(query.data);
  const wasRunning = useRef(running);
  useEffect(() => {
    if (wasRunning.current && !running) forget();
    wasRunning.current = running;
  }, [running, forget]);
  return query;
}

/** Takes an import as the server answered it. */
export function useTakeImport(): (imported: Import) => void {
  const queryClient = useQueryClient();
  return useCallback(
    (imported) => {
      queryClient.setQueryData(importKey(imported.id), imported);
      forgetOthers(queryClient, imported.id);
    },
    [queryClient],
  );
}

function useForgetOthers(id: string): () => void {
  const queryClient = useQueryClient();
  return useCallback(() => forgetOthers(queryClient, id), [queryClient, id]);
}

function forgetOthers(queryClient: ReturnType<typeof useQueryClient>, id: string): void {
  const known = hashKey(importKey(id));
  void queryClient.invalidateQueries({
    predicate: ({ queryHash, queryKey }) => queryHash !== known && queryKey[0] !== 'session',
  });
}
