import { useEffect, useState } from 'react';
import { useSearchParams } from 'react-router-dom';

/** Seats that the page was opened to add, as its address says (`?add`): it is asked for once. */
export function useSeatsToAdd(): number {
  const [search, setSearch] = useSearchParams();
  const [isAsked] = useState(search.has('add'));
  useEffect(() => {
    if (isAsked) setSearch({}, { replace: true });
  }, [isAsked, setSearch]);
  return isAsked ? 1 : 0;
}
