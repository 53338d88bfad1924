import { useMutation } from '@tanstack/react-query';
import { Button } from 'antd';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Account.module.css';

interface CheckMailProps {
  email: string;
  /** How long the link is good, in words. */
  goodFor: string;
  sendAgain: () => Promise<void>;
}

/** What to do after a link was asked for: the same words whether or not the address has an account. */
export function CheckMail({ email, goodFor, sendAgain }: CheckMailProps) {
  const again = useMutation({ mutationFn: sendAgain });
  return (
    <div className={styles.stack} role="status">
      <p>
        We have sent an e-mail to <strong className={styles.address}>{email}</strong>. Open the link in it: it
        is good for {goodFor}.
      </p>
      <p className={styles.quiet}>Nothing there? Look among the unwanted mail, or have it sent again.</p>
      <div>
        <Button onClick={() => again.mutate()} loading={again.isPending}>
          Send it again
        </Button>
      </div>
      {again.isSuccess && <p>It has been sent again.</p>}
      {again.error && <FieldMessage>{detailOf(again.error)}</FieldMessage>}
    </div>
  );
}
