import { useQuery } from '@tanstack/react-query';
import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { sessionQuery } from '../../api/session';
import { nextPath } from '../../features/session/nextPath';
import { SignInForm } from '../../features/session/SignInForm';
import { EntryPage } from './EntryPage';

const NOTE = (
  <>
    No account yet? <Link to="/sign-up">Sign up</Link>, or ask your team’s admin for an invitation. Makers and
    part numbers in the curated library are invented.
  </>
);

export function SignInPage() {
  const { data: session } = useQuery(sessionQuery);
  const [search] = useSearchParams();
  if (session) return <Navigate to={nextPath(search)} replace />;
  return (
    <EntryPage title="Sign in" note={NOTE}>
      <SignInForm />
    </EntryPage>
  );
}
