import type { RankingRequest } from '@roothertz/common/conditions';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { BudgetTable } from './BudgetTable';
import { explainDominant } from './explain';
import { noiseKind } from './noiseUnit';
import styles from './PartBudget.module.css';
import type { SelectedPart } from './useSelectedPart';

/** What the selected part's noise is made of, in figures and in plain words. */
export function PartBudget({ selected, request }: { selected: SelectedPart; request: RankingRequest }) {
  const { part, figures } = selected;
  const explanation = useMemo(
    () => explainDominant(request.conditions, part.amplifier, figures),
    [request, part, figures],
  );
  return (
    <section aria-label={`Noise budget of ${part.partNumber}`} className={styles.part}>
      <h2 className={styles.heading}>
        Budget of <Link to={`/parts/${part.id}`}>{part.partNumber}</Link>
      </h2>
      <BudgetTable
        contributions={figures.contributions}
        total={figures.inputNoiseRms}
        kind={noiseKind(request.conditions.stage.topology)}
      />
      <p className={styles.explanation}>{explanation}</p>
    </section>
  );
}
