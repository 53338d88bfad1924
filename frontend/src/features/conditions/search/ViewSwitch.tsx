import styles from '../StageSwitch.module.css';
import { VIEWS, type View } from './searchKeys';

const LABELS: Record<View, string> = {
  'op-amps': 'Op-amps',
  stages: 'Whole stages',
  resistors: 'Resistors',
};

/** Chooses what is ranked at the conditions. */
export function ViewSwitch({ view, onChange }: { view: View; onChange: (view: View) => void }) {
  return (
    <fieldset className={`${styles.switch} ${styles.start}`}>
      <legend className="visually-hidden">Ranked</legend>
      {VIEWS.map((known) => (
        <label key={known} className={styles.kind}>
          <input
            type="radio"
            name="view"
            className="visually-hidden"
            checked={known === view}
            onChange={() => onChange(known)}
          />
          {LABELS[known]}
        </label>
      ))}
    </fieldset>
  );
}
