import { isRetired, RETIRED, type Standing } from '@roothertz/common/parts';
import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { partUsesQuery, type StoredPart } from '../../api/parts';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMayDo } from '../../components/useMember';
import type { KindOfPart } from './kindOfPart';
import styles from './PartActions.module.css';
import { refusedWords } from './standing/refusedWords';
import { planStanding } from './standing/standingPlan';
import { useChangeStandings } from './standing/useChangeStandings';
import { useDeletePart } from './useDeletePart';

interface PartActionsProps {
  kind: KindOfPart;
  part: StoredPart;
}

const BACK: Standing = { lifecycle: 'active', approval: 'approved' };

/** What a member may do with a part: the curated library is read-only, the own one is the librarians'. */
export function PartActions(props: PartActionsProps) {
  const mayEdit = useMayDo('parts.edit');
  if (!mayEdit || props.part.library === 'curated') return null;
  return <ChangeActions {...props} />;
}

/** A part that is chosen somewhere is retired: only what nothing uses can be deleted. */
function ChangeActions({ kind, part }: PartActionsProps) {
  const { data: uses } = useQuery(partUsesQuery(part.id));
  const remove = useDeletePart(kind, part);
  const { mutate, isPending, error } = useChangeStandings(kind);
  const retired = isRetired(part);
  return (
    <div className={styles.changes}>
      <div className={styles.actions}>
        <Link to={`${kind.path}/${part.id}/edit`}>Edit</Link>
        <Button
          title={retired ? 'Makes it active and approved again' : 'Makes it obsolete and not approved'}
          loading={isPending}
          onClick={() => mutate(planStanding([part], retired ? BACK : RETIRED))}
        >
          {retired ? 'Bring back' : 'Retire'}
        </Button>
        {uses?.conditions.length === 0 && (
          <Button danger type="text" onClick={() => remove.mutate()} loading={remove.isPending}>
            Delete
          </Button>
        )}
      </div>
      {uses && uses.conditions.length > 0 && (
        <p className={styles.uses}>
          Chosen at {uses.conditions.map(({ name }) => `“${name}”`).join(', ')}
          {retired ? '.' : ': it can be retired, not deleted.'}
        </p>
      )}
      {error && <FieldMessage>{refusedWords(error)}</FieldMessage>}
      {remove.error && <FieldMessage>{detailOf(remove.error)}</FieldMessage>}
    </div>
  );
}
