import type { GridRow } from './gridRows';
import styles from './RankingGrid.module.css';

/** The place, with the bracket of the quiet set at its left. */
export function PlaceCell({ rank, bracket }: GridRow['place']) {
  return (
    <span className={styles.place} data-bracket={bracket ?? undefined}>
      {rank}
      {bracket && <span className="visually-hidden"> in the quiet set</span>}
    </span>
  );
}
