import { ROW_STATES } from '@roothertz/common/imports';
import type { KeyboardEvent } from 'react';
import type { Import, RowCounts, RowList } from '../../api/imports';
import { grouped } from '../../components/countOf';
import { countOf } from './useRowList';
import styles from './VerdictTabs.module.css';

interface VerdictTabsProps {
  imported: Import;
  counts: RowCounts;
  list: RowList;
  onChoose: (list: RowList) => void;
  panelId: string;
}

const TONES: Partial<Record<RowList, string>> = { doubtful: styles.doubtful, refused: styles.refused };

/** How many rows have each verdict; the chosen one's rows stand below. */
export function VerdictTabs({ imported, counts, list, onChoose, panelId }: VerdictTabsProps) {
  const lists: RowList[] = imported.keptCount > 0 ? [...ROW_STATES, 'kept'] : [...ROW_STATES];
  const step = (event: KeyboardEvent<HTMLElement>) => {
    const by = { ArrowRight: 1, ArrowLeft: -1 }[event.key];
    if (by === undefined) return;
    const next = (lists.indexOf(list) + by + lists.length) % lists.length;
    onChoose(lists[next]);
    (event.currentTarget.children[next] as HTMLElement).focus();
  };
  return (
    <div role="tablist" aria-label="Verdicts" className={styles.tabs} onKeyDown={step}>
      {lists.map((one) => (
        <button
          key={one}
          type="button"
          role="tab"
          aria-selected={one === list}
          aria-controls={panelId}
          tabIndex={one === list ? 0 : -1}
          className={styles.tab}
          onClick={() => onChoose(one)}
        >
          <span className={`${styles.count} ${countOf(imported, counts, one) > 0 ? (TONES[one] ?? '') : ''}`}>
            {grouped(countOf(imported, counts, one))}
          </span>{' '}
          {one}
        </button>
      ))}
    </div>
  );
}
