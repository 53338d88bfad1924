import { APPROVALS, LIFECYCLES, RETIRED } from '@roothertz/common/parts';
import { Button, Select } from 'antd';
import { useState } from 'react';
import type { StoredPart } from '../../../api/parts';
import { FieldMessage } from '../../../components/FieldMessage';
import { selectOptions } from '../../../components/optionLabels';
import { countOf } from '../countOf';
import type { KindOfPart } from '../kindOfPart';
import { refusedWords } from './refusedWords';
import styles from './StandingBar.module.css';
import { isRetirement, planStanding, planWords, type Wanted } from './standingPlan';
import { useChangeStandings } from './useChangeStandings';

interface StandingBarProps {
  kind: KindOfPart;
  parts: readonly StoredPart[];
  /** Parts that match and aren't listed, so that they can't be chosen. */
  unlisted: number;
  onClear: () => void;
}

/** What can be done with the chosen parts: its outcome is said before it is done. */
export function StandingBar({ kind, parts, unlisted, onClear }: StandingBarProps) {
  const [wanted, setWanted] = useState<Wanted>({});
  const { mutate, isPending, error, reset } = useChangeStandings(kind);
  const plan = planStanding(parts, wanted);
  const isStated = wanted.lifecycle !== undefined || wanted.approval !== undefined;
  const want = (next: Wanted) => {
    reset();
    setWanted(next);
  };
  return (
    <section aria-label="Chosen parts" className={styles.bar}>
      <strong>{countOf(parts.length, 'part')} chosen</strong>
      <Select
        aria-label="Set lifecycle"
        placeholder="set lifecycle"
        allowClear
        className={styles.choice}
        popupMatchSelectWidth={false}
        options={selectOptions('lifecycle', LIFECYCLES)}
        value={wanted.lifecycle}
        onChange={(lifecycle) => want({ ...wanted, lifecycle })}
      />
      <Select
        aria-label="Set approval"
        placeholder="set approval"
        allowClear
        className={styles.choice}
        options={selectOptions('approval', APPROVALS)}
        value={wanted.approval}
        onChange={(approval) => want({ ...wanted, approval })}
      />
      <Button onClick={() => want(RETIRED)}>Retire</Button>
      <Button type="text" onClick={onClear}>
        Choose none
      </Button>
      {isStated && (
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
      {unlisted > 0 && (
        <p className={styles.unlisted}>
          {countOf(unlisted, 'more part')} match and {unlisted === 1 ? 'isn’t' : 'aren’t'} listed: narrow the
          list to reach them.
        </p>
      )}
      {error && <FieldMessage>{refusedWords(error)}</FieldMessage>}
    </section>
  );
}
