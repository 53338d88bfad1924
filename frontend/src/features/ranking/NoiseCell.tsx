import type { GridRow } from './gridRows';
import styles from './RankingGrid.module.css';

/** The total noise; with a target, whether it is met. */
export function NoiseCell({ text, meetsTarget }: GridRow['noise']) {
  if (meetsTarget === null) return text;
  return (
    <span className={meetsTarget ? styles.within : styles.beyond}>
      <span aria-hidden="true">{meetsTarget ? '✓' : '✕'}</span> {text}
      <span className="visually-hidden">{meetsTarget ? ' within target' : ' out of target'}</span>
    </span>
  );
}
