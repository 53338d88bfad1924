import { APPROVALS, LIFECYCLES, RETIRED } from '@roothertz/common/parts';
import { Button, Select } from 'antd';
import { selectOptions } from '../../../components/optionLabels';
import styles from './StandingBar.module.css';
import type { Wanted } from './standingPlan';

interface StandingChoicesProps {
  wanted: Wanted;
  onWant: (wanted: Wanted) => void;
}

/** How chosen parts are to stand. */
export function StandingChoices({ wanted, onWant }: StandingChoicesProps) {
  return (
    <>
      <Select
        aria-label="Set lifecycle"
        placeholder="set lifecycle"
        allowClear
        className={styles.choice}
        popupMatchSelectWidth={false}
        options={selectOptions('lifecycle', LIFECYCLES)}
        value={wanted.lifecycle}
        onChange={(lifecycle) => onWant({ ...wanted, lifecycle })}
      />
      <Select
        aria-label="Set approval"
        placeholder="set approval"
        allowClear
        className={styles.choice}
        options={selectOptions('approval', APPROVALS)}
        value={wanted.approval}
        onChange={(approval) => onWant({ ...wanted, approval })}
      />
      <Button onClick={() => onWant(RETIRED)}>Retire</Button>
    </>
  );
}
