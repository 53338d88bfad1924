import type { QueryClient } from '@tanstack/react-query';
import { Modal } from 'antd';
import { resumeSession, type Session } from '../../api/session';
import { useMember } from '../../components/useMember';
import { SignInForm } from './SignInForm';

/** Asks who is at work to sign in again, over the page, which keeps what was being written. */
export function SignInAgain() {
  const { user, team } = useMember();
  const take = (queryClient: QueryClient, session: Session) => {
    if (session.user.id === user.id && session.team.id === team.id) resumeSession(queryClient, session);
    else window.location.reload();
  };
  return (
    <Modal open title="Your session is over" footer={null} closable={false} keyboard={false} width={380}>
      <p style={{ marginBottom: 16 }}>Sign in again to go on: what you were writing is still there.</p>
      <SignInForm take={take} />
    </Modal>
  );
}
