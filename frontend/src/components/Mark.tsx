import styles from './Mark.module.css';

/** The product's mark and name. */
export function Mark() {
  return (
    <span className={styles.mark}>
      <svg viewBox="0 0 20 20" width="20" height="20" aria-hidden="true">
        <path
          d="M2 11.5 4.6 10 8 16.5 12.6 3.5H18"
          fill="none"
          stroke="var(--damson)"
          strokeWidth="1.8"
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      </svg>
      Roothertz
    </span>
  );
}
