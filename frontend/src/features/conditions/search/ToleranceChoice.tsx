import { formatQuantity } from '@roothertz/common/units';
import listStyles from '../ConditionList.module.css';
import styles from './SearchFields.module.css';

/** Tolerances that resistors are sold with. */
const USUAL = [0.1, 0.05, 0.02, 0.01, 0.005, 0.0025, 0.001, 0.0005, 0.0002, 0.0001];

interface ToleranceChoiceProps {
  /** 0.01 = 1 %; null = any */
  most: number | null;
  onChange: (most: number | null) => void;
}

/** How wide the tolerance of a resistor may be. */
export function ToleranceChoice({ most, onChange }: ToleranceChoiceProps) {
  const offered = most === null || USUAL.includes(most) ? USUAL : [...USUAL, most].sort((a, b) => b - a);
  return (
    <span>
      <span className={styles.label}>tolerance at most</span>
      <select
        className={listStyles.choice}
        aria-label="tolerance of the resistors at most"
        value={most ?? ''}
        onChange={({ target }) => onChange(target.value === '' ? null : Number(target.value))}
      >
        <option value="">any</option>
        {offered.map((one) => (
          <option key={one} value={one}>
            {formatQuantity(one, 'fraction', { trim: true })}
          </option>
        ))}
      </select>
    </span>
  );
}
