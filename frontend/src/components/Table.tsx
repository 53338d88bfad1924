import type { ComponentProps } from 'react';
import styles from './Table.module.css';

interface TableProps extends ComponentProps<'table'> {
  /** On a narrow screen each row is a block of its own, without the head. */
  stacks?: boolean;
}

/** A table with a rule under each row; what its feature says of the cells goes before. */
export function Table({ stacks = false, className = '', ...rest }: TableProps) {
  return <table className={`${styles.table} ${stacks ? styles.stacked : ''} ${className}`} {...rest} />;
}
