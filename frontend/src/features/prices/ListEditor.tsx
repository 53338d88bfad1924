import type { CustomCellEditorProps } from 'ag-grid-react';
import { useEffect, useId, useRef } from 'react';
import styles from './PricesGrid.module.css';

interface ListEditorProps extends CustomCellEditorProps<unknown, string> {
  options: readonly string[];
}

/** A text cell that offers what is known while it is typed. */
export function ListEditor({ value, onValueChange, eventKey, options }: ListEditorProps) {
  const input = useRef<HTMLInputElement>(null);
  const listId = useId();
  const start = useRef({ eventKey, onValueChange });
  useEffect(() => {
    input.current?.focus();
    const { eventKey: key, onValueChange: begin } = start.current;
    if (key?.length === 1) begin(key);
    else input.current?.select();
  }, []);
  return (
    <>
      <input
        ref={input}
        list={listId}
        className={styles.editor}
        aria-label="Value"
        autoComplete="off"
        value={value ?? ''}
        onChange={(event) => onValueChange(event.target.value)}
      />
      <datalist id={listId}>
        {options.map((option) => (
          <option key={option} value={option} />
        ))}
      </datalist>
    </>
  );
}
