import { useMemo, useState } from 'react';
import { pricedQuantities } from './draft/draft';
import type { PriceDraft } from './usePriceDraft';

const USUAL = [1, 10, 100, 1000];

/** The quantities that have a column: the usual ones, those at which an offer has a price, and those added here. */
export function usePriceColumns({ rows, draft }: PriceDraft) {
  const [added, setAdded] = useState<readonly number[]>([]);
  const known = [...new Set([...USUAL, ...pricedQuantities(rows, draft), ...added])].sort((a, b) => a - b);
  const text = known.join();
  const quantities = useMemo(() => text.split(',').map(Number), [text]);
  return { quantities, addColumn: (quantity: number) => setAdded([...added, quantity]) };
}
