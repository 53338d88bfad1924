import { Button } from 'antd';
import { useState } from 'react';
import type { StoredPart } from '../../../api/parts';
import { FieldMessage } from '../../../components/FieldMessage';
import { countOf, grouped } from '../../../components/countOf';
import type { KindOfPart } from '../kindOfPart';
import { refusedWords } from './refusedWords';
import styles from './StandingBar.module.css';
import { StandingChoices } from './StandingChoices';
import { isRetirement, isStated, planStanding, planWords, type Wanted } from './standingPlan';
import { useChangeStandings } from './useChangeStandings';

interface StandingBarProps {
  kind: KindOfPart;
  parts: readonly StoredPart[];
  /** Parts that match, of which not all are listed; null = all that could be chosen are. */
  matching: number | null;
  onClear: () => void;
  onChooseMatching: () => void;
}

/** What can be done with the chosen parts: its outcome is said before it is done. */
export function StandingBar({ kind, parts, matching, onClear, onChooseMatching }: StandingBarProps) {
  const [wanted, setWanted] = useState<Wanted>({});
  const { mutate, isPending, error, reset } = useChangeStandings(kind);
  const plan = planStanding(parts, wanted);
  const want = (next: Wanted) => {
    reset();
    setWanted(next);
  };
  return (
    <section aria-label="Chosen parts" className={styles.bar}>
      <strong>{countOf(parts.length, 'part')} chosen</strong>
      <StandingChoices wanted={wanted} onWant={want} />
      <Button type="text" onClick={onClear}>
        Choose none
      </Button>
      {isStated(wanted) && (
        <p className={styles.outcome} role="status">
          {planWords(plan)}{' '}
          <Button
            type="primary"
            disabled={plan.changed.length === 0}
            loading={isPending}
            onClick={() => mutate(plan, { onSuccess: onClear })}
          >
            {isRetirement(wanted) ? 'Retire' : 'Set'} {countOf(plan.changed.length, 'part')}
          </Button>
        </p>
      )}
      {matching !== null && (
        <p className={styles.unlisted}>
          These are the ones listed.{' '}
          <Button type="link" onClick={onChooseMatching}>
            Choose all {grouped(matching)} that match
          </Button>
        </p>
      )}
      {error && <FieldMessage>{refusedWords(error)}</FieldMessage>}
    </section>
  );
}
