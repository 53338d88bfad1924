import { useQuery } from '@tanstack/react-query';
import { Navigate, useLocation } from 'react-router-dom';
import { sessionQuery } from '../api/session';
import { PageSkeleton } from '../components/PageSkeleton';
import { MemberContext } from '../components/useMember';
import { AppShell } from './AppShell';
import { UnreachableNotice } from './UnreachableNotice';

/** Everything behind the sign-in. */
export function RequireSession() {
  const { data: session, error } = useQuery(sessionQuery);
  const { pathname, search } = useLocation();
  if (session) {
    return (
      <MemberContext value={session}>
        <AppShell />
      </MemberContext>
    );
  }
  if (session === null)
    return <Navigate to={`/sign-in?next=${encodeURIComponent(pathname + search)}`} replace />;
  if (error) throw error;
  return (
    <>
      <UnreachableNotice />
      <PageSkeleton />
    </>
  );
}
