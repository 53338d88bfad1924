import { Button } from 'antd';
import { Link } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMayDo } from '../../components/useMember';
import type { KindOfPart } from './kindOfPart';
import styles from './PartActions.module.css';
import { useDeletePart } from './useDeletePart';

/** What a member may do with a part: the curated library is read-only, the own one is the librarians'. */
export function PartActions({ kind, part }: { kind: KindOfPart; part: StoredPart }) {
  const mayEdit = useMayDo('parts.edit');
  const remove = useDeletePart(kind, part);
  if (!mayEdit || part.library === 'curated') return null;
  return (
    <div>
      <div className={styles.actions}>
        <Link to={`${kind.path}/${part.id}/edit`}>Edit</Link>
        <Button danger type="text" onClick={() => remove.mutate()} loading={remove.isPending}>
          Delete
        </Button>
      </div>
      {remove.error && <FieldMessage>{detailOf(remove.error)}</FieldMessage>}
    </div>
  );
}
