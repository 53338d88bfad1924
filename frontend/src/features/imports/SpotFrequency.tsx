import type { ColumnMapping } from '@roothertz/common/imports';
import type { QuantityField } from '@roothertz/common/parts';
import { Figure } from '../../components/Figure';
import { QuantityInput } from '../../components/QuantityInput';
import styles from './MappingTable.module.css';

interface SpotFrequencyProps {
  heading: string;
  mapped: ColumnMapping;
  canChange: boolean;
  onChange: (next: ColumnMapping) => void;
}

const FREQUENCY: QuantityField = {
  label: 'frequency',
  kind: 'frequency',
  bounds: { above: 0, to: 1e9 },
  help: 'At which the noise density is stated.',
};

/** The frequency at which a column states the noise density. */
export function SpotFrequency({ heading, mapped, canChange, onChange }: SpotFrequencyProps) {
  return (
    <span className={styles.spot}>
      at{' '}
      {canChange ? (
        <QuantityInput
          variant="inline"
          field={FREQUENCY}
          label={`Frequency of ${heading}`}
          value={mapped.frequency}
          onCommit={(frequency) => onChange({ ...mapped, frequency })}
        />
      ) : (
        <Figure value={mapped.frequency} kind="frequency" />
      )}
    </span>
  );
}
