import { RESISTOR_CAUTION_DETAILS, RESISTOR_CAUTION_LABELS } from '@roothertz/common/noise';
import { Link } from 'react-router-dom';
import styles from '../RankingGrid.module.css';
import type { ResistorRow } from './resistorRows';

/** Part number, what one should know before relying on the row, and the maker where there is room. */
export function ResistorPartCell({ id, name, library, maker, cautions }: ResistorRow['part']) {
  const title = [
    [name, library, maker].filter(Boolean).join(' '),
    ...cautions.map((caution) => RESISTOR_CAUTION_DETAILS[caution]),
  ].join('\n');
  return (
    <span className={`${styles.part} ${styles.marked}`} title={title}>
      <span className={styles.lead}>
        <Link className={`${styles.number} ${styles.link}`} to={`/parts/resistors/${id}`}>
          {name}
        </Link>
        {library && <span className={styles.library}>{library}</span>}
        {cautions.length > 0 && (
          <span className={styles.caution}>
            △ {RESISTOR_CAUTION_LABELS[cautions[0]]}
            {cautions.length > 1 && ` +${cautions.length - 1}`}
          </span>
        )}
      </span>
      <span className={styles.maker}>{maker}</span>
    </span>
  );
}
