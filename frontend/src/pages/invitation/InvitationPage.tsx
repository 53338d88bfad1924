import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { openInvitationQuery } from '../../api/invitation';
import { JoinTeam } from '../../features/team/JoinTeam';
import { BadLink } from '../sign-in/BadLink';
import { EntryPage } from '../sign-in/EntryPage';

/** Where the link of an invitation leads: to join the team, or to why that can't be. */
export function InvitationPage() {
  const { token = '' } = useParams();
  const { data: invitation, error } = useQuery(openInvitationQuery(token));
  const title = invitation ? `Join ${invitation.team.name}` : 'Invitation';
  return (
    <EntryPage title={title} note={error && <Link to="/sign-in">Sign in</Link>}>
      {invitation ? <JoinTeam token={token} invitation={invitation} /> : <BadLink error={error} />}
    </EntryPage>
  );
}
