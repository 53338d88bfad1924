import { useQueryClient, type Query } from '@tanstack/react-query';
import { Alert, Button } from 'antd';
import { useCallback, useSyncExternalStore } from 'react';
import { ApiProblem } from '../api/problem';

/** Says that the server doesn't answer, for as long as a query waits for it. */
export function UnreachableNotice() {
  const queryClient = useQueryClient();
  if (!useIsWaiting()) return null;
  const tryNow = () => void queryClient.refetchQueries({ predicate: isWaiting }, { cancelRefetch: true });
  return (
    <Alert
      banner
      type="warning"
      title="The database or server can’t be reached; it tries again by itself."
      action={
        <Button size="small" onClick={tryNow}>
          Try now
        </Button>
      }
    />
  );
}

function useIsWaiting(): boolean {
  const cache = useQueryClient().getQueryCache();
  const subscribe = useCallback((onChange: () => void) => cache.subscribe(onChange), [cache]);
  return useSyncExternalStore(subscribe, () => cache.getAll().some(isWaiting));
}

function isWaiting(query: Query<unknown, Error, unknown, readonly unknown[]>): boolean {
  const reason = query.state.fetchFailureReason;
  return query.isActive() && reason instanceof ApiProblem && reason.isUnreachable;
}
