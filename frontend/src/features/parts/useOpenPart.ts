import type { CellClickedEvent, CellKeyDownEvent, FullWidthCellKeyDownEvent } from 'ag-grid-community';
import { useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';

type CellEvent = CellClickedEvent<StoredPart> | CellKeyDownEvent<StoredPart>;

const CHECKBOXES = 'ag-Grid-SelectionColumn';

/** Opens a part by Enter or a click on its row, but where the cell chooses or edits. */
export function useOpenPart(path: string) {
  const navigate = useNavigate();
  return useMemo(() => {
    const open = (event: CellEvent) => {
      const { data, column, node } = event;
      const acts = column.getColId() === CHECKBOXES || column.isCellEditable(node);
      if (data && !acts) void navigate(`${path}/${data.id}`);
    };
    return {
      onCellKeyDown: (event: CellKeyDownEvent<StoredPart> | FullWidthCellKeyDownEvent<StoredPart>) => {
        if ('column' in event && event.event instanceof KeyboardEvent && event.event.key === 'Enter')
          open(event);
      },
      onCellClicked: (event: CellClickedEvent<StoredPart>) => {
        const { target } = event.event ?? {};
        const onLink = target instanceof Element && target.closest('a') !== null;
        if (!onLink) open(event);
      },
    };
  }, [navigate, path]);
}
