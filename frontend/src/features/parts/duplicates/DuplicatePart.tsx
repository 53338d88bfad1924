import { RETIRED } from '@roothertz/common/parts';
import { Button } from 'antd';
import { Link } from 'react-router-dom';
import type { StoredPart } from '../../../api/parts';
import { optionLabel } from '../../../components/optionLabels';
import type { KindOfPart } from '../kindOfPart';
import { planStanding, type StandingPlan } from '../standing/standingPlan';
import styles from './Duplicates.module.css';

interface DuplicatePartProps {
  kind: KindOfPart;
  part: StoredPart;
  /** null = the member can't retire it. */
  onRetire: ((plan: StandingPlan) => void) | null;
}

/** One part of a pair, with what it is called, whose it is, and the act that leaves the other. */
export function DuplicatePart({ kind, part, onRetire }: DuplicatePartProps) {
  const { id, partNumber, manufacturer, library } = part;
  return (
    <div className={styles.part}>
      <span>
        <Link to={`${kind.path}/${id}`}>{partNumber}</Link>{' '}
        <span className={styles.quiet}>
          {manufacturer} · {optionLabel('library', library)}
        </span>
      </span>
      {onRetire && (
        <Button
          size="small"
          title="Makes it obsolete and not approved"
          aria-label={`Retire ${partNumber}`}
          onClick={() => onRetire(planStanding([part], RETIRED))}
        >
          Retire
        </Button>
      )}
    </div>
  );
}
