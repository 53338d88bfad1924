import { CAUTION_DETAILS, CAUTION_LABELS } from '@roothertz/common/noise';
import { APPROVAL_LABELS, type Approval } from '@roothertz/common/parts';
import type { GridRow } from './gridRows';
import styles from './RankingGrid.module.css';

/** Part number and maker, then what one should know before relying on the row. */
export function PartCell({ name, library, maker, cautions, approval }: GridRow['part']) {
  const title = [
    [name, library, maker].filter(Boolean).join(' '),
    ...cautions.map((caution) => CAUTION_DETAILS[caution]),
  ].join('\n');
  return (
    <span className={styles.part} title={title}>
      {name && <strong className={styles.number}>{name}</strong>}
      {library && <span className={styles.library}>{library}</span>}
      <span className={styles.maker}>{maker}</span>
      {approval && <span className={styles.approval}>{APPROVAL_LABELS[approval as Approval]}</span>}
      {cautions.length > 0 && (
        <span className={styles.caution}>
          △ {CAUTION_LABELS[cautions[0]]}
          {cautions.length > 1 && ` +${cautions.length - 1}`}
        </span>
      )}
    </span>
  );
}
