import { dayOf } from '@roothertz/common/prices';
import { useMemo, useReducer } from 'react';
import type { PriceListRow } from '../../api/prices';
import { type GridRow, toGridRow } from './draft/cells';
import {
  type CellEdit,
  changedRows,
  type Draft,
  EMPTY_DRAFT,
  type Overrun,
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
import type { ReadContext } from './draft/readRow';
import { plainRow, shownRows } from './draft/shownRows';

/** The rows of the grid with what isn't saved of them yet, each step of which can be undone. */
export function usePriceDraft(
  items: readonly PriceListRow[],
  { suppliers, currency }: Omit<ReadContext, 'today'>,
) {
  const [history, step] = useReducer(stepHistory, NO_HISTORY);
  const { present, past, future } = history;
  const listed = useMemo(() => items.map((item) => plainRow(toGridRow(item))), [items]);
  const rows = useMemo(
    () => shownRows(listed, present, { suppliers, currency, today: dayOf(new Date()) }),
    [listed, present, suppliers, currency],
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
      refuse: (refusals: readonly Refusal[], overruns: ReadonlyMap<string, Overrun>) =>
        step({
          type: 'note',
          to: (draft) => ({ ...withRefusals(withoutRefusals(draft, 'server'), refusals), overruns }),
        }),
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
