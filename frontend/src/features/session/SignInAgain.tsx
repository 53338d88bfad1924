import type { QueryClient } from '@tanstack/react-query';
import { type InputRef, Modal } from 'antd';
import { useEffect, useRef, useState } from 'react';
import { resumeSession, type Session, switchTeam } from '../../api/session';
import { useMember } from '../../components/useMember';
import { SignInForm } from './SignInForm';

/** Asks who is at work to sign in again, over the page, which keeps what was being written. */
export function SignInAgain() {
  const { user, team } = useMember();
  useFocusAfterwards();
  const password = useRef<InputRef>(null);
  const take = async (queryClient: QueryClient, session: Session) => {
    const isSame = session.user.id === user.id && session.teams.some(({ id }) => id === team.id);
    if (!isSame) return window.location.reload();
    resumeSession(queryClient, session.team.id === team.id ? session : await switchTeam(team.id));
  };
  return (
    <Modal
      open
      title="Your session is over"
      footer={null}
      closable={false}
      keyboard={false}
      width={380}
      afterOpenChange={(isOpen) => isOpen && password.current?.focus()}
    >
      <p style={{ marginBottom: 16 }}>Sign in again to go on: what you were writing is still there.</p>
      <SignInForm take={take} email={user.email} passwordRef={password} />
    </Modal>
  );
}

/** Gives the focus back to what had it before. */
function useFocusAfterwards(): void {
  const [before] = useState(document.activeElement);
  useEffect(() => () => void (before instanceof HTMLElement && before.focus()), [before]);
}
