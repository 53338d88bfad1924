import { useEffect, useState } from 'react';

/** The value as it was before the last pause of so many milliseconds. */
export function useDebounced<Value>(value: Value, pause: number): Value {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), pause);
    return () => clearTimeout(timer);
  }, [value, pause]);
  return settled;
}
