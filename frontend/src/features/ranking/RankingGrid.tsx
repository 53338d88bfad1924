import { useMemo } from 'react';
import { BudgetLegend } from './BudgetBar';
import { gridColumns } from './gridColumns';
import { gridRows } from './gridRows';
import styles from './RankingGrid.module.css';
import { RowsGrid } from './RowsGrid';
import type { ShownRanking } from './useRanking';

interface RankingGridProps {
  ranking: ShownRanking;
  isStale: boolean;
  selectedId: string | null;
  onSelect: (id: string) => void;
  onNearEnd: () => void;
}

/** The ranking as rows under the source floor. */
export function RankingGrid({ ranking, ...state }: RankingGridProps) {
  const { unit, priceHeading, floor, rows } = useMemo(
    () => gridRows(ranking.first, ranking.items, ranking.request),
    [ranking],
  );
  const columns = useMemo(() => gridColumns(unit, priceHeading), [unit, priceHeading]);
  const floorRows = useMemo(() => [floor], [floor]);
  return (
    <>
      <RowsGrid label="Ranking" rows={rows} pinned={floorRows} columns={columns} {...state} />
      <p className={styles.legend}>
        <BudgetLegend rows={rows} />
      </p>
    </>
  );
}
