import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { Link, useParams } from 'react-router-dom';
import { openInvitationQuery } from '../../api/invitation';
import { detailOf } from '../../api/problem';
import { Mark } from '../../components/Mark';
import { JoinTeam } from '../../features/team/JoinTeam';
import styles from '../sign-in/SignInPage.module.css';

/** Where the link of an invitation leads: to join the team, or to why that can't be. */
export function InvitationPage() {
  const { token = '' } = useParams();
  const { data: invitation, error } = useQuery(openInvitationQuery(token));
  return (
    <main className={styles.page}>
      <title>Invitation · Roothertz</title>
      <div className={styles.panel}>
        <Mark />
        <h1 className={styles.title}>{invitation ? `Join ${invitation.team.name}` : 'Invitation'}</h1>
        {invitation ? (
          <JoinTeam token={token} invitation={invitation} />
        ) : error ? (
          <>
            <p role="alert">{detailOf(error)}</p>
            <p className={styles.note}>
              <Link to="/sign-in">Sign in</Link>
            </p>
          </>
        ) : (
          <Skeleton title={false} paragraph={{ rows: 4 }} />
        )}
      </div>
    </main>
  );
}
