import { Link } from 'react-router-dom';
import { MessagePage } from '../../components/MessagePage';
import { WhyNot } from '../../components/WhyNot';
import type { KindOfPart } from './kindOfPart';

/** Stands in place of a form for a part that the member can't change. */
export function ReadOnlyPage({ kind }: { kind: KindOfPart }) {
  return (
    <MessagePage title="This can’t be changed here">
      <p>
        <WhyNot
          action="parts.edit"
          byRole="Curated parts are read-only, and your own library is kept by your team’s librarians and admins."
          byPlan="Your team’s plan has no library of its own; the Team plan has one."
        />{' '}
        <Link to={kind.path}>See all {kind.noun}s</Link>.
      </p>
    </MessagePage>
  );
}
