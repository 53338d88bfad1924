import { useId, useState } from 'react';
import { type Import, isRunning, type RowCounts } from '../../api/imports';
import { RowPages } from './RowPages';
import { useRowList } from './useRowList';
import styles from './Verdicts.module.css';
import { VerdictTabs } from './VerdictTabs';

interface VerdictsProps {
  imported: Import;
  /** The verdicts aren't those of the mapping that stands on the page. */
  isStale: boolean;
}

const ROWS_AT_ONCE = 25;
const REFUSED_AT_ONCE = 5;

/** What the import would do with each row; the last verdicts stay, greyed, until the next are there. */
export function Verdicts({ imported, isStale }: VerdictsProps) {
  const [counts, setCounts] = useState(imported.counts);
  if (imported.counts !== null && imported.counts !== counts) setCounts(imported.counts);
  if (counts === null) return <Unchecked imported={imported} />;
  return <CheckedRows imported={imported} counts={counts} isStale={isStale} />;
}

function Unchecked({ imported }: { imported: Import }) {
  if (isRunning(imported)) return null;
  return (
    <p className={styles.nothing}>
      The rows aren’t checked yet. Say what the columns are: at least the manufacturer and the part number.
    </p>
  );
}

function CheckedRows({ imported, counts, isStale }: VerdictsProps & { counts: RowCounts }) {
  const [list, choose] = useRowList(imported, counts);
  const panelId = useId();
  return (
    <div className={isStale ? styles.stale : undefined} aria-busy={isStale}>
      <VerdictTabs {...{ imported, counts, list, panelId }} onChoose={choose} />
      <div id={panelId} role="tabpanel" aria-label={`Rows: ${list}`} className={styles.panel}>
        <RowPages key={list} imported={imported} list={list} limit={ROWS_AT_ONCE} />
      </div>
      {list !== 'refused' && counts.refused > 0 && (
        <section className={styles.refused} aria-label="Refused">
          <h2>Refused</h2>
          <RowPages imported={imported} list="refused" limit={REFUSED_AT_ONCE} />
        </section>
      )}
    </div>
  );
}
