import { useSearchParams } from 'react-router-dom';
import type { Import, RowCounts, RowList } from '../../api/imports';

const BY_INTEREST = ['changed', 'doubtful', 'new', 'refused', 'unchanged'] as const;

/** The verdict whose rows are shown: the one of the address, else the most telling that there is. */
export function useRowList(imported: Import, counts: RowCounts): [RowList, (list: RowList) => void] {
  const [address, setAddress] = useSearchParams();
  const asked = address.get('rows');
  const lists: readonly RowList[] = imported.keptCount > 0 ? ['kept', ...BY_INTEREST] : BY_INTEREST;
  const first = lists.find((list) => countOf(imported, counts, list) > 0) ?? 'new';
  const list = lists.find((one) => one === asked) ?? first;
  return [list, (next) => setAddress({ rows: next }, { replace: true })];
}

export function countOf({ keptCount }: Pick<Import, 'keptCount'>, counts: RowCounts, list: RowList): number {
  return list === 'kept' ? keptCount : counts[list];
}
