import type { ColumnMapping } from '@roothertz/common/imports';
import { OFFER_FIELDS } from '@roothertz/common/prices';
import { Figure } from '../../components/Figure';
import { QuantityInput } from '../../components/QuantityInput';
import styles from './MappingTable.module.css';

interface BreakQuantityProps {
  heading: string;
  mapped: ColumnMapping;
  canChange: boolean;
  onChange: (next: ColumnMapping) => void;
}

/** The quantity from which on the prices of a column hold. */
export function BreakQuantity({ heading, mapped, canChange, onChange }: BreakQuantityProps) {
  return (
    <span className={styles.spot}>
      from{' '}
      {canChange ? (
        <QuantityInput
          variant="inline"
          field={OFFER_FIELDS.minimumQuantity}
          label={`Quantity of ${heading}`}
          value={mapped.quantity}
          onCommit={(quantity) => onChange({ ...mapped, quantity })}
        />
      ) : (
        <Figure value={mapped.quantity} kind="count" />
      )}{' '}
      on
    </span>
  );
}
