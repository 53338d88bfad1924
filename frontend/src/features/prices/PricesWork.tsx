import { type ReactNode, useCallback, useRef, useState } from 'react';
import type { PriceListRow, Supplier } from '../../api/prices';
import { LeaveQuestion } from '../../components/LeaveQuestion';
import { useLeaveGuard, useMarkedDirty } from '../../components/useLeaveGuard';
import { useMayDo } from '../../components/useMember';
import { ConfirmButton } from './ConfirmButton';
import { draftProblems } from './draftProblems';
import type { ShownRow } from './draft/shownRows';
import { PricePanel } from './history/PricePanel';
import { PricesGrid, type PricesGridHandle } from './PricesGrid';
import { PricesTools } from './PricesTools';
import styles from './PricesWork.module.css';
import { SaveBar } from './SaveBar';
import { useCloseOffer } from './useCloseOffer';
import { useConfirmPrices } from './useConfirmPrices';
import { usePriceColumns } from './usePriceColumns';
import { usePriceDraft } from './usePriceDraft';
import { useSavePrices } from './useSavePrices';

interface PricesWorkProps {
  items: readonly PriceListRow[];
  suppliers: readonly Supplier[];
  onSettings: () => void;
  /** What to do where there is no row. */
  children: ReactNode;
}

const NONE: readonly ShownRow[] = [];

/** The grid with what can be done in it and what isn't saved of it. */
export function PricesWork({ items, suppliers, onSettings, children }: PricesWorkProps) {
  const mayEdit = useMayDo('prices.edit');
  const draft = usePriceDraft(items, suppliers);
  const { quantities, addColumn } = usePriceColumns(draft);
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
  const sendable = draft.rows.flatMap(({ key, body }) => (body ? [{ key, body }] : []));
  const togglePanel = useCallback(() => setPanelOpen((isOpen) => !isOpen), []);
  return (
    <div className={styles.work}>
      <div className={styles.tools}>
        <PricesTools
          row={row}
          mayEdit={mayEdit}
          isPanelOpen={isPanelOpen}
          onNewOffer={draft.addRow}
          onCloseOffer={({ offer }) => offer && close.mutate(offer)}
          onPanel={togglePanel}
          onColumn={addColumn}
          onSettings={onSettings}
        />
        {mayEdit && (
          <ConfirmButton rows={draft.rows} selected={selected} isPending={isPending} onConfirm={confirm} />
        )}
      </div>
      {draft.rows.length === 0 ? (
        children
      ) : (
        <PricesGrid
          ref={grid}
          draft={draft}
          quantities={quantities}
          suppliers={suppliers}
          mayEdit={mayEdit}
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
          isSaving={save.isPending}
          onSave={() => save.mutate(sendable)}
          onShow={(problem) => grid.current?.focus({ key: problem.row.key, column: problem.column })}
        />
      )}
      <LeaveQuestion blocker={guard.blocker} />
    </div>
  );
}
