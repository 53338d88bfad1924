import { NavLink } from 'react-router-dom';
import styles from './KindTabs.module.css';
import type { KindOfPart } from './kindOfPart';
import { OP_AMPS } from './opAmps';
import { PARTS_VIEWS, type PartsPlace, placeAddress } from './partsPlace';
import { RESISTORS } from './resistors';

const KINDS = [OP_AMPS, RESISTORS];

interface TabsProps {
  kind: KindOfPart;
  place: PartsPlace;
}

/** The same view of each kind of part. */
export function KindTabs({ place }: Pick<TabsProps, 'place'>) {
  return (
    <nav aria-label="Kinds of part" className={styles.tabs}>
      {KINDS.map((kind) => (
        <NavLink key={kind.path} to={placeAddress(kind, place)} end className={styles.tab}>
          {kind.title}s
        </NavLink>
      ))}
    </nav>
  );
}

/** The views of a kind's parts. */
export function ViewTabs({ kind }: Pick<TabsProps, 'kind'>) {
  return (
    <nav aria-label="Views of the parts" className={`${styles.tabs} ${styles.views}`}>
      {PARTS_VIEWS.map(({ place, label }) => (
        <NavLink key={place} to={placeAddress(kind, place)} end className={styles.tab}>
          {label}
        </NavLink>
      ))}
    </nav>
  );
}
