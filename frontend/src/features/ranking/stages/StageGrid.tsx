import { useMemo } from 'react';
import { BudgetLegend } from '../BudgetBar';
import styles from '../RankingGrid.module.css';
import { RowsGrid } from '../RowsGrid';
import { stageColumns } from './stageColumns';
import { stageRows } from './stageRows';
import type { ShownStages } from './useStages';

interface StageGridProps {
  stages: ShownStages;
  isStale: boolean;
  selectedId: string | null;
  onSelect: (id: string) => void;
  onNearEnd: () => void;
}

const TWO_LINES = 42;

/** The whole stages as rows under the source floor. */
export function StageGrid({ stages, ...state }: StageGridProps) {
  const { unit, priceHeading, floor, rows } = useMemo(() => stageRows(stages), [stages]);
  const { topology } = stages.request.conditions.stage;
  const columns = useMemo(() => stageColumns(unit, topology, priceHeading), [unit, topology, priceHeading]);
  const floorRows = useMemo(() => [floor], [floor]);
  return (
    <>
      <RowsGrid
        label="Whole stages"
        rows={rows}
        pinned={floorRows}
        columns={columns}
        rowHeight={TWO_LINES}
        {...state}
      />
      <p className={styles.legend}>
        <BudgetLegend rows={rows} />
      </p>
    </>
  );
}
