import { useQuery } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import { useState } from 'react';
import { closeAccount, closingQuery, type Departure } from '../../api/account';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Account.module.css';
import { AccountForm } from './AccountForm';
import { PasswordItem } from './PasswordItem';

/** Closing the account: what becomes of each team is said before, and the password asked for. */
export function CloseAccount() {
  const [isOpen, setOpen] = useState(false);
  return (
    <div className={styles.stack}>
      <p className={styles.quiet}>
        Your name, address and password are deleted. What you made stays in the team.
      </p>
      <div>
        <Button onClick={() => setOpen(!isOpen)} aria-expanded={isOpen}>
          {isOpen ? 'Keep the account' : 'Close the account…'}
        </Button>
      </div>
      {isOpen && <Closing />}
    </div>
  );
}

function Closing() {
  const { data, error } = useQuery(closingQuery);
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data) return <Skeleton title={false} paragraph={{ rows: 2 }} />;
  const isPossible = data.items.every(({ obstacle }) => obstacle === null);
  return (
    <>
      <ul className={styles.rows} aria-label="What becomes of your teams">
        {data.items.map((departure) => (
          <li key={departure.team.id} className={styles.row}>
            <span className={styles.what}>
              {departure.team.name}: {outcomeOf(departure)}
            </span>
          </li>
        ))}
      </ul>
      {isPossible && (
        <AccountForm
          label="Close the account"
          verb="Close it for good"
          danger
          act={closeAccount}
          onDone={() => window.location.assign('/sign-in')}
        >
          <PasswordItem name="password" label="Your password" />
        </AccountForm>
      )}
    </>
  );
}

function outcomeOf({ closes, obstacle }: Departure): string {
  if (obstacle !== null) return obstacle;
  return closes
    ? 'nobody else is in it, so it is closed with you. What it has is kept, but nobody can open it.'
    : 'you leave it, and what you made stays.';
}
