import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { type PartListFilter, standingOutcomeQuery } from '../../../api/parts';
import { FieldMessage } from '../../../components/FieldMessage';
import { countOf } from '../../../components/countOf';
import type { KindOfPart } from '../kindOfPart';
import { refusedWords } from './refusedWords';
import styles from './StandingBar.module.css';
import { StandingChoices } from './StandingChoices';
import { isRetirement, isStated, outcomeWords, type Wanted } from './standingPlan';
import { useChangeMatching } from './useChangeMatching';

interface MatchingBarProps {
  kind: KindOfPart;
  filter: PartListFilter;
  matching: number;
  onClear: () => void;
}

/** What can be done with all parts that match, listed or not: the server says the outcome before it is done. */
export function MatchingBar({ kind, filter, matching, onClear }: MatchingBarProps) {
  const [wanted, setWanted] = useState<Wanted>({});
  const outcome = useQuery(standingOutcomeQuery(kind.reader, filter, wanted));
  const { mutate, isPending, error, reset } = useChangeMatching(kind, filter);
  const want = (next: Wanted) => {
    reset();
    setWanted(next);
  };
  const failure = error ?? outcome.error;
  return (
    <section aria-label="Chosen parts" className={styles.bar}>
      <strong>All {countOf(matching, 'part')} that match chosen</strong>
      <StandingChoices wanted={wanted} onWant={want} />
      <Button type="text" onClick={onClear}>
        Choose none
      </Button>
      {isStated(wanted) && outcome.data && (
        <p className={styles.outcome} role="status">
          {outcomeWords(wanted, outcome.data)}{' '}
          <Button
            type="primary"
            disabled={outcome.data.changed === 0}
            loading={isPending}
            onClick={() => mutate({ wanted, outcome: outcome.data }, { onSuccess: onClear })}
          >
            {isRetirement(wanted) ? 'Retire' : 'Set'} {countOf(outcome.data.changed, 'part')}
          </Button>
        </p>
      )}
      {failure && <FieldMessage>{refusedWords(failure)}</FieldMessage>}
    </section>
  );
}
