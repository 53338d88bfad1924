import type { Duplicate } from '../../../api/parts';
import { Pages } from '../../../components/Pages';
import type { KindOfPart } from '../kindOfPart';
import { DuplicatePair } from './DuplicatePair';

interface DuplicatesListProps {
  kind: KindOfPart;
  pairs: readonly Duplicate[];
  total: number;
  page: number;
  pageSize: number;
  onPage: (page: number) => void;
}

/** The pairs of a page. */
export function DuplicatesList({ kind, pairs, total, page, pageSize, onPage }: DuplicatesListProps) {
  return (
    <>
      {pairs.map((pair) => (
        <DuplicatePair key={`${pair.one.id} ${pair.other.id}`} kind={kind} pair={pair} />
      ))}
      <Pages page={page} pageSize={pageSize} total={total} onChange={onPage} />
    </>
  );
}
