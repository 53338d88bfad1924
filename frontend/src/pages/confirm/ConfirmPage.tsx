import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { accountLinkQuery, confirmAddress } from '../../api/account';
import { LinkAct } from '../../features/account/LinkAct';
import { BadLink } from '../sign-in/BadLink';
import { EntryPage } from '../sign-in/EntryPage';

const SIGNED_UP = (
  <p>
    The address is confirmed. <Link to="/sign-in">Sign in</Link> with it.
  </p>
);
const CHANGED = (
  <p>
    The address is confirmed: your account belongs to it now. <Link to="/account">Go to your account</Link>.
  </p>
);

/** Where the link of the e-mail leads by which an address is confirmed. */
export function ConfirmPage() {
  const { token = '' } = useParams();
  const { data: link, error } = useQuery(accountLinkQuery(token));
  return (
    <EntryPage title="Confirm your address" note={error && <Link to="/sign-in">Sign in</Link>}>
      {link ? (
        <LinkAct
          verb="Confirm the address"
          act={() => confirmAddress(token)}
          done={link.purpose === 'sign-up' ? SIGNED_UP : CHANGED}
        >
          <p style={{ overflowWrap: 'anywhere' }}>
            {link.purpose === 'sign-up'
              ? `Your account is made for ${link.email}.`
              : `Your account will belong to ${link.email}, and your other sessions end.`}
          </p>
        </LinkAct>
      ) : (
        <BadLink error={error} />
      )}
    </EntryPage>
  );
}
