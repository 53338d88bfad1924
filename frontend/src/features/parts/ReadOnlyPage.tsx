import { Link } from 'react-router-dom';
import { MessagePage } from '../../components/MessagePage';

/** Stands in place of a form for a part that the member can't change. */
export function ReadOnlyPage() {
  return (
    <MessagePage title="This can’t be changed here">
      <p>
        Curated parts are read-only, and your own library is kept by your team’s librarians and admins.{' '}
        <Link to="/parts">See all parts</Link>.
      </p>
    </MessagePage>
  );
}
