import styles from './CautionList.module.css';

/** What a part's gaps mean, in words; nothing where it has none. */
export function CautionList({ cautions }: { cautions: readonly string[] }) {
  if (cautions.length === 0) return null;
  return (
    <ul className={styles.cautions} aria-label="Cautions">
      {cautions.map((caution) => (
        <li key={caution}>{caution}</li>
      ))}
    </ul>
  );
}
