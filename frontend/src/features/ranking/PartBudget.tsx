import type { RankingRequest } from '@roothertz/common/conditions';
import { CAUTION_DETAILS, CAUTION_LABELS } from '@roothertz/common/noise';
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
      {figures.cautions.length > 0 && (
        <ul className={styles.cautions}>
          {figures.cautions.map((caution) => (
            <li key={caution}>
              <span className={styles.caution}>△ {CAUTION_LABELS[caution]}.</span> {CAUTION_DETAILS[caution]}
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
