import { type Dialect, libraryAddress } from '../../api/imports';
import { KINDS, PART_LISTS } from './kinds';
import styles from './ExportLinks.module.css';

const MARKS: readonly [Dialect['decimalMark'], string][] = [
  ['point', 'decimal point'],
  ['comma', 'decimal comma'],
];

/** The team's own library as lists that come in again unchanged. */
export function ExportLinks() {
  return (
    <section className={styles.exports} aria-label="Export your library">
      <h2>Export your library as CSV</h2>
      {PART_LISTS.map((kind) => (
        <p key={kind}>
          {KINDS[kind].title}:{' '}
          {MARKS.map(([mark, words]) => (
            <a key={mark} href={libraryAddress(kind, mark)} download>
              with {words}
              <span className="visually-hidden">, {KINDS[kind].title.toLowerCase()}</span>
            </a>
          ))}
        </p>
      ))}
    </section>
  );
}
