import { ROW_STATES, type RowState } from '@roothertz/common/imports';

/** How many rows have each verdict. */
export type RowCounts = Record<RowState, number>;

export function noRows(): RowCounts {
  return Object.fromEntries(ROW_STATES.map((state) => [state, 0])) as RowCounts;
}

/** How many rows an import writes. */
export function acceptedRows(counts: RowCounts): number {
  return counts.new + counts.changed + counts.doubtful;
}
