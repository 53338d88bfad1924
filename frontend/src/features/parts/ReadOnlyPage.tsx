import { Link } from 'react-router-dom';
import { MessagePage } from '../../components/MessagePage';
import type { KindOfPart } from './kindOfPart';

/** Stands in place of a form for a part that the member can't change. */
export function ReadOnlyPage({ kind }: { kind: KindOfPart }) {
  return (
    <MessagePage title="This can’t be changed here">
      <p>
        Curated parts are read-only, and your own library is kept by your team’s librarians and admins.{' '}
        <Link to={kind.path}>See all {kind.noun}s</Link>.
      </p>
    </MessagePage>
  );
}
