import { CAUTION_DETAILS, CAUTION_LABELS } from '@roothertz/common/noise';
import { APPROVAL_LABELS, type Approval } from '@roothertz/common/parts';
import type { GridRow } from './gridRows';
import styles from './RankingGrid.module.css';

/** Part number and maker, and what tells of which part it is and how far to rely on it: the maker makes room for that. */
export function PartCell({ name, library, maker, cautions, approval }: GridRow['part']) {
  const title = [
    [name, library, maker].filter(Boolean).join(' '),
    ...cautions.map((caution) => CAUTION_DETAILS[caution]),
  ].join('\n');
  const isMarked = library !== null || approval !== null || cautions.length > 0;
  return (
    <span className={isMarked ? `${styles.part} ${styles.marked}` : styles.part} title={title}>
      {name && (
        <span className={styles.lead}>
          <strong className={styles.number}>{name}</strong>
          {library && <span className={styles.library}>{library}</span>}
          {approval && <span className={styles.approval}>{APPROVAL_LABELS[approval as Approval]}</span>}
          {cautions.length > 0 && (
            <span className={styles.caution}>
              △ {CAUTION_LABELS[cautions[0]]}
              {cautions.length > 1 && ` +${cautions.length - 1}`}
            </span>
          )}
        </span>
      )}
      <span className={styles.maker}>{maker}</span>
    </span>
  );
}
