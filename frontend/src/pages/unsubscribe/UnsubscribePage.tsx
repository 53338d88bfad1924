import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { unsubscribe, unsubscriptionQuery } from '../../api/account';
import { LinkAct } from '../../features/account/LinkAct';
import { BadLink } from '../sign-in/BadLink';
import { EntryPage } from '../sign-in/EntryPage';

/** Where the link in a notice leads by which that kind is stopped. */
export function UnsubscribePage() {
  const { token = '' } = useParams();
  const { data: notice, error } = useQuery(unsubscriptionQuery(token));
  return (
    <EntryPage title="Stop these e-mails">
      {notice ? (
        <LinkAct
          verb="Stop them"
          act={() => unsubscribe(token)}
          done={
            <p>
              You get no more e-mails of this kind. On your <Link to="/account">account page</Link> you can
              ask for them again.
            </p>
          }
        >
          <p>{notice.label}</p>
        </LinkAct>
      ) : (
        <BadLink error={error} />
      )}
    </EntryPage>
  );
}
