import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';
import { sessionQuery } from '../../api/session';
import { Mark } from '../../components/Mark';
import { nextPath } from '../../features/session/nextPath';
import { SignInForm } from '../../features/session/SignInForm';
import styles from './SignInPage.module.css';

export function SignInPage() {
  const { data: session } = useQuery(sessionQuery);
  const [search] = useSearchParams();
  if (session) return <Navigate to={nextPath(search)} replace />;
  return (
    <main className={styles.page}>
      <title>Sign in · Roothertz</title>
      <div className={styles.panel}>
        <Mark />
        <h1 className={styles.title}>Sign in</h1>
        <SignInForm />
        <p className={styles.note}>
          Accounts are given by your team’s admin. Makers and part numbers in the curated library are
          invented.
        </p>
      </div>
    </main>
  );
}
