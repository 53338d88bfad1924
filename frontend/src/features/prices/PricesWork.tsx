import { type ReactNode, useCallback, useRef, useState } from 'react';
import { LeaveQuestion } from '../../components/LeaveQuestion';
import { useLeaveGuard, useMarkedDirty } from '../../components/useLeaveGuard';
import { useMayDo } from '../../components/useMember';
import { type CellProblem, draftProblems } from './draftProblems';
import { nextAddedKey } from './draft/draft';
import type { ShownRow } from './draft/shownRows';
import { PricePanel } from './history/PricePanel';
import { PricesGrid, type PricesGridHandle } from './PricesGrid';
import { PricesTools } from './PricesTools';
import styles from './PricesWork.module.css';
import { SaveBar } from './SaveBar';
import { useCloseOffer } from './useCloseOffer';
import { useConfirmPrices } from './useConfirmPrices';
import { usePaste } from './usePaste';
import { usePriceColumns } from './usePriceColumns';
import { usePriceDraft } from './usePriceDraft';
import type { PriceList } from './usePriceList';
import { useSavePrices } from './useSavePrices';

interface PricesWorkProps {
  list: PriceList;
  sort: string | undefined;
  onSort: (sort: string | undefined) => void;
  onSettings: () => void;
  /** What to do where there is no row. */
  children: ReactNode;
}

const NONE: readonly ShownRow[] = [];

/** The grid with what can be done in it and what isn't saved of it. */
export function PricesWork({ list, sort, onSort, onSettings, children }: PricesWorkProps) {
  const mayEdit = useMayDo('prices.edit');
  const draft = usePriceDraft(list.items, list);
  const { quantities, addColumn } = usePriceColumns(draft);
  const { paste, isPending: isPasting } = usePaste(draft, list);
  const { confirm, isPending } = useConfirmPrices();
  const close = useCloseOffer();
  const save = useSavePrices(draft);
  const guard = useLeaveGuard();
  useMarkedDirty(guard, draft.changed.length > 0);
  const grid = useRef<PricesGridHandle>(null);
  const [selected, setSelected] = useState(NONE);
  const [focusedKey, setFocusedKey] = useState<string | null>(null);
  const [isPanelOpen, setPanelOpen] = useState(false);
  const row = draft.rows.find(({ key }) => key === focusedKey);
  const problems = draftProblems(draft.rows);
  const togglePanel = useCallback(() => setPanelOpen((isOpen) => !isOpen), []);
  const show = ({ row: { key }, column }: CellProblem) => grid.current?.focus({ key, column });
  const addOffer = (part: ShownRow) => {
    grid.current?.edit({ key: nextAddedKey(draft.draft), column: 'supplier' });
    draft.addRow(part);
  };
  const submit = () => {
    const sendable = draft.rows.flatMap((one) => (one.body ? [{ row: one, body: one.body }] : []));
    if (problems.length > 0) show(problems[0]);
    else if (sendable.length > 0 && !save.isPending) save.mutate(sendable);
  };
  return (
    <div className={styles.work}>
      <PricesTools
        row={row}
        rows={draft.rows}
        selected={selected}
        list={list}
        mayEdit={mayEdit}
        isPanelOpen={isPanelOpen}
        isConfirming={isPending}
        onNewOffer={addOffer}
        onCloseOffer={({ offer }) => offer && close.mutate(offer)}
        onPanel={togglePanel}
        onColumn={addColumn}
        onSettings={onSettings}
        onConfirm={confirm}
      />
      {draft.rows.length === 0 ? (
        children
      ) : (
        <PricesGrid
          ref={grid}
          draft={draft}
          quantities={quantities}
          suppliers={list.suppliers}
          mayEdit={mayEdit}
          sort={sort}
          onSort={onSort}
          onEnd={list.loadMore}
          onPaste={paste}
          onSave={submit}
          onConfirm={confirm}
          onSelect={setSelected}
          onFocus={setFocusedKey}
        />
      )}
      {isPanelOpen && row && <PricePanel part={row.part} usedIn={row.usedIn} onClose={togglePanel} />}
      {mayEdit && (
        <SaveBar
          draft={draft}
          problems={problems}
          isPasting={isPasting}
          isSaving={save.isPending}
          onSave={submit}
          onShow={show}
        />
      )}
      <LeaveQuestion blocker={guard.blocker} />
    </div>
  );
}
