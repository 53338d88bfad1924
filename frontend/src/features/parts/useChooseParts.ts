import type { RowSelectionOptions, SelectionChangedEvent, SelectionColumnDef } from 'ag-grid-community';
import { useMemo } from 'react';
import type { StoredPart } from '../../api/parts';

const SELECTION: RowSelectionOptions<StoredPart> = {
  mode: 'multiRow',
  checkboxes: true,
  headerCheckbox: true,
  enableClickSelection: false,
};
const COLUMN: SelectionColumnDef = { pinned: 'left', width: 44, resizable: false };

const WORDS = {
  ariaHeaderSelection: 'Choose all parts listed',
  ariaRowToggleSelection: 'Press Space to choose the part or not',
};

/** Check boxes in the grid: one part each, a range with Shift, all that are listed on top. */
export function useChooseParts(onChoose: ((ids: ReadonlySet<string>) => void) | null) {
  return useMemo(() => {
    if (onChoose === null) return {};
    return {
      rowSelection: SELECTION,
      localeText: WORDS,
      selectionColumnDef: COLUMN,
      onSelectionChanged: ({ api }: SelectionChangedEvent<StoredPart>) =>
        onChoose(new Set(api.getSelectedRows().map(({ id }) => id))),
    };
  }, [onChoose]);
}
