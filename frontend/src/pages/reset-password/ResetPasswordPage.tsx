import { useState } from 'react';
import { Link } from 'react-router-dom';
import { askForPasswordReset } from '../../api/account';
import { CheckMail } from '../../features/account/CheckMail';
import { ResetRequestForm } from '../../features/account/ResetRequestForm';
import { EntryPage } from '../sign-in/EntryPage';

const NOTE = (
  <>
    You know it again? <Link to="/sign-in">Sign in</Link>.
  </>
);

export function ResetPasswordPage() {
  const [email, setEmail] = useState<string | null>(null);
  return (
    <EntryPage title={email ? 'Check your mail' : 'New password'} note={NOTE}>
      {email ? (
        <CheckMail email={email} goodFor="30 minutes" sendAgain={() => askForPasswordReset({ email })} />
      ) : (
        <ResetRequestForm onSent={setEmail} />
      )}
    </EntryPage>
  );
}
