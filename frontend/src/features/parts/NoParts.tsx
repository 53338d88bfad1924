import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { useMayDo } from '../../components/useMember';

interface NoPartsProps {
  /** A search or a filter hides parts. */
  isNarrowed: boolean;
  onShowAll: () => void;
}

/** What to do where the list is empty. */
export function NoParts({ isNarrowed, onShowAll }: NoPartsProps) {
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
        There are no parts yet. <Link to="/parts/new">Add the first op-amp</Link>.
      </p>
    );
  }
  return <p>There are no parts yet. A librarian or an admin of your team can add them.</p>;
}
