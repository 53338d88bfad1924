import { Button } from 'antd';
import { type ReactNode, useState } from 'react';
import { useFocusAfterChange } from '../../components/lostFocus';
import styles from './Account.module.css';

interface ChangeProps {
  term: string;
  /** What stands now. */
  value: ReactNode;
  verb: string;
  /** The form by which it is changed; `close` puts it away. */
  children: (close: (outcome: string) => void) => ReactNode;
}

/** One fact of the account on a line, and the form that changes it below when it is asked for. */
export function Change({ term, value, verb, children }: ChangeProps) {
  const [isOpen, setOpen] = useState(false);
  const [outcome, setOutcome] = useState('');
  const button = useFocusAfterChange<HTMLButtonElement>(outcome);
  const close = (words: string) => {
    setOpen(false);
    setOutcome(words);
  };
  const toggle = () => {
    setOpen(!isOpen);
    setOutcome('');
  };
  return (
    <li className={styles.row}>
      <span className={styles.term}>{term}</span>
      <span className={styles.what}>{value}</span>
      <Button
        ref={button}
        size="small"
        onClick={toggle}
        aria-expanded={isOpen}
        aria-label={`${isOpen ? 'Cancel' : verb}: ${term}`}
      >
        {isOpen ? 'Cancel' : verb}
      </Button>
      {isOpen && <div className={styles.open}>{children(close)}</div>}
      {outcome && (
        <p role="status" className={styles.open}>
          {outcome}
        </p>
      )}
    </li>
  );
}
