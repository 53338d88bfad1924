import { NavLink } from 'react-router-dom';
import styles from './KindTabs.module.css';
import { OP_AMPS } from './opAmps';
import { RESISTORS } from './resistors';

const KINDS = [OP_AMPS, RESISTORS];

/** The lists of the library, one for each kind of part. */
export function KindTabs() {
  return (
    <nav aria-label="Kinds of part" className={styles.tabs}>
      {KINDS.map(({ path, title }) => (
        <NavLink key={path} to={path} end className={styles.tab}>
          {title}s
        </NavLink>
      ))}
    </nav>
  );
}
