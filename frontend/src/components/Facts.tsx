import type { ReactNode } from 'react';
import styles from './Facts.module.css';

interface FactsProps {
  label: string;
  entries: readonly { term: ReactNode; value: ReactNode; note?: ReactNode }[];
}

/** A list of terms with their values at the right, one rule under each. */
export function Facts({ label, entries }: FactsProps) {
  return (
    <dl className={styles.facts} aria-label={label}>
      {entries.map(({ term, value, note }, index) => (
        <div key={index} className={styles.entry}>
          <dt>{term}</dt>
          <dd>
            {value}
            {note !== undefined && <span className={styles.note}>{note}</span>}
          </dd>
        </div>
      ))}
    </dl>
  );
}
