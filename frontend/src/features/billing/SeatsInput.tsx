import { MOST_SEATS } from '@roothertz/common/access';
import { InputNumber } from 'antd';
import styles from './Billing.module.css';

interface SeatsInputProps {
  id: string;
  value: number;
  least: number;
  onChange: (seats: number) => void;
}

/** A number of seats, with its label. */
export function SeatsInput({ id, value, least, onChange }: SeatsInputProps) {
  return (
    <span className={styles.seats}>
      <label htmlFor={id}>Seats</label>
      <InputNumber
        id={id}
        value={value}
        min={least}
        max={MOST_SEATS}
        precision={0}
        style={{ width: 96 }}
        onChange={(seats) => seats !== null && onChange(seats)}
      />
    </span>
  );
}
