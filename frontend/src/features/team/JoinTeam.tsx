import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { OpenInvitation } from '../../api/invitation';
import { sessionQuery } from '../../api/session';
import { formatDay } from '../../components/formatDay';
import { JoinAsMember } from './JoinAsMember';
import { NewAccountForm } from './NewAccountForm';
import styles from './JoinTeam.module.css';
import { rolesText } from './teamWords';

interface JoinTeamProps {
  token: string;
  invitation: OpenInvitation;
}

/** What is offered, and the way in that suits who opens it. */
export function JoinTeam({ token, invitation }: JoinTeamProps) {
  const { invitedBy, email, roles, expiresAt } = invitation;
  const { data: session, isPending } = useQuery(sessionQuery);
  return (
    <div className={styles.join}>
      <p>
        {invitedBy ?? 'The team'} invites <strong>{email}</strong> as {rolesText(roles)}. Good until{' '}
        {formatDay(expiresAt)}.
      </p>
      {isPending ? null : session ? (
        <JoinAsMember token={token} invitation={invitation} session={session} />
      ) : invitation.hasAccount ? (
        <p>
          This address has an account: <Link to={`/sign-in?next=/invitations/${token}`}>sign in with it</Link>{' '}
          to join.
        </p>
      ) : (
        <NewAccountForm token={token} email={email} />
      )}
    </div>
  );
}
