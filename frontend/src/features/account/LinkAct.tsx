import { useMutation } from '@tanstack/react-query';
import { Button } from 'antd';
import type { ReactNode } from 'react';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Account.module.css';

interface LinkActProps {
  /** What the button will do, said before it is done. */
  children: ReactNode;
  verb: string;
  act: () => Promise<void>;
  done: ReactNode;
}

/** The one act that a link in an e-mail is for: it is done by a person, not by a program that looks into links. */
export function LinkAct({ children, verb, act, done }: LinkActProps) {
  const acting = useMutation({ mutationFn: act });
  if (acting.isSuccess)
    return (
      <div className={styles.stack} role="status">
        {done}
      </div>
    );
  return (
    <div className={styles.stack}>
      {children}
      <Button type="primary" block autoFocus onClick={() => acting.mutate()} loading={acting.isPending}>
        {verb}
      </Button>
      {acting.error && <FieldMessage>{detailOf(acting.error)}</FieldMessage>}
    </div>
  );
}
