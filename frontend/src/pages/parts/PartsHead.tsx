import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useMayDo } from '../../components/useMember';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { KindTabs, ViewTabs } from '../../features/parts/KindTabs';
import type { PartsPlace } from '../../features/parts/partsPlace';
import styles from './PartsPage.module.css';

interface PartsHeadProps {
  kind: KindOfPart;
  place: PartsPlace;
  /** The page in one line. */
  facts: ReactNode;
}

/** The head of every view of the parts: the kinds, the views, and the facts on a line. */
export function PartsHead({ kind, place, facts }: PartsHeadProps) {
  const mayEdit = useMayDo('parts.edit');
  return (
    <div className={styles.head}>
      <h1>Parts</h1>
      <KindTabs place={place} />
      <ViewTabs kind={kind} />
      {mayEdit && (
        <Link to={`${kind.path}/new`} className={styles.new}>
          New {kind.noun}
        </Link>
      )}
      <p className={styles.facts} role="status">
        {facts}
      </p>
    </div>
  );
}
