import { formatQuantity } from '@roothertz/common/units';
import { useConditionsForm } from '../ConditionsContext';
import { feedbackResistanceOf } from './feedbackResistanceOf';
import styles from './Schematic.module.css';

/** R_f, which follows from the gain and can't be changed by itself. */
export function FeedbackResistance({ x, y }: { x: number; y: number }) {
  const { request } = useConditionsForm();
  const value = feedbackResistanceOf(request.conditions);
  return (
    <span className={styles.value} data-align="centre" style={{ left: x, top: y }} title="R_f, from the gain">
      {value === null ? '–' : formatQuantity(value, 'resistance')}
    </span>
  );
}
