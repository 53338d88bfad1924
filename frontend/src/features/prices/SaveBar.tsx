import { Button } from 'antd';
import { MOST_OFFERS_SAVED } from '@roothertz/common/prices';
import { countOf } from '../../components/countOf';
import { DraftProblems } from './DraftProblems';
import type { CellProblem } from './draftProblems';
import styles from './SaveBar.module.css';
import type { PriceDraft } from './usePriceDraft';

interface SaveBarProps {
  draft: PriceDraft;
  problems: readonly CellProblem[];
  isPasting: boolean;
  isSaving: boolean;
  onSave: () => void;
  onShow: (problem: CellProblem) => void;
}

/** What isn't saved yet, what stands in its way, and how to save, undo or give it up. */
export function SaveBar({ draft, problems, isPasting, isSaving, onSave, onShow }: SaveBarProps) {
  const { changed, canUndo, canRedo, undo, redo, discard } = draft;
  const cells = changed.reduce((sum, [, change]) => sum + change.cells.size, 0);
  const isTooMany = changed.length > MOST_OFFERS_SAVED;
  return (
    <div className={styles.bar}>
      <div className={styles.words} role="status">
        {isPasting ? (
          'Loading the rows that are pasted into …'
        ) : problems.length > 0 ? (
          <DraftProblems draft={draft} problems={problems} onShow={onShow} />
        ) : isTooMany ? (
          `${countOf(changed.length, 'offer')} are changed: at most ${MOST_OFFERS_SAVED} can be saved at once.`
        ) : cells > 0 ? (
          `${countOf(cells, 'change')} in ${countOf(changed.length, 'offer')}, not saved yet.`
        ) : (
          <Hint />
        )}
      </div>
      <Button type="text" disabled={!canUndo} onClick={undo}>
        Undo
      </Button>
      <Button type="text" disabled={!canRedo} onClick={redo}>
        Redo
      </Button>
      <Button disabled={draft.draft.changes.size === 0} onClick={discard}>
        Discard
      </Button>
      <Button
        type="primary"
        disabled={cells === 0 || problems.length > 0 || isTooMany}
        loading={isSaving}
        onClick={onSave}
      >
        {cells === 0 ? 'Save' : `Save ${countOf(cells, 'change')}`}
      </Button>
    </div>
  );
}

function Hint() {
  return (
    <span className={styles.hint}>
      Type or press Enter to edit a cell, Tab for the next; paste from a spreadsheet with Ctrl+V, undo with
      Ctrl+Z, save with Ctrl+S.
    </span>
  );
}
