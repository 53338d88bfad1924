import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { useMayDo } from '../../components/useMember';
import type { KindOfPart } from './kindOfPart';

interface NoPartsProps {
  kind: KindOfPart;
  /** A search or a filter hides parts. */
  isNarrowed: boolean;
  onShowAll: () => void;
}

/** What to do where the list is empty. */
export function NoParts({ kind, isNarrowed, onShowAll }: NoPartsProps) {
  const mayEdit = useMayDo('parts.edit');
  if (isNarrowed) {
    return (
      <p>
        No part matches. Search for less of the part number, or{' '}
        <Button type="link" style={{ padding: 0, height: 'auto' }} onClick={onShowAll}>
          show all parts
        </Button>
        .
      </p>
    );
  }
  if (mayEdit) {
    return (
      <p>
        There are no {kind.noun}s yet. <Link to={`${kind.path}/new`}>Add the first {kind.noun}</Link>.
      </p>
    );
  }
  return <p>There are no {kind.noun}s yet. A librarian or an admin of your team can add them.</p>;
}
