import { RESISTOR_CAUTION_DETAILS, RESISTOR_CAUTION_LABELS } from '@roothertz/common/noise';
import { Link } from 'react-router-dom';
import styles from '../RankingGrid.module.css';
import type { ResistorRow } from './resistorRows';

/** Part number and maker, then what one should know before relying on the row. */
export function ResistorPartCell({ id, name, library, maker, cautions }: ResistorRow['part']) {
  const title = [
    [name, library, maker].filter(Boolean).join(' '),
    ...cautions.map((caution) => RESISTOR_CAUTION_DETAILS[caution]),
  ].join('\n');
  return (
    <span className={styles.part} title={title}>
      <Link className={styles.number} to={`/parts/resistors/${id}`}>
        {name}
      </Link>
      {library && <span className={styles.library}>{library}</span>}
      <span className={styles.maker}>{maker}</span>
      {cautions.length > 0 && (
        <span className={styles.caution}>
          △ {RESISTOR_CAUTION_LABELS[cautions[0]]}
          {cautions.length > 1 && ` +${cautions.length - 1}`}
        </span>
      )}
    </span>
  );
}
