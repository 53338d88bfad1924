import styles from './PartsGrid.module.css';

interface FigureHeaderProps {
  name: string;
  help: string;
  unit: string;
}

/** A figure's heading over the unit of the whole column. */
export function FigureHeader({ name, help, unit }: FigureHeaderProps) {
  return (
    <span className={styles.figureHeader} title={help}>
      <span>{name}</span>
      <span className={styles.unit}>{unit}</span>
    </span>
  );
}
