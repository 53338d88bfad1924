import { gapFields } from '@roothertz/common/parts';
import { Button } from 'antd';
import type { GapCounts as Counts } from '../../../api/parts';
import { grouped } from '../../../components/countOf';
import type { KindOfPart } from '../kindOfPart';
import styles from './Completeness.module.css';

interface GapCountsProps {
  kind: KindOfPart;
  counts: Counts;
  chosen: readonly string[];
  onChoose: (missing: readonly string[]) => void;
}

/** How many parts lack what; one of them narrows the list to these and opens its field in each row. */
export function GapCounts({ kind, counts, chosen, onChoose }: GapCountsProps) {
  const fields = new Map(gapFields(kind.catalogue).map((gap) => [gap.key, gap]));
  const [only] = chosen;
  const missing = counts.missing.filter(({ parameter, count }) => count > 0 || chosen.includes(parameter));
  return (
    <div>
      <div className={styles.counts} role="group" aria-label="What parts lack">
        {missing.map(({ parameter, count }) => {
          const isChosen = chosen.includes(parameter);
          return (
            <Button
              key={parameter}
              size="small"
              type={isChosen ? 'primary' : 'default'}
              aria-pressed={isChosen}
              title={fields.get(parameter)!.meaning}
              onClick={() => onChoose(isChosen ? [] : [parameter])}
            >
              {fields.get(parameter)!.label} {grouped(count)}
            </Button>
          );
        })}
      </div>
      <p className={styles.meaning}>
        {chosen.length === 1
          ? `${fields.get(only)!.meaning} What you enter counts as a data sheet’s typical value.`
          : 'Each gap weighs what the ranking can’t say without it. Choose one to fill it in part by part.'}
      </p>
    </div>
  );
}
