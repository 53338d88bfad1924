import { dayOf } from '@roothertz/common/prices';
import { useMemo, useReducer } from 'react';
import type { PriceListRow, Supplier } from '../../api/prices';
import { type GridRow, toGridRow } from './draft/cells';
import {
  type CellEdit,
  changedRows,
  type Draft,
  EMPTY_DRAFT,
  rebased,
  type Refusal,
  withAddedRow,
  withEdits,
  withoutRefusals,
  withoutRow,
  withRefusals,
} from './draft/draft';
import { NO_HISTORY, stepHistory } from './draft/history';
import { type PasteTarget, pasteRectangle } from './draft/pasteRectangle';
import { plainRow, shownRows } from './draft/shownRows';

const NO_ROWS: readonly PriceListRow[] = [];
const NO_SUPPLIERS: readonly Supplier[] = [];

/** The rows of the grid with what isn't saved of them yet, each step of which can be undone. */
export function usePriceDraft(
  items: readonly PriceListRow[] = NO_ROWS,
  suppliers: readonly Supplier[] = NO_SUPPLIERS,
) {
  const [history, step] = useReducer(stepHistory, NO_HISTORY);
  const { present, past, future } = history;
  const listed = useMemo(() => items.map((item) => plainRow(toGridRow(item))), [items]);
  const rows = useMemo(
    () => shownRows(listed, present, { suppliers, today: dayOf(new Date()) }),
    [listed, present, suppliers],
  );
  const acts = useMemo(() => {
    const change = (to: (draft: Draft) => Draft) => step({ type: 'change', to });
    return {
      edit: (edits: readonly CellEdit[]) => change((draft) => withEdits(draft, edits)),
      paste: (target: PasteTarget, texts: readonly string[][]) =>
        change((draft) => pasteRectangle(draft, target, texts)),
      addRow: (row: GridRow) => change((draft) => withAddedRow(draft, row)),
      dropRow: (key: string) => change((draft) => withoutRow(draft, key)),
      keepMine: (current: GridRow) => change((draft) => rebased(draft, current)),
      leaveOut: () => change((draft) => withoutRefusals(draft, 'paste')),
      discard: () => change(() => EMPTY_DRAFT),
      undo: () => step({ type: 'undo' }),
      redo: () => step({ type: 'redo' }),
      refuse: (refusals: readonly Refusal[]) =>
        step({ type: 'note', to: (draft) => withRefusals(withoutRefusals(draft, 'server'), refusals) }),
      saved: () => step({ type: 'saved' }),
    };
  }, []);
  return {
    rows,
    draft: present,
    changed: changedRows(present),
    canUndo: past.length > 0,
    canRedo: future.length > 0,
    ...acts,
  };
}

export type PriceDraft = ReturnType<typeof usePriceDraft>;
