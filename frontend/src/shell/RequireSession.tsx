import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { type Session, sessionQuery } from '../api/session';
import { PageSkeleton } from '../components/PageSkeleton';
import { MemberContext } from '../components/useMember';
import { SignInAgain } from '../features/session/SignInAgain';
import { AppShell } from './AppShell';
import { UnreachableNotice } from './UnreachableNotice';

/** Everything behind the sign-in; when the session ends meanwhile, the page stays and the sign-in comes over it. */
export function RequireSession() {
  const { data: session, error } = useQuery(sessionQuery);
  const member = useLastMember(session);
  const { pathname, search } = useLocation();
  if (member) {
    return (
      <MemberContext value={member}>
        <AppShell />
        {session === null && <SignInAgain />}
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

/** Who is signed in, or was until the session ended. */
function useLastMember(session: Session | null | undefined): Session | null {
  const [last, setLast] = useState<Session | null>(null);
  if (session && session !== last) setLast(session);
  return session ?? last;
}
