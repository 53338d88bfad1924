import type { ParameterDefinition } from '@roothertz/common/parts';
import styles from './PartsGrid.module.css';

/** A figure's heading: its symbol, or its name where it has none, over the unit of the whole column. */
export function FigureHeader({ parameter }: { parameter: ParameterDefinition }) {
  return (
    <span className={styles.figureHeader} title={parameter.label}>
      <span>{parameter.symbol ?? parameter.label}</span>
      <span className={styles.unit}>{parameter.displayUnit}</span>
    </span>
  );
}
