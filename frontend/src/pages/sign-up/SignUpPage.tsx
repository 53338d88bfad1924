import { useState } from 'react';
import { Link } from 'react-router-dom';
import { type SignUp, signUp } from '../../api/account';
import { CheckMail } from '../../features/account/CheckMail';
import { SignUpForm } from '../../features/account/SignUpForm';
import { EntryPage } from '../sign-in/EntryPage';

const NOTE = (
  <>
    You have an account? <Link to="/sign-in">Sign in</Link>.
  </>
);

export function SignUpPage() {
  const [sent, setSent] = useState<SignUp | null>(null);
  return (
    <EntryPage title={sent ? 'Check your mail' : 'Sign up'} note={NOTE}>
      {sent ? (
        <CheckMail email={sent.email} goodFor="a day" sendAgain={() => signUp(sent)} />
      ) : (
        <SignUpForm onSent={setSent} />
      )}
    </EntryPage>
  );
}
