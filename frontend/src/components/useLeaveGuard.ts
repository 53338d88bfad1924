import { useCallback, useEffect, useRef } from 'react';
import { useBlocker } from 'react-router-dom';

/** Asks before a page with unsaved changes is left; `release` lets the next step through. */
export function useLeaveGuard() {
  const isDirty = useRef(false);
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      isDirty.current && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => {
      if (isDirty.current) event.preventDefault();
    };
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, []);
  const markDirty = useCallback(() => {
    isDirty.current = true;
  }, []);
  const release = useCallback(() => {
    isDirty.current = false;
  }, []);
  return { blocker, markDirty, release };
}

/** Keeps a guard up as long as there are unsaved changes. */
export function useMarkedDirty({ markDirty, release }: ReturnType<typeof useLeaveGuard>, isDirty: boolean) {
  useEffect(() => (isDirty ? markDirty() : release()), [isDirty, markDirty, release]);
}
