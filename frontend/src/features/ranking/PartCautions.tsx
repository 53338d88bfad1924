import { CAUTION_DETAILS, CAUTION_LABELS, type Caution } from '@roothertz/common/noise';
import styles from './PartBudget.module.css';

/** What makes the selected part's figures less certain than they look. */
export function PartCautions({ cautions }: { cautions: readonly Caution[] }) {
  if (cautions.length === 0) return null;
  return (
    <ul aria-label="Cautions" className={styles.cautions}>
      {cautions.map((caution) => (
        <li key={caution}>
          <span className={styles.caution}>△ {CAUTION_LABELS[caution]}.</span> {CAUTION_DETAILS[caution]}
        </li>
      ))}
    </ul>
  );
}
