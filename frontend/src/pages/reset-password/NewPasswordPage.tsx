import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { accountLinkQuery } from '../../api/account';
import { NewPasswordForm } from '../../features/account/NewPasswordForm';
import { BadLink } from '../sign-in/BadLink';
import { EntryPage } from '../sign-in/EntryPage';

const NOTE = <Link to="/reset-password">Ask for a new link</Link>;

/** Where the link of the e-mail leads by which a password is set anew. */
export function NewPasswordPage() {
  const { token = '' } = useParams();
  const [isDone, setDone] = useState(false);
  const { data: link, error } = useQuery(accountLinkQuery(token));
  if (isDone)
    return (
      <EntryPage title="New password">
        <p role="status">
          Your password is set, and all sessions that were open are over. <Link to="/sign-in">Sign in</Link>.
        </p>
      </EntryPage>
    );
  return (
    <EntryPage title="New password" note={NOTE}>
      {link ? (
        <NewPasswordForm token={token} email={link.email} onDone={() => setDone(true)} />
      ) : (
        <BadLink error={error} />
      )}
    </EntryPage>
  );
}
