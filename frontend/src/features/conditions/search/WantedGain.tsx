import type { StageConditions } from '@roothertz/common/conditions';
import { formatQuantity } from '@roothertz/common/units';
import styles from './SearchFields.module.css';

interface WantedGainProps {
  stage: StageConditions;
  /** what was wanted before the network was taken into the schematic */
  wanted: number;
  onReturn: () => void;
}

/** Says that the network taken into the schematic gives a little more or less than was wanted, and leads back. */
export function WantedGain({ stage, wanted, onReturn }: WantedGainProps) {
  const isResistance = stage.topology === 'transimpedance';
  const text = (value: number) =>
    formatQuantity(value, isResistance ? 'resistance' : 'gain', { trim: true, digits: 6 });
  const given = isResistance
    ? `The resistor taken has ${text(stage.feedbackResistance!)}`
    : `The resistors taken give a gain of ${text(stage.gain!)}`;
  return (
    <p className={styles.taken} role="status">
      {given}; {text(wanted)} was wanted.{' '}
      <button type="button" className={styles.fill} onClick={onReturn}>
        Seek whole stages for {text(wanted)} again
      </button>
    </p>
  );
}
