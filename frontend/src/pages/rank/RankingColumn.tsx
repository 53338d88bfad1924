import { Answer } from '../../features/ranking/Answer';
import { Exclusions } from '../../features/ranking/Exclusions';
import { GridSkeleton } from '../../features/ranking/GridSkeleton';
import { RankingGrid } from '../../features/ranking/RankingGrid';
import type { ShownRanking } from '../../features/ranking/useRanking';
import styles from './RankPage.module.css';
import { ShortcutsButton } from './Shortcuts';

interface RankingColumnProps {
  ranking: ShownRanking | undefined;
  isStale: boolean;
  note: string | null;
  selectedId: string | null;
  onSelect: (id: string) => void;
  onNearEnd: () => void;
}

export function RankingColumn({
  ranking,
  isStale,
  note,
  selectedId,
  onSelect,
  onNearEnd,
}: RankingColumnProps) {
  return (
    <section id="answer" aria-label="Answer" className={styles.ranking}>
      <Answer ranking={ranking} stale={note} />
      {ranking && ranking.items.length > 0 && (
        <RankingGrid
          ranking={ranking}
          isStale={isStale}
          selectedId={selectedId}
          onSelect={onSelect}
          onNearEnd={onNearEnd}
        />
      )}
      {!ranking && note === null && <GridSkeleton />}
      {ranking && <Exclusions request={ranking.request} excluded={ranking.first.excluded} />}
      <p className={styles.caution}>
        Figures are estimates from typical data: verify on the bench and against the data sheet’s limits.
        Where a fault can hurt someone, noise is not the selection criterion: follow the applicable standards,
        local codes and a licensed engineer’s judgement. <ShortcutsButton />
      </p>
    </section>
  );
}
